import type { CutRecord } from '#shared/api/cuts.ts';

/** An invented cut record for the tests of pages. */
export const cutRecordOf = (change: Partial<CutRecord> = {}): CutRecord => ({
  id: '01890000-0000-7000-8000-000000000501',
  version: 1,
  revision: 2,
  member: { id: 'wren', name: 'Wren' },
  design: { slug: 'wedge', title: 'Wedge', drawingNumber: 'ML-0098' },
  machine: { id: '01890000-0000-7000-8000-000000000001', name: 'Shed router', bedXMm: 300, bedYMm: 180 },
  bit: { diameterMm: 6.35, flutes: 2, kind: 'up-cut' },
  materialId: 'plywood',
  materialFamily: 'plywood',
  stockThicknessMm: 12,
  settings: {
    spindleRpm: 18_000,
    feedMmPerMin: 1500,
    plungeMmPerMin: 400,
    depthOfCutMm: 3,
    stepoverMm: 2.5,
  },
  holdDown: 'tape',
  outcome: 'clean',
  runTimeS: 840,
  wentWrong: [],
  measured: [],
  photos: [],
  findings: [],
  hazardsSettled: false,
  cutOn: '2026-08-01',
  notes: '',
  createdAt: '2026-08-01T10:00:00.000Z',
  ...change,
});
