import type { Outcome } from '#shared/api/vocabulary.ts';
import { isHazard, isOperatorSlip } from './went-wrong.ts';

/** What standing needs of a cut record; of one material family and one revision geometry. */
export interface EvidenceRecord {
  readonly memberId: string;
  /** ISO 8601 with its zone. */
  readonly recordedAt: string;
  readonly outcome: Outcome;
  readonly inService?: 'holds' | 'broke';
  readonly wentWrong: readonly string[];
  /** A moderator looked at the hazards of this record and settled them. */
  readonly hazardsSettled?: boolean;
  /** A hazard it reported, now or before a correction, waits for a moderator. */
  readonly hazardOpen?: boolean;
}

export type Vote = 'for' | 'against' | 'set-aside';

/**
 * What one record says. A failure is set aside when the operator's own slips are all that went wrong;
 * a part that broke in use always counts against.
 */
export const voteOf = ({ outcome, inService, wentWrong }: EvidenceRecord): Vote => {
  if (inService === 'broke') return 'against';
  if (outcome !== 'failed') return 'for';
  return wentWrong.length > 0 && wentWrong.every(isOperatorSlip) ? 'set-aside' : 'against';
};

/** True when a record reports a hazard, or did, that no moderator has settled. */
export const hasUnsettledHazard = ({
  wentWrong,
  hazardsSettled,
  hazardOpen,
}: Pick<EvidenceRecord, 'wentWrong' | 'hazardsSettled' | 'hazardOpen'>): boolean =>
  hazardOpen === true || (hazardsSettled !== true && wentWrong.some(isHazard));

/**
 * The record that speaks for each member: the latest one that counts. A record that is set aside
 * leaves the member's earlier evidence as it was. Of two at the same instant the later listed counts.
 */
export const votingRecords = <Record extends EvidenceRecord>(
  records: readonly Record[],
): Map<string, Record> => {
  const latest = new Map<string, Record>();
  for (const record of records) {
    if (voteOf(record) === 'set-aside') continue;
    const earlier = latest.get(record.memberId);
    if (earlier === undefined || Date.parse(record.recordedAt) >= Date.parse(earlier.recordedAt)) {
      latest.set(record.memberId, record);
    }
  }
  return latest;
};
