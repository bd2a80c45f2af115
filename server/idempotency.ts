import { createHash } from 'node:crypto';
import { and, eq, lt } from 'drizzle-orm';
import type { Transaction } from './db/client.ts';
import { isUniqueViolation } from './db/errors.ts';
import { idempotencyKey } from './db/schema/index.ts';
import type { Deps } from './deps.ts';
import { ProblemError } from './http/problem.ts';

const keyPattern = /^[A-Za-z0-9_.:-]{1,100}$/;
const keptForMs = 24 * 60 * 60 * 1000;

export interface Repeatable {
  memberId: string;
  /** The Idempotency-Key header; without one every request is new. */
  key: string | undefined;
  /** What the request says, so that a key is not used for two different ones. */
  request: string;
}

export const requestHash = (...parts: (string | Buffer)[]) => {
  const hash = createHash('sha256');
  for (const part of parts) hash.update(part).update('\0');
  return hash.digest('hex');
};

/** The answer already given to this request, if it is a repetition. */
export async function earlierAnswer<Answer>(deps: Deps, repeatable: Repeatable): Promise<Answer | null> {
  const { memberId, key } = repeatable;
  if (key === undefined) return null;
  if (!keyPattern.test(key)) {
    throw new ProblemError(
      400,
      'idempotency.bad-key',
      'Idempotency-Key must be 1 to 100 letters, digits, dots, colons, hyphens or underscores.',
    );
  }
  const found = await deps.database.db.query.idempotencyKey.findFirst({
    where: and(eq(idempotencyKey.memberId, memberId), eq(idempotencyKey.key, key)),
  });
  if (found === undefined) return null;
  if (found.requestHash !== repeatable.request) {
    throw new ProblemError(
      422,
      'idempotency.reused',
      'This Idempotency-Key was used for a different request. Use a new key for each new thing.',
    );
  }
  return found.answer as Answer;
}

/** Creates something once: the answer is kept in the same transaction, so a repetition gets it again. */
export async function createOnce<Answer>(
  deps: Deps,
  repeatable: Repeatable,
  create: (tx: Transaction) => Promise<Answer>,
): Promise<Answer> {
  const earlier = await earlierAnswer<Answer>(deps, repeatable);
  if (earlier !== null) return earlier;
  const { memberId, key } = repeatable;
  try {
    return await deps.database.db.transaction(async (tx) => {
      const answer = await create(tx);
      if (key !== undefined) {
        const now = deps.clock.now();
        await tx
          .delete(idempotencyKey)
          .where(lt(idempotencyKey.createdAt, new Date(now.getTime() - keptForMs)));
        await tx.insert(idempotencyKey).values({
          memberId,
          key,
          requestHash: repeatable.request,
          status: 201,
          answer,
          createdAt: now,
        });
      }
      return answer;
    });
  } catch (error) {
    // The same request came twice at once and the other one was faster: its answer is this one's too.
    if (key !== undefined && isUniqueViolation(error)) {
      const answer = await earlierAnswer<Answer>(deps, repeatable);
      if (answer !== null) return answer;
    }
    throw error;
  }
}
