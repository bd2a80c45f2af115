import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { design, flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import { hasRole, type SignedIn } from '#server/http/session.ts';
import { createOnce, requestHash } from '#server/idempotency.ts';
import type { Flag, FlagCreate } from '#shared/api/flags.ts';
import { isHazard } from '#shared/evidence/went-wrong.ts';
import { decideInTransaction } from './decide-flag.ts';
import { type FlagTarget, findTarget } from './find-target.ts';
import { flagRow } from './flag-rows.ts';
import { insertFlag } from './insert-flag.ts';
import { presentFlag } from './present-flag.ts';
import { refreshGeometry } from './refresh-geometry.ts';
import { tellOfFlag } from './tell-of-flag.ts';

export type Actor = Pick<SignedIn, 'id' | 'role'>;

/** A member's call for a decision; a moderator's may carry the decision, and both are there or neither. */
export async function raiseFlag(
  deps: Deps,
  member: Actor,
  given: FlagCreate,
  key?: string | undefined,
): Promise<Flag> {
  if (given.decision !== undefined && !hasRole(member, 'moderator')) {
    throw new ProblemError(
      403,
      'role.too-low',
      'Only a moderator of the club may decide. Leave the decision out to raise the flag alone.',
    );
  }
  const repeatable = { memberId: member.id, key, request: requestHash('flag', JSON.stringify(given)) };
  let target: FlagTarget | undefined;
  const raised = await createOnce(deps, repeatable, async (tx) => {
    target = await findTarget(tx, given);
    const id = await raise(deps, tx, member, target, given);
    return presentFlag(await requireRow(tx, id));
  });
  if (given.decision !== undefined && target !== undefined) {
    deps.mail.nudge();
    await refreshGeometry(deps, target);
  }
  return raised;
}

async function raise(deps: Deps, tx: Transaction, member: Actor, target: FlagTarget, given: FlagCreate) {
  await refuseSecond(tx, member.id, target);
  const id = await insertFlag(deps, tx, {
    designId: target.designId,
    revisionId: target.revisionId,
    cutId: target.record?.id ?? null,
    level: target.record?.wentWrong.some(isHazard) ? 'do-not-cut' : 'caution',
    reason: given.reason,
    raisedBy: member.id,
  });
  if (given.decision === undefined) await tellOfFlag(deps, tx, id);
  else
    await decideInTransaction(deps, tx, member, await requireRow(tx, id), {
      ...given.decision,
      pathOfAction: 'decision.action',
    });
  return id;
}

/** One open flag a member and target; two at once wait for each other at the design's row. */
async function refuseSecond(tx: Transaction, memberId: string, target: FlagTarget): Promise<void> {
  await tx.select({ id: design.id }).from(design).where(eq(design.id, target.designId)).for('no key update');
  const [open] = await tx
    .select({ id: flag.id })
    .from(flag)
    .where(
      and(
        eq(flag.isOpen, true),
        eq(flag.raisedBy, memberId),
        eq(flag.revisionId, target.revisionId),
        target.record === null ? isNull(flag.cutId) : eq(flag.cutId, target.record.id),
      ),
    );
  if (open === undefined) return;
  const row = await requireRow(tx, open.id);
  throw new ProblemError(
    409,
    'flag.already-open',
    'You have flagged this already, and a moderator has not decided yet. One flag is enough.',
    { current: presentFlag(row) },
  );
}

async function requireRow(tx: Transaction, id: string) {
  const row = await flagRow(tx, id);
  if (row === null) throw new Error(`flag ${id} is missing in its own transaction`);
  return row;
}
