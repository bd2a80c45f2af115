import type { Design } from '#shared/api/designs.ts';
import { allowedLicences } from '#shared/licences/remix-table.ts';
import { Button } from '../../components/Button.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';
import { licenceLabels } from '../../words/labels.ts';

interface MakeFromProps {
  readonly design: Design;
  readonly isOwner: boolean;
}

/** Why it cannot be remixed; null when it can. */
const noRemix = ({ withheld, withdrawnAt, revision }: Design, isOwner: boolean): string | null => {
  if (withheld !== undefined) return 'It is withheld, so it cannot be remixed.';
  if (withdrawnAt !== undefined) return 'It was withdrawn, so it cannot be remixed.';
  // Nobody is bound by a licence of their own.
  if (!isOwner && allowedLicences(revision.licence).length === 0)
    return `Its licence, ${licenceLabels[revision.licence]}, allows no changed copies to be shared, so it cannot be remixed.`;
  return null;
};

/** The two ways on from a drawing: a remix for everybody, a new revision for its owner. */
export function MakeFrom({ design, isOwner }: MakeFromProps) {
  const reason = noRemix(design, isOwner);
  const { slug, revision, withdrawnAt } = design;
  return (
    <div className="space-y-2">
      <div className="flex flex-wrap gap-3">
        {reason === null ? (
          <LinkButton look="line" to={`/share?remixOf=${slug}&revision=${revision.number}`}>
            Remix this
          </LinkButton>
        ) : (
          <Button disabled aria-describedby="no-remix">
            Remix this
          </Button>
        )}
        {isOwner && withdrawnAt === undefined && (
          <LinkButton look="line" to={`/share?revisionOf=${slug}`}>
            New revision
          </LinkButton>
        )}
      </div>
      {reason !== null && (
        <p id="no-remix" className="text-sm leading-5 text-ink-soft">
          {reason}
        </p>
      )}
    </div>
  );
}
