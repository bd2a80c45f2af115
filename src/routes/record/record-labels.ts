import type { FieldLabels } from '../form/field-problems.ts';

/** What the fields of a record are called, by their path in the contract, as they stand on the page. */
export const recordLabels: FieldLabels = {
  outcome: 'Outcome',
  wentWrong: 'What went wrong',
  'wentWrong.0': 'What went wrong',
  runTimeS: 'Run time',
  machineId: 'Machine',
  bitFrom: 'Bit',
  bitId: 'Bit',
  'bit.diameterMm': 'Bit diameter',
  'bit.flutes': 'Flutes',
  'bit.kind': 'Kind of bit',
  materialId: 'Material',
  stockThicknessMm: 'Measured thickness',
  holdDown: 'Hold-down',
  'settings.spindleRpm': 'Spindle speed',
  'settings.feedMmPerMin': 'Feed',
  'settings.plungeMmPerMin': 'Plunge rate',
  'settings.depthOfCutMm': 'Depth of cut',
  'settings.stepoverMm': 'Stepover',
  overridePercent: 'Feed override',
  measured: 'Measured sizes',
  'measured.0.drawnMm': 'Drawn size',
  'measured.0.measuredMm': 'Measured size',
  cutOn: 'Date of the cut',
  notes: 'Notes',
};

/** Where a field stands among the others, for the order in which problems are told. */
export const placeOf = (path: string): number =>
  Object.keys(recordLabels).indexOf(path.replace(/\.\d+(?=\.|$)/g, '.0'));
