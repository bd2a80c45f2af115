import type { auditEntry } from '#server/db/schema/index.ts';
import { auditHash, firstPreviousHash } from './append.ts';

type Entry = typeof auditEntry.$inferSelect;

/**
 * The number of the first entry whose hash is not that of what it says and of the entry before, or null when the
 * chain is whole. Entries come oldest first, in batches of any size.
 */
export async function firstBrokenEntry(
  batches: Iterable<readonly Entry[]> | AsyncIterable<readonly Entry[]>,
): Promise<number | null> {
  let previous = firstPreviousHash;
  for await (const batch of batches) {
    for (const { number, hash, previousHash, ...fact } of batch) {
      if (previousHash !== previous || hash !== auditHash(fact, previous)) return number;
      previous = hash;
    }
  }
  return null;
}
