import { and, asc, eq, isNull } from 'drizzle-orm';
import { outbox } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { type ComposeDeps, composeMail } from './compose.ts';
import type { MailTransport } from './transport.ts';

export type OutboxDeps = ComposeDeps & Pick<Deps, 'log'>;

const firstWaitMs = 10_000;
const longestWaitMs = 60 * 60 * 1000;
const mostInOnePass = 500;

/** How long a mail that failed is left alone: twice as long each time, and an hour at most. */
export const waitAfter = (attempts: number): number =>
  Math.min(firstWaitMs * 2 ** Math.max(0, attempts - 1), longestWaitMs);

export interface Outbox {
  /** Tries every waiting mail once that is due; tells how many went out. */
  sendDue(): Promise<number>;
}

/**
 * Sends what waits in the outbox. A row is claimed by counting the attempt before it is sent, so that two workers
 * never send one; it is marked once the transport has it. A mail that fails waits and is tried again.
 */
export function openOutbox(deps: OutboxDeps, transport: MailTransport): Outbox {
  /** Until when a mail that failed is left alone. A new process tries at once. */
  const notBefore = new Map<string, number>();
  const { db } = deps.database;

  async function sendOne(row: typeof outbox.$inferSelect): Promise<boolean> {
    const attempts = row.attempts + 1;
    const claimed = await db
      .update(outbox)
      .set({ attempts })
      .where(and(eq(outbox.id, row.id), isNull(outbox.sentAt), eq(outbox.attempts, row.attempts)))
      .returning({ id: outbox.id });
    if (claimed.length === 0) return false;
    try {
      const message = await composeMail(deps, row);
      if (message !== null) await transport.send(message);
      await db.update(outbox).set({ sentAt: deps.clock.now() }).where(eq(outbox.id, row.id));
      notBefore.delete(row.id);
      return message !== null;
    } catch (error) {
      notBefore.set(row.id, deps.clock.now().getTime() + waitAfter(attempts));
      throw error;
    }
  }

  return {
    async sendDue() {
      const waiting = await db
        .select()
        .from(outbox)
        .where(isNull(outbox.sentAt))
        // Those tried least come first: mails that are refused for good never stand in the way of new ones.
        .orderBy(asc(outbox.attempts), asc(outbox.createdAt), asc(outbox.id))
        .limit(mostInOnePass);
      const now = deps.clock.now().getTime();
      let sent = 0;
      for (const row of waiting) {
        if ((notBefore.get(row.id) ?? 0) > now) continue;
        try {
          if (await sendOne(row)) sent += 1;
        } catch (error) {
          logFailure(deps, row.id, error);
          // No answer at all: the rest would wait for the same silence.
          if (!wasAnswered(error)) break;
        }
      }
      return sent;
    },
  };
}

/** An SMTP server that refuses one mail gives a reply code (RFC 5321, 4.2); the next mail may go through. */
const wasAnswered = (error: unknown): boolean =>
  typeof (error as { responseCode?: unknown } | null)?.responseCode === 'number';

/** Codes only: the message of a mail error repeats addresses. */
function logFailure(deps: OutboxDeps, outboxId: string, error: unknown): void {
  const { name, code, responseCode } = error as { name?: string; code?: string; responseCode?: number };
  deps.log.error({ outboxId, name, code, responseCode }, 'a mail was not sent and will be tried again');
}
