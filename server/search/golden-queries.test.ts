import { describe, expect, it } from 'vitest';
import type { SearchDocument } from './document.ts';
import { SearchIndex } from './index.ts';
import { sampleDocument } from './testing/sample-document.ts';

const comb = sampleDocument('comb', {
  drawingNumber: 'ML-0142',
  title: 'Cable comb',
  summary: 'Fingers of 2.5 mm, cut from 1/4 in ply. Snapped once.',
  tags: ['bench_wiring'],
  kind: 'shop-storage',
});
const sibling = sampleDocument('sibling', {
  drawingNumber: 'ML-0143',
  title: 'Drawer organiser',
  summary: 'For shanks of 3.175, 6, 6.35 and 8 mm',
  tags: ['bits'],
  kind: 'bit-trays',
  ownerName: 'Tarn',
});
const wedge = sampleDocument('wedge', {
  drawingNumber: 'ML-0007',
  title: 'Wedge hold-down',
  summary: 'A clamp for thin sheet; a comb of slots along one edge',
  kind: 'hold-downs',
});
const letters = sampleDocument('letters', {
  drawingNumber: 'ML-0014',
  title: 'House_number_plate Ø90x15',
  summary: 'Oak, café style, ¼ inch letters. Screws 4 off',
  kind: 'signs-and-lettering',
});
const index = new SearchIndex();
index.replaceAll([comb, sibling, wedge, letters]);

const found = (q: string, more: readonly SearchDocument[] = []) => {
  for (const document of more) index.upsert(document);
  return index.search({ q, limit: 10 }).ids;
};

describe('what members type', () => {
  it.each([
    ['the beginning of a word', 'organ', ['sibling']],
    ['a slip of the pen', 'orgeniser', ['sibling']],
    ['a word in capitals', 'WEDGE', ['wedge']],
    ['a word without its accent', 'cafe', ['letters']],
    ['a fraction, also written as one sign', '1/4', ['comb', 'letters']],
    ['a fraction as one sign', '¼', ['comb', 'letters']],
    ['a decimal size', '6.35', ['sibling']],
    ['a size with its unit written on', '6.35mm', ['sibling']],
    ['a drawing number', 'ML-0142', ['comb']],
    ['a drawing number in small letters', 'ml0142', ['comb']],
    ['a drawing number without its zeros', 'ML-142', ['comb']],
    ['a drawing number without its prefix', '142', ['comb']],
    ['a drawing number without its prefix, with zeros', '0142', ['comb']],
    ['a part of a word with underscores', 'number', ['letters']],
    ['words with underscores', 'house_number', ['letters']],
    ['a tag with an underscore, as two words', 'bench wiring', ['comb']],
    ['a hyphened word as one', 'holddown', ['wedge']],
    ['a hyphened word as two', 'hold down', ['wedge']],
    ['one of two sizes written together', '90', ['letters']],
    ['a kind', 'lettering', ['letters']],
    ['an owner', 'tarn', ['sibling']],
    ['words that stand in different fields', 'tarn shanks', ['sibling']],
  ])('finds by %s', (_what, q, ids) => {
    expect(found(q).toSorted()).toEqual(ids);
  });

  it('puts a title before a summary', () => {
    expect(found('comb')).toEqual(['comb', 'wedge']);
  });

  it('wants all words, and takes some only when no document has all', () => {
    expect(found('wedge clamp')).toEqual(['wedge']);
    expect(found('wedge organiser').toSorted()).toEqual(['sibling', 'wedge']);
  });

  it('does not take another number for a slip of the pen', () => {
    expect(found('ML-0144')).not.toContain('sibling');
  });

  it('finds nothing for an unknown word, and everything for no word', () => {
    expect(found('zzzzzz')).toEqual([]);
    expect(found(' -- / ')).toHaveLength(4);
  });

  it('forgets the old words of a changed document', () => {
    const changing = new SearchIndex();
    changing.upsert(comb);
    changing.upsert({ ...comb, title: 'Strap rack' });
    expect(changing.search({ q: 'cable', limit: 5 }).total).toBe(0);
    expect(changing.search({ q: 'strap', limit: 5 }).ids).toEqual(['comb']);
    changing.remove('comb');
    expect(changing.search({ q: 'strap', limit: 5 }).total).toBe(0);
    expect(changing.search({ limit: 5 }).total).toBe(0);
  });
});
