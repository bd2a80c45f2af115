import { type EvidenceRecord, hasUnsettledHazard } from './votes.ts';

/**
 * Whether the settings of a record may be handed out without being asked for: it came out clean, what was cut has
 * not broken in use since, and no hazard that it reports is unsettled. Whether they are withheld is asked apart.
 */
export const mayBeDefault = (
  record: Pick<EvidenceRecord, 'outcome' | 'inService' | 'wentWrong' | 'hazardsSettled' | 'hazardOpen'>,
): boolean => record.outcome === 'clean' && record.inService !== 'broke' && !hasUnsettledHazard(record);
