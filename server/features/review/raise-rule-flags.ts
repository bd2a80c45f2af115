import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { Finding } from '#shared/api/findings.ts';
import { insertFlag } from './insert-flag.ts';
import { tellOfFlag } from './tell-of-flag.ts';
import { keptSettings } from './told-before.ts';

export interface RuleFindings {
  designId: string;
  revisionId: string;
  /** The record whose settings the findings are about; null for findings on the revision itself. */
  cutId: string | null;
  findings: readonly Finding[];
}

/**
 * Calls for a decision on each *do not cut* finding, once for each rule and target while it is open: the open one
 * says what the finding says now. Settings that carry one are withheld until a moderator decides. A correction of
 * a record that leaves its settings alone raises nothing anew; one that mends them makes the open flag a mere note.
 */
export async function raiseRuleFlags(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  { designId, revisionId, cutId, findings }: RuleFindings,
): Promise<void> {
  const grave = new Map(
    findings.filter(({ level }) => level === 'do-not-cut').map((finding) => [finding.ruleId, finding]),
  );
  if (cutId !== null && (await keptSettings(tx, cutId))) return;
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
  for (const row of open) {
    if (row.finding !== null && row.level === 'do-not-cut' && !grave.has(row.finding.ruleId))
      await makeNote(tx, row, row.finding);
  }
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
    .set({ reason: finding.sentence, level: finding.level, finding, version: known.version + 1 })
    .where(eq(flag.id, known.id));
}

/** The rule is content with the settings as they were corrected: the flag stays to be looked at, and withholds nothing. */
async function makeNote(
  tx: Transaction,
  { id, version }: typeof flag.$inferSelect,
  finding: Finding,
): Promise<void> {
  const reason = `The record was corrected since, and the rule finds this no more: ${finding.sentence}`;
  await tx
    .update(flag)
    .set({ reason, level: 'note', version: version + 1 })
    .where(eq(flag.id, id));
}
