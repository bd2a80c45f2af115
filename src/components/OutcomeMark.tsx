import type { Outcome } from '#shared/api/vocabulary.ts';
import { outcomeLabels } from '../words/labels.ts';

const looks: Readonly<Record<Outcome, { readonly sign: string; readonly ink: string }>> = {
  clean: { sign: '■', ink: 'text-pine' },
  usable: { sign: '□', ink: 'text-ochre-ink' },
  failed: { sign: '✕', ink: 'text-brick' },
};

/** How a cut came out, as sign and word. */
export function OutcomeMark({ outcome }: { readonly outcome: Outcome }) {
  const { sign, ink } = looks[outcome];
  return (
    <span className={`font-semibold whitespace-nowrap ${ink}`}>
      <span aria-hidden="true">{sign} </span>
      {outcomeLabels[outcome]}
    </span>
  );
}
