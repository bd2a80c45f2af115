import type { SearchDocument, SearchMachine } from '#server/search/document.ts';

/** A document with what a test names, the rest plain. */
export function sampleDocument(id: string, given: Partial<SearchDocument> = {}): SearchDocument {
  return {
    id,
    slug: `slug-${id}`,
    drawingNumber: 'ML-0001',
    title: 'Plain board',
    summary: '',
    tags: [],
    kind: 'other',
    ownerName: 'Wren',
    createdAt: '2026-01-01T00:00:00.000Z',
    materials: [],
    bitMms: [],
    standings: [],
    bestStanding: 'uncut',
    minutes: null,
    hullMm: rectangle(100, 50),
    widthMm: 100,
    heightMm: 50,
    bitMm: null,
    ...given,
  };
}

export const rectangle = (widthMm: number, heightMm: number): SearchDocument['hullMm'] => [
  { x: 0, y: 0 },
  { x: widthMm, y: 0 },
  { x: widthMm, y: heightMm },
  { x: 0, y: heightMm },
];

export const sampleMachine = (bedXMm: number, bedYMm: number): SearchMachine => ({
  id: `machine-${bedXMm}-${bedYMm}`,
  version: 1,
  bedXMm,
  bedYMm,
  marginMm: { left: 0, right: 0, front: 0, back: 0 },
  clampStripMm: 0,
});
