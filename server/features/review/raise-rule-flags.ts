import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { Finding } from '#shared/api/findings.ts';

export interface RuleFindings {
  designId: string;
  revisionId: string;
  /** The record whose settings the findings are about; null for findings on the revision itself. */
  cutId: string | null;
  findings: readonly Finding[];
}

/**
 * Calls for a decision on each *do not cut* finding, once for each rule and target while it is open. Settings
 * that carry one are withheld until a moderator decides.
 */
export async function raiseRuleFlags(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  { designId, revisionId, cutId, findings }: RuleFindings,
): Promise<void> {
  const grave = findings.filter(({ level }) => level === 'do-not-cut');
  if (grave.length === 0) return;
  const open = await tx
    .select({ finding: flag.finding })
    .from(flag)
    .where(
      and(
        eq(flag.isOpen, true),
        isNull(flag.raisedBy),
        eq(flag.revisionId, revisionId),
        cutId === null ? isNull(flag.cutId) : eq(flag.cutId, cutId),
      ),
    );
  const known = new Set(open.map(({ finding }) => finding?.ruleId));
  for (const finding of grave) {
    if (known.has(finding.ruleId)) continue;
    known.add(finding.ruleId);
    await tx.insert(flag).values({
      id: deps.ids.next(),
      designId,
      revisionId,
      cutId,
      level: finding.level,
      reason: finding.sentence,
      raisedBy: null,
      finding,
      createdAt: deps.clock.now(),
    });
  }
}
