import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bestStanding } from './best-standing.ts';
import { standingOf } from './standing.ts';
import type { EvidenceRecord } from './votes.ts';

const at = (day: number): string => `2031-03-${String(day).padStart(2, '0')}T12:00:00.000Z`;
const record = (memberId: string, day: number, more: Partial<EvidenceRecord> = {}): EvidenceRecord => ({
  memberId,
  recordedAt: at(day),
  outcome: 'clean',
  wentWrong: [],
  ...more,
});
const members = ['wren', 'tarn', 'moss', 'ada', 'fen', 'rill'];
const clean = (count: number): EvidenceRecord[] =>
  members.slice(0, count).map((member, day) => record(member, day + 1));

describe('standing', () => {
  it('follows the number of members for', () => {
    expect([0, 1, 2, 5, 6].map((count) => standingOf(clean(count), 'wren').word)).toEqual([
      'uncut',
      'cut-once',
      'proven',
      'proven',
      'well-proven',
    ]);
  });

  it('counts a member once, by the latest record whatever the order of the list', () => {
    const failed = record('tarn', 9, { outcome: 'failed', wentWrong: ['tear-out'] });
    const records = [failed, ...clean(2)];
    expect(standingOf(records, 'wren')).toMatchObject({ votesFor: 1, votesAgainst: 1, word: 'disputed' });
    expect(standingOf([...records, record('tarn', 10)], 'wren')).toMatchObject({
      votesFor: 2,
      word: 'proven',
    });
  });

  it('counts two of three for as proven and three of five as disputed', () => {
    const against = (member: string, day: number) => record(member, day, { outcome: 'failed' });
    expect(standingOf([...clean(2), against('moss', 5)], 'wren').word).toBe('proven');
    expect(standingOf([...clean(3), against('ada', 5), against('fen', 6)], 'wren').word).toBe('disputed');
  });

  it('counts a part that broke in use against, though it was cut clean', () => {
    expect(standingOf([record('tarn', 1, { inService: 'broke' })], 'wren')).toMatchObject({
      votesAgainst: 1,
      word: 'disputed',
    });
    expect(standingOf([record('tarn', 1, { inService: 'holds' })], 'wren').word).toBe('cut-once');
  });

  it('sets a slip aside: it neither counts nor takes away what the member found before', () => {
    const slip = record('tarn', 8, { outcome: 'failed', wentWrong: ['not-zeroed', 'clamp-forgotten'] });
    expect(standingOf([slip], 'wren')).toMatchObject({ word: 'uncut', setAside: 1, votesAgainst: 0 });
    expect(standingOf([...clean(2), slip], 'wren')).toMatchObject({
      word: 'proven',
      votesFor: 2,
      setAside: 1,
    });
    const notOnlySlip = { ...slip, wentWrong: ['not-zeroed', 'tear-out'] };
    expect(standingOf([notOnlySlip], 'wren')).toMatchObject({ votesAgainst: 1, setAside: 0 });
    expect(standingOf([{ ...slip, inService: 'broke' as const }], 'wren').votesAgainst).toBe(1);
  });

  it('stays disputed after a hazard until a moderator settles it, whatever is cut later', () => {
    const hazard = record('wren', 1, { outcome: 'usable', wentWrong: ['part-came-loose'] });
    const later = members.map((member, day) => record(member, day + 5));
    expect(standingOf([hazard, ...later], 'wren')).toMatchObject({ word: 'disputed', unsettledHazards: 1 });
    expect(standingOf([{ ...hazard, hazardsSettled: true }, ...later], 'wren').word).toBe('well-proven');
  });

  it('is withheld when a moderator says so, over everything else', () => {
    expect(standingOf(clean(6), 'wren', { withheld: true }).word).toBe('withheld');
    expect(standingOf([], 'wren', { withheld: true }).word).toBe('withheld');
  });

  it('does not depend on the order of the list', () => {
    const someRecord = fc.record({
      memberId: fc.constantFrom(...members),
      outcome: fc.constantFrom('clean' as const, 'usable' as const, 'failed' as const),
      wentWrong: fc.subarray(['not-zeroed', 'tear-out', 'bit-broke']),
      hazardsSettled: fc.boolean(),
    });
    fc.assert(
      fc.property(fc.array(someRecord, { maxLength: 12 }), fc.nat(), (list, seed) => {
        const records = list.map((each, day) => ({ ...each, recordedAt: at(day + 1) }));
        const turned = [...records.slice(seed % 12), ...records.slice(0, seed % 12)].reverse();
        expect(standingOf(turned, 'wren')).toEqual(standingOf(records, 'wren'));
      }),
    );
  });
});

describe('the standing on a card', () => {
  it('is the best word, and of equal words the surer', () => {
    const of = (word: 'proven' | 'disputed' | 'uncut', low: number) => ({ word, low });
    expect(bestStanding([of('disputed', 0.5), of('uncut', 0), of('proven', 0.3), of('proven', 0.4)])).toEqual(
      of('proven', 0.4),
    );
    expect(bestStanding([])).toBeUndefined();
  });
});
