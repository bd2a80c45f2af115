import type { CutRecord } from '#shared/api/cuts.ts';
import type { Standing } from '#shared/api/designs.ts';
import { hasUnsettledHazard, voteOf } from '#shared/evidence/votes.ts';
import { isHazard } from '#shared/evidence/went-wrong.ts';
import { sayCutDay } from '../../../words/say-cut-day.ts';
import { wentWrongLabels } from '../../../words/went-wrong-labels.ts';
import { evidenceRecordOf } from './evidence-record.ts';

const records = (count: number): string => (count === 1 ? '1 record' : `${count} records`);

const hazardsOf = ({ wentWrong, member, cutOn }: CutRecord): string => {
  const named = wentWrong.filter(isHazard).map((code) => wentWrongLabels[code].toLowerCase());
  return `${named.join(', ')} (${member.name}, ${sayCutDay(cutOn)})`;
};

export interface StandingReasons {
  /** Why it is disputed; null when it is not. */
  readonly disputed: string | null;
  /** What is shown and does not count; null when everything counts. */
  readonly setAside: string | null;
}

/** Why a standing is what it is, from the records of its material. */
export const standingReasons = (
  { material, word, votesFor, votesAgainst }: Standing,
  all: readonly CutRecord[],
): StandingReasons => {
  const ofMaterial = all.filter(({ materialFamily }) => materialFamily === material);
  const unsettled = ofMaterial.filter((record) => hasUnsettledHazard(evidenceRecordOf(record)));
  const asideCount = ofMaterial.filter((record) => voteOf(evidenceRecordOf(record)) === 'set-aside').length;
  const tooFew = 3 * votesFor < 2 * (votesFor + votesAgainst);
  const reasons = [
    ...(unsettled.length > 0
      ? [`no moderator has settled the hazard: ${unsettled.map(hazardsOf).join('; ')}`]
      : []),
    ...(tooFew ? ['less than two thirds of the votes are for'] : []),
  ];
  return {
    disputed: word === 'disputed' && reasons.length > 0 ? `Disputed: ${reasons.join(', and ')}.` : null,
    setAside:
      asideCount > 0
        ? `${records(asideCount)} shown and not counted: failed by the member’s own slip alone.`
        : null,
  };
};
