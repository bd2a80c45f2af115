import type { Settings } from '#shared/api/cuts.ts';
import type { FitResult } from '#shared/api/vocabulary.ts';
import { formatRpm, formatRpmBare } from '#shared/units/spindle-speed.ts';
import { asSentence, type Check, type FitContext } from '../check.ts';
import type { FitBit } from '../fit-input.ts';
import type { SpindleChoice } from '../spindle-choice.ts';
import { figure } from '../wording.ts';

/** Can the spindle run the shared speed, within the mark on the bit, and which dial position is it? */
export const checkSpindle = (
  { machine, practice }: FitContext,
  { spindleRpm }: Settings,
  bit: FitBit | undefined,
  choice: SpindleChoice | null,
): Check => {
  const { spindle } = machine;
  const have =
    spindle.kind === 'range'
      ? `${formatRpmBare(spindle.minRpm)} to ${formatRpmBare(spindle.maxRpm)}`
      : spindle.positionsRpm.map(formatRpmBare).join(', ');
  const of = (result: FitResult, clause: string): Check => ({
    id: 'spindle',
    result,
    have,
    need: figure(spindleRpm),
    unit: 'rev/min',
    sentence: asSentence(clause),
    clause,
  });
  if (choice === null) {
    const mark = bit?.maxRpm === undefined ? '' : ` of ${formatRpm(bit.maxRpm)}`;
    return of('doesNotFit', `your spindle cannot run slowly enough for the mark${mark} on your bit`);
  }
  const dial = choice.dialPosition === undefined ? '' : ` (dial position ${choice.dialPosition})`;
  if (Math.abs(choice.rpm - spindleRpm) <= practice.sameSpeedShare.value * spindleRpm) {
    return of('fits', `your spindle runs at the shared ${formatRpm(spindleRpm)}${dial}`);
  }
  const markBites = bit?.maxRpm !== undefined && bit.maxRpm < spindleRpm && choice.rpm < spindleRpm;
  const why = markBites ? `, as the mark on your bit is ${formatRpm(bit.maxRpm ?? 0)}` : '';
  return of(
    'fitsIf',
    `run your spindle at ${formatRpm(choice.rpm)}${dial} in place of ${formatRpm(spindleRpm)}${why}`,
  );
};
