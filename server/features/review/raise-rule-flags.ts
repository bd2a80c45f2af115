import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { Finding } from '#shared/api/findings.ts';
import { insertFlag } from './insert-flag.ts';
import { tellOfFlag } from './tell-of-flag.ts';

export interface RuleFindings {
  designId: string;
  revisionId: string;
  /** The record whose settings the findings are about; null for findings on the revision itself. */
  cutId: string | null;
  findings: readonly Finding[];
}

/**
 * Calls for a decision on each *do not cut* finding, once for each rule and target while it is open: the open one
 * says what the finding says now. Settings that carry one are withheld until a moderator decides.
 */
export async function raiseRuleFlags(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  { designId, revisionId, cutId, findings }: RuleFindings,
): Promise<void> {
  const grave = new Map(
    findings.filter(({ level }) => level === 'do-not-cut').map((finding) => [finding.ruleId, finding]),
  );
  if (grave.size === 0) return;
  const open = await tx
    .select()
    .from(flag)
    .where(
      and(
        eq(flag.isOpen, true),
        isNull(flag.raisedBy),
        eq(flag.revisionId, revisionId),
        cutId === null ? isNull(flag.cutId) : eq(flag.cutId, cutId),
      ),
    );
  for (const finding of grave.values()) {
    const known = open.find((row) => row.finding?.ruleId === finding.ruleId);
    if (known !== undefined) {
      if (known.reason !== finding.sentence) await bringUpToDate(tx, known, finding);
      continue;
    }
    const flagId = await insertFlag(deps, tx, {
      designId,
      revisionId,
      cutId,
      level: finding.level,
      reason: finding.sentence,
      raisedBy: null,
      finding,
    });
    await tellOfFlag(deps, tx, flagId);
  }
}

/** A corrected record has other figures: a moderator who still looks at the old ones meets a conflict. */
async function bringUpToDate(
  tx: Transaction,
  known: typeof flag.$inferSelect,
  finding: Finding,
): Promise<void> {
  await tx
    .update(flag)
    .set({ reason: finding.sentence, finding, version: known.version + 1 })
    .where(eq(flag.id, known.id));
}
