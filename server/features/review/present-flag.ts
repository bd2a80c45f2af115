import type { Flag } from '#shared/api/flags.ts';
import type { FlagRow } from './flag-rows.ts';

export function presentFlag(row: FlagRow): Flag {
  const { flag, decision } = row;
  return {
    id: flag.id,
    version: flag.version,
    state: flag.isOpen ? 'open' : 'decided',
    design: row.design,
    revision: row.number,
    ...(flag.cutId === null ? {} : { recordId: flag.cutId }),
    level: flag.level,
    reason: flag.reason,
    ...(flag.raisedBy === null ? {} : { raisedBy: { id: flag.raisedBy, name: String(row.raiserName) } }),
    ...(flag.finding === null ? {} : { finding: flag.finding }),
    takeCount: row.takeCount,
    createdAt: flag.createdAt.toISOString(),
    ...(decision === null
      ? {}
      : {
          decision: {
            action: decision.decision.action,
            reason: decision.decision.reason,
            decidedBy: { id: decision.decision.decidedBy, name: decision.deciderName },
            decidedAt: decision.decision.decidedAt.toISOString(),
          },
        }),
  };
}
