import type { StandingWord } from '#shared/api/vocabulary.ts';
import { type EvidenceRecord, hasUnsettledHazard, voteOf, votingRecords } from './votes.ts';
import { wilsonInterval } from './wilson-interval.ts';

export interface StandingCount {
  readonly word: StandingWord;
  readonly votesFor: number;
  readonly votesAgainst: number;
  /** Ends of the 95 % Wilson interval of votes for. */
  readonly low: number;
  readonly high: number;
  /** Records that are shown and do not count: failures by the operator's own slip alone. */
  readonly setAside: number;
  /** Records with a hazard that no moderator has settled. */
  readonly unsettledHazards: number;
}

const WELL_PROVEN_LOW = 0.6;

const wordOf = (
  votesFor: number,
  votesAgainst: number,
  forByOthers: number,
  unsettledHazards: number,
  low: number,
): StandingWord => {
  const votes = votesFor + votesAgainst;
  // Thirds are compared in whole numbers: 2 of 3 is two thirds exactly.
  const twoThirdsFor = 3 * votesFor >= 2 * votes;
  if (unsettledHazards > 0 || !twoThirdsFor) return 'disputed';
  if (votes === 0) return 'uncut';
  if (votesFor < 2 || forByOthers < 1) return 'cut-once';
  return low >= WELL_PROVEN_LOW ? 'well-proven' : 'proven';
};

/**
 * What the records of one material family and one revision geometry add up to: one vote a member.
 * An unsettled hazard on any record, old ones too, disputes; a moderator's withholding overrides all.
 */
export const standingOf = (
  records: readonly EvidenceRecord[],
  uploaderId: string,
  { withheld = false }: { readonly withheld?: boolean } = {},
): StandingCount => {
  const voting = [...votingRecords(records).values()];
  const forRecords = voting.filter((record) => voteOf(record) === 'for');
  const votesFor = forRecords.length;
  const votesAgainst = voting.length - votesFor;
  const forByOthers = forRecords.filter((record) => record.memberId !== uploaderId).length;
  const unsettledHazards = records.filter(hasUnsettledHazard).length;
  const { low, high } = wilsonInterval(votesFor, voting.length);
  const word = withheld ? 'withheld' : wordOf(votesFor, votesAgainst, forByOthers, unsettledHazards, low);
  const setAside = records.filter((record) => voteOf(record) === 'set-aside').length;
  return { word, votesFor, votesAgainst, low, high, setAside, unsettledHazards };
};
