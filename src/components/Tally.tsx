import type { Standing } from '#shared/api/designs.ts';
import { materialLabels, standingLabels } from '../words/labels.ts';
import { TallyStrokes } from './TallyStrokes.tsx';

interface TallyProps {
  readonly standing: Standing | null;
  /** The Wilson interval belongs on the sheet; a card has no room for it. */
  readonly withInterval?: boolean;
}

const percent = (share: number): string => String(Math.round(share * 100));

/** What the cut records add up to, counted as on a shop wall: one stroke a member's vote. */
export function Tally({ standing, withInterval = false }: TallyProps) {
  const votes = standing === null ? 0 : standing.votesFor + standing.votesAgainst;
  return (
    <p className="flex flex-wrap items-center gap-x-3 gap-y-1">
      {standing !== null && votes > 0 && (
        <span
          role="img"
          aria-label={`${standing.votesFor} for, ${standing.votesAgainst} against`}
          className="inline-flex flex-wrap items-center gap-x-2"
        >
          <TallyStrokes count={standing.votesFor} />
          <TallyStrokes count={standing.votesAgainst} crossedOut />
        </span>
      )}
      <span>
        <strong className="font-semibold">{standingLabels[standing?.word ?? 'uncut']}</strong>
        {standing !== null && votes > 0 && (
          <span className="text-ink-soft"> in {materialLabels[standing.material]}</span>
        )}
      </span>
      {withInterval && standing !== null && votes > 0 && (
        <span className="figures text-xs text-ink-soft">
          {standing.votesFor} of {votes} for; 95 % interval {percent(standing.low)}–{percent(standing.high)} %
        </span>
      )}
    </p>
  );
}
