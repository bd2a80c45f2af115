import type { Flag } from '#shared/api/flags.ts';
import { findingLevelInk, findingLevelLabels } from '../../words/finding-levels.ts';

/** The level of a flag, as a word. */
export function LevelWord({ level }: Pick<Flag, 'level'>) {
  return (
    <strong
      className={`figures inline-block border-2 border-current px-1.5 text-sm leading-6 ${findingLevelInk[level]}`}
    >
      {findingLevelLabels[level]}
    </strong>
  );
}

/** Who called for the decision: a member, or the rule by its title. */
export const raisedByWords = ({ raisedBy, finding }: Flag): string => {
  if (raisedBy !== undefined) return `flagged by ${raisedBy.name}`;
  return finding === undefined ? 'raised by the program' : `raised by the rule “${finding.title}”`;
};

export const takesWords = (count: number): string => {
  if (count === 0) return 'taken by nobody';
  return count === 1 ? 'taken by 1 member' : `taken by ${count} members`;
};
