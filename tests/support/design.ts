import type { Bit, Machine } from '#shared/api/bench.ts';
import type { DesignList, DesignListItem } from '#shared/api/designs.ts';

// Invented objects of the contract for the tests of pages.

const createdAt = '2026-07-02T10:00:00.000Z';
const idOf = (last: number) => `01890000-0000-7000-8000-${String(last).padStart(12, '0')}`;

export const machineOf = (change: Partial<Machine> = {}): Machine => ({
  id: idOf(1),
  version: 1,
  createdAt,
  name: 'Shed router',
  class: 'small-desktop',
  bedXMm: 300,
  bedYMm: 180,
  marginMm: { left: 4, right: 4, front: 4, back: 4 },
  clampStripMm: 0,
  zTravelMm: 45,
  openingMm: 75,
  maxFeedMmPerMin: 2000,
  maxPlungeMmPerMin: 600,
  rapidMmPerMin: 3000,
  spindle: { kind: 'range', minRpm: 8000, maxRpm: 24_000 },
  spindlePowerW: 500,
  colletsMm: [3.175, 6.35],
  ...change,
});

export const ownBit = (diameterMm: number): Bit => ({
  id: idOf(100 + Math.round(diameterMm * 1000)),
  version: 1,
  createdAt,
  name: `${diameterMm} up-cut`,
  kind: 'up-cut',
  diameterMm,
  shankMm: diameterMm,
  flutes: 2,
  cuttingLengthMm: 22,
  canPlunge: true,
});

interface ItemChange {
  readonly title?: string;
  readonly widthMm?: number;
  readonly heightMm?: number;
}

export const designItem = ({
  title = 'Wedge',
  widthMm = 100,
  heightMm = 40,
}: ItemChange = {}): DesignListItem => {
  const slug = title.toLowerCase().replaceAll(' ', '-');
  return {
    id: slug,
    slug,
    drawingNumber: 'ML-0098',
    title,
    summary: '',
    kind: 'hold-downs',
    licence: 'CC-BY-4.0',
    tags: [],
    owner: { id: idOf(2), name: 'wren' },
    version: 1,
    createdAt,
    cautions: [],
    standing: [{ material: 'plywood', word: 'cut-once', votesFor: 1, votesAgainst: 0, low: 0.2, high: 1 }],
    revision: {
      number: 1,
      geometryHash: 'hash',
      drawing: { widthMm, heightMm, boundsMm: { minX: 0, minY: 0, maxX: widthMm, maxY: heightMm } },
    },
    outline: `M0 0H${widthMm}V${heightMm}H0Z`,
    hullMm: [
      { x: 0, y: 0 },
      { x: widthMm, y: 0 },
      { x: widthMm, y: heightMm },
      { x: 0, y: heightMm },
    ],
    cut: { bitMm: 6.35, bitKind: 'up-cut', materialId: 'plywood', stockThicknessMm: 12, runTimeS: 840 },
  };
};

export const designListOf = (items: DesignListItem[], nextCursor: string | null = null): DesignList => ({
  items,
  total: items.length + (nextCursor === null ? 0 : 1),
  nextCursor,
  facets: {
    kind: [{ value: 'hold-downs', count: items.length }],
    material: [
      { value: 'plywood', count: items.length },
      { value: 'mdf', count: 1 },
    ],
    bitMm: [{ value: '6.35', count: items.length }],
    standing: [{ value: 'cut-once', count: items.length }],
    fits: [{ value: 'true', count: items.length }],
  },
});
