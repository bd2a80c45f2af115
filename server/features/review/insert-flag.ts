import { appendAudit } from '#server/audit/append.ts';
import type { Transaction } from '#server/db/client.ts';
import { flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { Finding } from '#shared/api/findings.ts';
import type { FindingLevel } from '#shared/api/vocabulary.ts';

export interface NewFlag {
  designId: string;
  revisionId: string;
  cutId: string | null;
  level: FindingLevel;
  reason: string;
  /** Null when a rule raises it. */
  raisedBy: string | null;
  finding?: Finding | undefined;
}

/** Writes an open flag and its audit entry; the caller has seen that there is none like it. */
export async function insertFlag(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  given: NewFlag,
): Promise<string> {
  const id = deps.ids.next();
  const now = deps.clock.now();
  await tx.insert(flag).values({ ...given, id, finding: given.finding ?? null, createdAt: now });
  await appendAudit(tx, {
    at: now,
    actorId: given.raisedBy,
    action: 'flag.raised',
    subject: `flag:${id}`,
    detail: {
      design: given.designId,
      revision: given.revisionId,
      ...(given.cutId === null ? {} : { record: given.cutId }),
      ...(given.finding === undefined ? {} : { rule: given.finding.ruleId }),
      level: given.level,
    },
  });
  return id;
}
