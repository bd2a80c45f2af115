import type { Logger } from 'pino';
import { type Outbox, type OutboxDeps, openOutbox } from './send-outbox.ts';
import type { MailTransport } from './transport.ts';

export interface OutboxWorker {
  /** Something was put into the outbox: send it soon, not at the next round. */
  nudge(): void;
  start(): void;
  /** Finishes the mail it is at; what still waits goes out after the next start. */
  stop(): Promise<void>;
}

const everyMs = 10_000;

export function outboxWorker(deps: OutboxDeps, transport: MailTransport): OutboxWorker {
  const rounds = repeatedly(openOutbox(deps, transport), deps.log);
  let timer: NodeJS.Timeout | undefined;
  return {
    nudge: () => {
      if (timer !== undefined) rounds.again();
    },
    start() {
      timer = setInterval(rounds.again, everyMs);
      rounds.again();
    },
    async stop() {
      clearInterval(timer);
      timer = undefined;
      await rounds.end();
      transport.close();
    },
  };
}

/** One round at a time; a call during one is a round after it. */
function repeatedly(outbox: Outbox, log: Logger): { again(): void; end(): Promise<void> } {
  let running: Promise<void> | null = null;
  let isWanted = false;
  let hasEnded = false;
  const work = async () => {
    while (isWanted && !hasEnded) {
      isWanted = false;
      try {
        await outbox.sendDue();
      } catch (error) {
        log.error({ err: error }, 'the outbox could not be worked through');
      }
    }
    running = null;
  };
  return {
    again() {
      isWanted = true;
      running ??= work();
    },
    async end() {
      hasEnded = true;
      await running;
    },
  };
}
