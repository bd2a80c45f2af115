import { settings } from './settings.ts';
import type { SeedDesign } from './types.ts';

/** Published from July 2026 on, oldest first; the newest have not been cut yet. */
export const designsOfAutumn2026: readonly SeedDesign[] = [
  {
    key: 'house-number',
    owner: 'moss',
    title: 'House number 217 in oak',
    summary:
      'A plaque with slab numerals cut right through and a fine border line. No numeral has an island, so no bridges.',
    kind: 'signs-and-lettering',
    licence: 'CC-BY-NC-4.0',
    tags: ['sign', 'numerals', 'oak'],
    publishedAt: '2026-07-11T13:30:00Z',
    cut: {
      machine: 'Mill loft belt router',
      bit: { diameterMm: 3.175, flutes: 2, kind: 'up-cut' },
      materialId: 'hardwood',
      stockThicknessMm: 18,
      settings: settings(18000, 1300, 300, 1.2, 1.2),
      holdDown: 'tabs',
      outcome: 'usable',
      runTimeS: 3540,
      notes: 'The waste was tabbed at the serifs and took two of them with it. Glued and sanded.',
    },
  },
  {
    key: 'spoilboard-knob',
    owner: 'heron',
    title: 'Spoilboard knob for M8',
    summary: 'A six-lobed knob with a pocket for an M8 nut, its corners drilled so that the nut seats.',
    kind: 'hold-downs',
    licence: 'CC0-1.0',
    tags: ['knob', 'M8', 'nut'],
    publishedAt: '2026-08-15T17:20:00Z',
    scale: { millimetresPerUnit: 25.4 / 96 },
  },
  {
    key: 'radius-gauge',
    owner: 'sorrel',
    title: 'Radius gauge, 6 to 24 mm',
    summary: 'Four round corners and the four hollows that match them, to read or to mark a radius.',
    kind: 'gauges',
    licence: 'CC-BY-4.0',
    tags: ['radius', 'corner', 'marking'],
    publishedAt: '2026-09-12T10:45:00Z',
  },
  {
    key: 'dust-shoe-ring',
    owner: 'ada',
    title: 'Dust shoe ring, 66 spindle',
    summary:
      'The plate of a dust shoe: spindle bore, port for a 38 hose and a 6 wide groove for the brush strip.',
    kind: 'dust-and-safety',
    licence: 'CERN-OHL-P-2.0',
    tags: ['dust shoe', 'extraction', 'brush'],
    publishedAt: '2026-10-17T09:00:00Z',
    scale: { millimetresPerUnit: 25.4 / 90 },
  },
  {
    key: 'pencil-box',
    owner: 'fern',
    title: 'Pencil box from one block',
    summary:
      'Three compartments in a 30 mm block, and a lid that drops into a rebate. Box and lid side by side.',
    kind: 'boxes',
    licence: 'CC-BY-NC-SA-4.0',
    tags: ['box', 'lid', 'pencils', 'gift'],
    publishedAt: '2026-11-14T15:10:00Z',
  },
];
