import type { CutRecord } from '#shared/api/cuts.ts';
import { formatLength } from '#shared/units/length.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { materialLabels } from '../../words/labels.ts';

/** What was cut: `12 mm plywood`. */
export const sayStock = (
  { stockThicknessMm, materialId }: Pick<CutRecord, 'stockThicknessMm' | 'materialId'>,
  system: UnitSystem,
): string =>
  `${formatLength(stockThicknessMm, system, { digits: 2, trim: true })} ${materialLabels[materialId]}`;
