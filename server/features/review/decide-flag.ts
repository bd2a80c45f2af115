import { createHash } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { appendAudit } from '#server/audit/append.ts';
import type { Transaction } from '#server/db/client.ts';
import { isUuid } from '#server/db/is-uuid.ts';
import { cut, decision, flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { SignedIn } from '#server/http/session.ts';
import type { DecisionCreate, Flag } from '#shared/api/flags.ts';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import { isWithholding } from '#shared/review/availability.ts';
import { whoDecided } from './decision-words.ts';
import { availabilities } from './decisions.ts';
import { type FlagRow, flagRow } from './flag-rows.ts';
import { presentFlag } from './present-flag.ts';
import { refreshGeometry } from './refresh-geometry.ts';
import { tellOfDecision } from './tell-of-decision.ts';

type Actor = Pick<SignedIn, 'id' | 'role'>;

/** Decides a flag: the flag closed, decision, audit entry, notices and mail are there together, or none is. */
export async function decideFlag(
  deps: Deps,
  member: Actor,
  id: string,
  given: DecisionCreate,
): Promise<Flag> {
  const { db } = deps.database;
  const decided = await db.transaction(async (tx) => {
    const row = isUuid(id) ? await flagRow(tx, id) : null;
    if (row === null) throw new ProblemError(404, 'flag.not-found', 'There is no such flag.');
    if (row.flag.version !== given.version) throw conflict(row, member, deps.clock.now());
    await decideInTransaction(deps, tx, member, row, { ...given, pathOfAction: 'action' });
    return (await flagRow(tx, id)) ?? row;
  });
  deps.mail.nudge();
  await refreshGeometry(deps, { designId: decided.flag.designId, geometryHash: decided.geometryHash });
  return presentFlag(decided);
}

export interface DecisionGiven {
  action: DecisionAction;
  reason: string;
  /** Where the action stands in the request, for the problem that names it. */
  pathOfAction: string;
}

/** Decides the flag as it stands in `row`; a change since then is a conflict. */
export async function decideInTransaction(
  deps: Deps,
  tx: Transaction,
  member: Actor,
  row: FlagRow,
  given: DecisionGiven,
): Promise<void> {
  const { action, reason } = given;
  const now = deps.clock.now();
  if (row.design.ownerId === member.id) {
    throw new ProblemError(
      403,
      'decision.own-design',
      'This is your own design: nobody decides on their own. Another moderator has to decide.',
    );
  }
  await refuseOwnRecord(tx, member, row);
  await requirePossible(tx, member, row, given, now);
  const [closed] = await tx
    .update(flag)
    .set({ isOpen: false, version: row.flag.version + 1 })
    .where(and(eq(flag.id, row.flag.id), eq(flag.version, row.flag.version)))
    .returning({ id: flag.id });
  if (closed === undefined) throw conflict((await flagRow(tx, row.flag.id)) ?? row, member, now);
  const decisionId = deps.ids.next();
  await tx
    .insert(decision)
    .values({ id: decisionId, flagId: row.flag.id, action, reason, decidedBy: member.id, decidedAt: now });
  await appendAudit(tx, {
    at: now,
    actorId: member.id,
    action: 'flag.decided',
    subject: `flag:${row.flag.id}`,
    detail: {
      decision: decisionId,
      action,
      design: row.flag.designId,
      revision: row.flag.revisionId,
      ...(row.flag.cutId === null ? {} : { record: row.flag.cutId }),
      // The reason may name people, so the log holds its hash: a reason changed later shows.
      reasonSha256: createHash('sha256').update(reason).digest('hex'),
    },
  });
  await tellOfDecision(deps, tx, row, { id: decisionId, action, reason, deciderId: member.id });
}

async function refuseOwnRecord(tx: Transaction, member: Actor, { flag }: FlagRow): Promise<void> {
  if (flag.cutId === null) return;
  const [record] = await tx.select({ memberId: cut.memberId }).from(cut).where(eq(cut.id, flag.cutId));
  if (record?.memberId !== member.id) return;
  throw new ProblemError(
    403,
    'decision.own-record',
    'This is your own cut record: nobody decides on their own. Another moderator has to decide.',
  );
}

async function requirePossible(
  tx: Transaction,
  member: Actor,
  row: FlagRow,
  { action, pathOfAction }: DecisionGiven,
  now: Date,
): Promise<void> {
  const before = row.decision?.decision.action;
  const isRestored = action === 'restore' && before !== undefined && isWithholding(before);
  if (!row.flag.isOpen && !isRestored) throw conflict(row, member, now, 'flag.decided');
  if (action === 'withholdSettings' && row.flag.cutId === null) {
    throw notPossible(
      pathOfAction,
      'This flag names no cut record, so it has no settings to withhold. Withhold the revision, or flag the record.',
    );
  }
  if (action === 'restore' && row.flag.isOpen && !(await isWithheld(tx, row))) {
    throw notPossible(
      pathOfAction,
      'Nothing of what this flag is about is withheld. Dismiss it, or restore a design by the flag that withheld it.',
    );
  }
}

/** What an open flag, which withheld nothing itself, could restore: as `lifts` in availability.ts has it. */
async function isWithheld(tx: Transaction, { flag }: FlagRow): Promise<boolean> {
  const known = (await availabilities(tx, [flag.designId])).of(flag.designId);
  if (flag.cutId === null) return known.revisions.has(flag.revisionId);
  return known.settings.has(flag.cutId) && !known.waiting.has(flag.cutId);
}

const notPossible = (path: string, message: string) =>
  new ProblemError(422, 'input.invalid', message, { errors: [{ path, message }] });

/** Somebody was faster, or the flag is decided: what they did, and the flag as it is now. */
function conflict(row: FlagRow, member: Actor, now: Date, type = 'flag.changed'): ProblemError {
  const decided = row.decision;
  const detail =
    decided === null
      ? 'This flag was changed in the meantime. Look at it again before you decide.'
      : whoDecided(
          {
            ...decided.decision,
            deciderName: decided.deciderName,
            isMine: decided.decision.decidedBy === member.id,
          },
          now,
        );
  return new ProblemError(409, type, detail, { current: presentFlag(row) });
}
