import { formatDuration } from '#shared/units/duration.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { bitKindLabels, holdDownLabels, materialLabels, outcomeLabels } from '../../words/labels.ts';
import { wentWrongLabels } from '../../words/went-wrong-labels.ts';
import { sayValue } from '../form/say-value.ts';

const labels: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  outcome: outcomeLabels,
  holdDown: holdDownLabels,
  materialId: materialLabels,
  'bit.kind': bitKindLabels,
  wentWrong: wentWrongLabels,
};

/** A value of a record in words, for telling two versions apart. `names` are those of machines and bits. */
export const sayRecordValue = (
  path: string,
  value: unknown,
  system: UnitSystem,
  names: ReadonlyMap<string, string>,
): string => {
  if (Array.isArray(value) && value.length === 0) return 'nothing';
  if (Array.isArray(value)) {
    return value.map((item) => sayRecordValue(path, item, system, names)).join(', ');
  }
  if (typeof value === 'string')
    return labels[path]?.[value] ?? names.get(value) ?? sayValue(path, value, system);
  if (path === 'runTimeS' && typeof value === 'number') return formatDuration(value);
  if (path === 'overridePercent' && typeof value === 'number') return `${value} %`;
  return sayValue(path, value, system);
};
