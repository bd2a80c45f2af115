import type { FieldLabels } from '../../form/field-problems.ts';

export const bitLabels: FieldLabels = {
  name: 'Name',
  kind: 'Kind',
  diameterMm: 'Cutting diameter',
  shankMm: 'Shank',
  flutes: 'Flutes',
  cuttingLengthMm: 'Cutting length',
  canPlunge: 'Its end can plunge',
  maxRpm: 'Marked greatest speed',
  angleDeg: 'Included angle',
};
