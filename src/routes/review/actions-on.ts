import type { Flag } from '#shared/api/flags.ts';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import { decisionsFor } from './decision-words.ts';

/** What may be decided on a flag: once it is decided, only that what it withheld is restored. */
export const actionsOn = (
  { recordId, decision }: Pick<Flag, 'recordId' | 'decision'>,
  isWithheld: boolean,
): readonly DecisionAction[] => {
  if (decision !== undefined) return decision.action.startsWith('withhold') ? ['restore'] : [];
  return decisionsFor({ hasRecord: recordId !== undefined, isWithheld });
};
