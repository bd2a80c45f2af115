import type { CutRecord } from '#shared/api/cuts.ts';
import { OutcomeMark } from '../../components/OutcomeMark.tsx';
import { WentWrongList } from '../../components/WentWrongList.tsx';

/** Outcome, what became of the part, and what went wrong. */
export function HowItCameOut({ record }: { readonly record: CutRecord }) {
  const { outcome, inService, wentWrong } = record;
  return (
    <>
      <OutcomeMark outcome={outcome} />
      {inService?.result === 'broke' && <strong className="block text-sm text-brick">✕ broke in use</strong>}
      {wentWrong.length > 0 && (
        <span className="block text-sm leading-5">
          <WentWrongList codes={wentWrong} />
        </span>
      )}
    </>
  );
}
