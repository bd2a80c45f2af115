import type { CutRecord } from '#shared/api/cuts.ts';
import type { EvidenceRecord } from '#shared/evidence/votes.ts';

/** A record as the standing counts it. */
export const evidenceRecordOf = (record: CutRecord): EvidenceRecord => ({
  memberId: record.member.id,
  recordedAt: record.createdAt,
  outcome: record.outcome,
  wentWrong: record.wentWrong,
  hazardsSettled: record.hazardsSettled,
  ...(record.inService === undefined ? {} : { inService: record.inService.result }),
});
