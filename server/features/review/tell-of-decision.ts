import { eq, or, type SQL, sql } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { cut, outbox, revision, take } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { insertNotice } from '#server/features/notices/insert-notice.ts';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import { type Availability, isWithholding } from '#shared/review/availability.ts';
import { type Circumstances, decisionSentence, takerSentence } from './decision-words.ts';
import { availabilities } from './decisions.ts';
import type { FlagRow } from './flag-rows.ts';

interface Decided {
  id: string;
  action: DecisionAction;
  reason: string;
  deciderId: string;
}

/** Tells everyone whom a decision concerns; the decider knows of their own flag. */
export async function tellOfDecision(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  row: FlagRow,
  decided: Decided,
): Promise<void> {
  const named = { ...row.design, revision: row.number };
  const { designId, revisionId, raisedBy, cutId } = row.flag;
  const availability = (await availabilities(tx, [designId])).of(designId);
  const circumstances = circumstancesOf(row, decided.action, availability, revisionId);
  const sentence = decisionSentence(decided.action, named, decided.reason, circumstances);
  const told = new Map<string, string>([[row.design.ownerId, sentence]]);
  const recordBy = cutId === null ? null : await memberOfRecord(tx, cutId);
  if (recordBy !== null && !told.has(recordBy)) told.set(recordBy, `About your cut record. ${sentence}`);
  if (raisedBy !== null && raisedBy !== decided.deciderId)
    told.set(raisedBy, `Your flag was decided. ${sentence}`);
  for (const [memberId, text] of told) {
    await insertNotice(deps, tx, { memberId, kind: 'flag-decided', sentence: text, designId });
  }
  await mailDecision(deps, tx, { ...decided, sentence }, [row.design.ownerId, raisedBy]);
  await tellTakers(deps, tx, row, decided, availability);
}

/** What a restoration is of, and what stays withheld beside what the decision itself says. */
function circumstancesOf(
  row: FlagRow,
  action: DecisionAction,
  { design, revisions }: Availability,
  revisionId: string,
): Circumstances {
  const { cutId } = row.flag;
  const before = row.decision?.decision.action;
  // A flag on a record may have withheld the revision or design: then its restoration is of that.
  const isOnRecord = cutId !== null && before !== 'withholdRevision' && before !== 'withholdDesign';
  if (action === 'withholdDesign') return { isOnRecord };
  if (design !== null) return { isOnRecord, stillWithheld: 'design' };
  const isRevision = revisions.has(revisionId) && action !== 'withholdRevision';
  return { isOnRecord, stillWithheld: isRevision ? 'revision' : null };
}

/** Whoever took what is withheld now must not cut it; the same people hear when it comes back. */
async function tellTakers(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  row: FlagRow,
  { action, reason }: Decided,
  availability: Availability,
): Promise<void> {
  if (action !== 'restore' && !isWithholding(action)) return;
  const named = { ...row.design, revision: row.number };
  const idOf = await revisionIds(tx, row.flag.designId);
  for (const taker of await takers(tx, row, action)) {
    if (taker.memberId === row.design.ownerId) continue;
    await insertNotice(deps, tx, {
      memberId: taker.memberId,
      kind: action === 'restore' ? 'restored' : 'withheld',
      sentence: takerSentence(
        action,
        { ...named, revision: taker.revision },
        reason,
        circumstancesOf(row, action, availability, idOf.get(taker.revision) ?? row.flag.revisionId),
      ),
      designId: row.flag.designId,
    });
  }
}

/** Each member who took what the decision is about, with the newest of the revisions that they took. */
function takers(tx: Transaction, row: FlagRow, action: DecisionAction) {
  const { designId, revisionId, cutId } = row.flag;
  // A restoration is for those whom the withholding before it was for; without one, for the whole design.
  const scope = action === 'restore' ? (row.decision?.decision.action ?? 'withholdDesign') : action;
  const where: SQL | undefined =
    scope === 'withholdDesign'
      ? eq(revision.designId, designId)
      : or(eq(take.revisionId, revisionId), cutId === null ? undefined : eq(take.cutId, cutId));
  return tx
    .select({ memberId: take.memberId, revision: sql<number>`max(${revision.number})::int` })
    .from(take)
    .innerJoin(revision, eq(revision.id, take.revisionId))
    .where(where)
    .groupBy(take.memberId)
    .orderBy(take.memberId);
}

async function revisionIds(tx: Transaction, designId: string): Promise<Map<number, string>> {
  const rows = await tx
    .select({ id: revision.id, number: revision.number })
    .from(revision)
    .where(eq(revision.designId, designId));
  return new Map(rows.map(({ id, number }) => [number, id]));
}

async function memberOfRecord(tx: Transaction, cutId: string): Promise<string | null> {
  const [row] = await tx.select({ memberId: cut.memberId }).from(cut).where(eq(cut.id, cutId));
  return row?.memberId ?? null;
}

/** Mail to the owner and to the flagger: the sentence as it was true then, the rest is put together when it is sent. */
async function mailDecision(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  { id, deciderId, sentence }: Decided & { sentence: string },
  people: readonly (string | null)[],
): Promise<void> {
  for (const memberId of new Set(people)) {
    if (memberId === null || memberId === deciderId) continue;
    await tx.insert(outbox).values({
      id: deps.ids.next(),
      kind: 'decision',
      payload: { decisionId: id, memberId, sentence },
      createdAt: deps.clock.now(),
    });
  }
}
