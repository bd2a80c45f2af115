import type { Flag } from '#shared/api/flags.ts';
import { sayDay } from '../../words/say-day.ts';
import { decisionWords } from './decision-words.ts';

type Decision = NonNullable<Flag['decision']>;

/** A decision that was made, for moderators: who, when, what and why. */
export function DecisionMade({ decision }: { readonly decision: Decision }) {
  const { action, reason, decidedBy, decidedAt } = decision;
  return (
    <div className="border-l-2 border-ink pl-3">
      <p>
        <strong className="font-semibold">
          {decidedBy.name} {decisionWords[action].past}
        </strong>
        <span className="text-sm text-ink-soft">, {sayDay(decidedAt)}</span>
      </p>
      <p className="whitespace-pre-line">{reason}</p>
    </div>
  );
}
