import { describe, expect, it } from 'vitest';
import { standingOf } from '#shared/evidence/standing.ts';
import type { EvidenceRecord } from '#shared/evidence/votes.ts';

// Every combination of up to six members' records, against a count written here from the words of the
// standing rules alone. Records of members come in any mix, so a combination with repeats is enough.

type Case = Pick<EvidenceRecord, 'outcome' | 'wentWrong'> &
  Partial<EvidenceRecord> & { readonly says: 'for' | 'against' | 'nothing'; readonly open: boolean };

const cases: readonly Case[] = [
  { outcome: 'clean', wentWrong: [], says: 'for', open: false },
  { outcome: 'usable', wentWrong: ['burning'], inService: 'holds', says: 'for', open: false },
  { outcome: 'clean', wentWrong: [], inService: 'broke', says: 'against', open: false },
  { outcome: 'failed', wentWrong: ['size-off', 'wrong-bit'], says: 'against', open: false },
  { outcome: 'failed', wentWrong: ['clamp-forgotten'], says: 'nothing', open: false },
  { outcome: 'failed', wentWrong: ['bit-broke'], says: 'against', open: true },
  { outcome: 'clean', wentWrong: ['fire-or-smoke'], says: 'for', open: true },
  { outcome: 'failed', wentWrong: ['unexpected-motion'], hazardsSettled: true, says: 'against', open: false },
];

/** Lower ends at or over 0.60 with two thirds for and at most six votes: six of six only (0.609666, C). */
const isWellProven = (votesFor: number, votesAgainst: number): boolean =>
  votesFor === 6 && votesAgainst === 0;

const countByHand = (chosen: readonly Case[]): string => {
  let votesFor = 0;
  let votesAgainst = 0;
  let anyOpen = false;
  for (const each of chosen) {
    if (each.says === 'for') votesFor += 1;
    if (each.says === 'against') votesAgainst += 1;
    if (each.open) anyOpen = true;
  }
  const votes = votesFor + votesAgainst;
  if (anyOpen) return 'disputed';
  if (votes === 0) return 'uncut';
  if (votesFor / votes < 2 / 3 - 1e-9) return 'disputed';
  if (isWellProven(votesFor, votesAgainst)) return 'well-proven';
  return votesFor === 1 ? 'cut-once' : 'proven';
};

const combinations = (most: number): Case[][] => {
  const all: Case[][] = [[]];
  const extend = (chosen: Case[], from: number): void => {
    if (chosen.length === most) return;
    cases.slice(from).forEach((each, ahead) => {
      const next = [...chosen, each];
      all.push(next);
      extend(next, from + ahead);
    });
  };
  extend([], 0);
  return all;
};

describe('standing against a count by hand', () => {
  it('agrees for every combination of up to six members', () => {
    const all = combinations(6);
    // C(8 + 6, 6): so none was left out.
    expect(all).toHaveLength(3003);
    for (const chosen of all) {
      const records = chosen.map(({ says: _says, open: _open, ...record }, member) => ({
        ...record,
        memberId: `member-${member}`,
        recordedAt: `2031-05-0${member + 1}T09:30:00Z`,
      }));
      const standing = standingOf(records, 'member-0');
      expect({ word: standing.word, of: chosen.map((each) => each.says) }).toEqual({
        word: countByHand(chosen),
        of: chosen.map((each) => each.says),
      });
      expect(standing.votesFor).toBe(chosen.filter((each) => each.says === 'for').length);
      expect(standing.votesAgainst).toBe(chosen.filter((each) => each.says === 'against').length);
    }
  });
});
