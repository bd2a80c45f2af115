import type { PGlite, Transaction } from '@electric-sql/pglite';

/** PGlite answers on the event loop: a query that takes longer than this holds everything else up. */
const mostMs = 50;
/** The first runs of a statement also pay for planning and for a cold database. */
const judgedFrom = 3;

type Query = (...args: unknown[]) => Promise<unknown>;

/**
 * Times every query of a client. The fastest run of a statement counts, since the machine is shared:
 * a statement that is slow by itself is slow every time.
 */
export function timeQueries(client: PGlite): { slow(): string[] } {
  const runs = new Map<string, { count: number; fastestMs: number }>();
  const timed =
    (query: Query): Query =>
    async (...args) => {
      const startedMs = performance.now();
      try {
        return await query(...args);
      } finally {
        const tookMs = performance.now() - startedMs;
        const text = String(args[0]);
        const { count, fastestMs } = runs.get(text) ?? { count: 0, fastestMs: Number.POSITIVE_INFINITY };
        runs.set(text, { count: count + 1, fastestMs: Math.min(fastestMs, tookMs) });
      }
    };
  client.query = timed(client.query.bind(client) as Query) as typeof client.query;
  const transaction = client.transaction.bind(client);
  client.transaction = ((work: (tx: Transaction) => Promise<unknown>) =>
    transaction((tx) => {
      tx.query = timed(tx.query.bind(tx) as Query) as typeof tx.query;
      return work(tx);
    })) as typeof client.transaction;
  return {
    slow: () =>
      [...runs]
        .filter(([, { count, fastestMs }]) => count >= judgedFrom && fastestMs > mostMs)
        .map(([text, { fastestMs }]) => `${Math.round(fastestMs)} ms: ${text.slice(0, 200)}`),
  };
}
