import type { Deps } from '#server/deps.ts';
import { invalidInput } from '#server/http/validate.ts';
import { localDate } from '#server/local-date.ts';
import type { CutCorrection, CutCreate } from '#shared/api/cuts.ts';
import { contradictionsOfCut } from '#shared/cuts/contradictions.ts';
import type { BenchOfCut } from './own-bench.ts';

type Told = Omit<CutCreate, 'revision'> | Omit<CutCorrection, 'version'>;

/** What a member told, as columns of the record; a 422 that names everything which contradicts something else. */
export function toldColumns(deps: Deps, told: Told, bench: BenchOfCut, cutOnBefore?: string) {
  const today = localDate(deps.clock.now(), deps.clubTimeZone);
  const errors = contradictionsOfCut(told, {
    machine: bench.machine,
    bit: bench.bit,
    bitPath: told.bitId === undefined ? 'bit.diameterMm' : 'bitId',
    today,
  });
  if (errors.length > 0) throw invalidInput(errors, 422);
  return {
    ...bench,
    materialId: told.materialId,
    stockThicknessMm: told.stockThicknessMm,
    settings: told.settings,
    holdDown: told.holdDown,
    outcome: told.outcome,
    runTimeS: told.runTimeS,
    overridePercent: told.overridePercent ?? null,
    wentWrong: told.wentWrong ?? [],
    measured: told.measured ?? [],
    notes: told.notes ?? '',
    cutOn: told.cutOn ?? cutOnBefore ?? today,
  };
}
