import { describe, expect, it } from 'vitest';
import { readCursor, writeCursor } from './cursor.ts';
import { BadCursor } from './document.ts';
import { SearchIndex } from './index.ts';
import { sampleDocument } from './testing/sample-document.ts';

describe('a cursor', () => {
  it.each([
    ['match', { value: 12.345678901234567, id: 'a' }],
    ['newest', { value: '2026-01-01T00:00:00.000Z', id: 'a' }],
    ['title', { value: 'Two\nlines, “quoted” – é 木', id: 'a' }],
    ['size', { value: 1e-7, id: 'a' }],
  ] as const)('comes back as written, for %s', (sort, position) => {
    expect(readCursor(sort, writeCursor(sort, position))).toEqual(position);
  });

  it('stays within the 500 characters of the contract for the longest title of 90', () => {
    const position = { value: '木'.repeat(90), id: '01890a5d-ac96-774b-bcce-b302099a8057' };
    expect(writeCursor('title', position).length).toBeLessThanOrEqual(500);
  });

  const anId = 'a';
  it.each([
    ['nothing', ''],
    ['words', 'next please'],
    ['another order', writeCursor('title', { value: 'x', id: anId })],
    ['a date that is none', writeCursor('newest', { value: 'yesterday', id: anId })],
    ['added characters', `${writeCursor('newest', { value: '2026-01-01T00:00:00.000Z', id: anId })}=`],
  ])('is refused when it is %s', (_what, cursor) => {
    expect(() => readCursor('newest', cursor)).toThrow(BadCursor);
  });

  it('is refused when its number is none', () => {
    expect(() => readCursor('size', writeCursor('size', { value: 'NaN', id: anId }))).toThrow(BadCursor);
    expect(() => readCursor('size', writeCursor('size', { value: '0x10', id: anId }))).toThrow(BadCursor);
  });

  it('goes on after its place although that document went and a newer one came', () => {
    const index = new SearchIndex();
    const day = (n: number) => sampleDocument(`day-${n}`, { createdAt: `2026-01-0${n}T00:00:00.000Z` });
    index.replaceAll([1, 2, 3, 4].map(day));
    const first = index.search({ limit: 2 });
    expect(first.ids).toEqual(['day-4', 'day-3']);
    index.remove('day-3');
    index.upsert(day(5));
    const second = index.search({ limit: 2, cursor: first.nextCursor ?? '' });
    expect(second).toMatchObject({ ids: ['day-2', 'day-1'], nextCursor: null, total: 4 });
  });
});
