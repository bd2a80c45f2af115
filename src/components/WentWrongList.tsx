import type { CutRecord } from '#shared/api/cuts.ts';
import { isHazard, isOperatorSlip } from '#shared/evidence/went-wrong.ts';
import { wentWrongLabels } from '../words/went-wrong-labels.ts';

/** What went wrong, hazards first and named as such. */
export function WentWrongList({ codes }: { readonly codes: CutRecord['wentWrong'] }) {
  const say = (code: CutRecord['wentWrong'][number]) => wentWrongLabels[code].toLowerCase();
  const hazards = codes.filter(isHazard).map(say);
  const slips = codes.filter(isOperatorSlip).map(say);
  const others = codes.filter((code) => !isHazard(code) && !isOperatorSlip(code)).map(say);
  return (
    <>
      {hazards.length > 0 && (
        <strong className="font-semibold text-brick">Hazard: {hazards.join(', ')}. </strong>
      )}
      {others.length > 0 && <span>{others.join(', ')}. </span>}
      {slips.length > 0 && <span className="text-ink-soft">own slip: {slips.join(', ')}.</span>}
    </>
  );
}
