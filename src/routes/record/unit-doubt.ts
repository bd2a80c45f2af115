import type { MeasuredSize } from '#shared/api/cuts.ts';
import { MM_PER_INCH, type UnitSystem } from '#shared/units/system.ts';
import { ProblemError } from '../../api/problem-error.ts';

export interface Conversion {
  readonly field: keyof MeasuredSize;
  readonly sizeMm: number;
  /** The unit that was typed by mistake. */
  readonly unit: 'inches' | 'millimetres' | 'centimetres';
}

/** Between a tenth and 1/25.4 lies the border of the two mistakes. */
const CENTIMETRES_UP_TO = 16;

/**
 * What a pair of sizes means when one of them was typed in another unit. Whoever works in millimetres
 * typed the smaller one in inches or centimetres; whoever works in inches typed the larger one in millimetres.
 */
export const conversionOf = ({ drawnMm, measuredMm }: MeasuredSize, system: UnitSystem): Conversion => {
  const smaller = drawnMm < measuredMm ? 'drawnMm' : 'measuredMm';
  const larger = smaller === 'drawnMm' ? 'measuredMm' : 'drawnMm';
  const [leastMm, mostMm] = [Math.min(drawnMm, measuredMm), Math.max(drawnMm, measuredMm)];
  if (mostMm / leastMm < CENTIMETRES_UP_TO) {
    return { field: smaller, sizeMm: leastMm * 10, unit: 'centimetres' };
  }
  return system === 'mm'
    ? { field: smaller, sizeMm: leastMm * MM_PER_INCH, unit: 'inches' }
    : { field: larger, sizeMm: mostMm / MM_PER_INCH, unit: 'millimetres' };
};

const rowPattern = /^measured\.(\d+)\./;

/** The rows of measured sizes that a refusal asks about: the schema has passed them, so only their unit is in doubt. */
export const rowsInDoubt = (error: unknown): ReadonlySet<number> => {
  const errors = error instanceof ProblemError ? (error.problem.errors ?? []) : [];
  return new Set(
    errors
      .map(({ path }) => rowPattern.exec(path)?.[1])
      .filter((row) => row !== undefined)
      .map(Number),
  );
};

/** The same refusal, its questions in the words of this page. */
export const inWordsOfThePage = (error: unknown): unknown => {
  if (!(error instanceof ProblemError) || error.problem.errors === undefined) return error;
  const errors = error.problem.errors.map(({ path, message }) => ({
    path,
    message: rowPattern.test(path) ? 'Say which unit it is in' : message,
  }));
  return new ProblemError({ ...error.problem, errors });
};
