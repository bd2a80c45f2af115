import { settings } from './settings.ts';
import type { SeedRemix, SeedRevision } from './types.ts';

/** Revisions after the first, oldest first. */
export const revisions: readonly SeedRevision[] = [
  {
    design: 'collet-wheel',
    sheet: 'collet-wheel-wider',
    issuedAt: '2025-08-20T18:10:00Z',
    changeNote: 'holes 0.1 wider, after two records of jammed collets',
    cut: {
      machine: 'Shed router',
      bit: { diameterMm: 3.175, flutes: 2, kind: 'up-cut' },
      materialId: 'plywood',
      stockThicknessMm: 15,
      settings: settings(17000, 1300, 300, 1.5, 1.3),
      holdDown: 'screws',
      outcome: 'clean',
      runTimeS: 1680,
      notes: 'Every collet drops in and none rattles.',
    },
  },
];

/** Remixes, oldest first: each names the revision that it was made from. */
export const remixes: readonly SeedRemix[] = [
  {
    key: 'wedge-hold-down-long',
    owner: 'tarn',
    parent: { design: 'wedge-hold-down', revision: 1 },
    title: 'Wedge hold-down, long slot',
    summary: 'The slotted wedge with 48 mm more slot, for a bed whose screw holes stand further apart.',
    kind: 'hold-downs',
    licence: 'CC-BY-4.0',
    tags: ['clamp', 'wedge', 'long'],
    publishedAt: '2025-10-25T15:30:00Z',
    changeNote: 'slot and wedge 48 longer, slope kept at one in eight',
    cut: {
      machine: 'Barn gantry',
      bit: { diameterMm: 6, flutes: 2, kind: 'up-cut' },
      materialId: 'plywood',
      stockThicknessMm: 18,
      settings: settings(16000, 2400, 600, 3, 2.4),
      holdDown: 'screws',
      outcome: 'clean',
      runTimeS: 900,
      notes: 'Screws at both ends; nothing moved.',
    },
  },
  {
    key: 'collet-wheel-twelve',
    owner: 'fern',
    parent: { design: 'collet-wheel', revision: 2 },
    title: 'Collet wheel, twelve places',
    summary: 'For a spindle with a full set: twelve places on a wheel of 120, with the wider holes.',
    kind: 'bit-trays',
    licence: 'CC-BY-SA-4.0',
    tags: ['collets', 'wheel'],
    publishedAt: '2026-02-21T10:40:00Z',
    changeNote: 'twelve places in place of eight, 120 across',
  },
  {
    key: 'collet-wheel-magnets',
    owner: 'heron',
    parent: { design: 'collet-wheel-twelve', revision: 1 },
    title: 'Collet wheel, twelve places, with magnets',
    summary: 'Four round magnets underneath hold the wheel where it was turned to.',
    kind: 'bit-trays',
    licence: 'CC-BY-SA-4.0',
    tags: ['collets', 'wheel', 'magnets'],
    publishedAt: '2026-08-09T14:05:00Z',
    changeNote: 'pockets for four magnets of 10 × 4',
  },
];
