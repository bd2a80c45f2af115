import { EmptyState } from '../../components/EmptyState.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';
import type { Chip } from './chips.ts';
import type { Filters } from './filters.ts';

interface EmptyLoftProps {
  readonly chips: readonly Chip[];
  readonly hrefWith: (change: Partial<Filters>) => string;
}

/** Nothing to show: either the filters leave nothing, or the club has shared nothing yet. */
export function EmptyLoft({ chips, hrefWith }: EmptyLoftProps) {
  const [only] = chips;
  if (only === undefined) {
    return (
      <EmptyState
        title="The loft is empty"
        action={<LinkButton to="/share">Share the first design</LinkButton>}
      >
        Nobody has shared a design yet. Begin with something that worked on your machine: the drawing as SVG,
        and the settings you cut it with.
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title="Nothing in the loft is like that"
      action={
        <>
          <LinkButton to="/">Clear all filters</LinkButton>
          {chips.length > 1 && (
            <LinkButton look="line" to={hrefWith(chips.at(-1)?.without ?? {})}>
              Only take away {chips.at(-1)?.words}
            </LinkButton>
          )}
        </>
      }
    >
      {chips.length === 1
        ? `No design passes ${only.words}.`
        : `No design passes all of these at once: ${chips.map(({ words }) => words).join(', ')}.`}
    </EmptyState>
  );
}
