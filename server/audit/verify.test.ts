import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { firstBrokenEntry } from './verify.ts';

/** The chain as it is written down: SHA-256 over the fact with its keys in order; computed here by itself. */
function chainOf(actions: readonly string[]) {
  let previousHash = '0'.repeat(64);
  return actions.map((action, place) => {
    const at = new Date(Date.UTC(2026, 10, 1, 0, place));
    const text = `{"action":${JSON.stringify(action)},"actorId":null,"at":"${at.toISOString()}","detail":{"a":1,"b":${place}},"previousHash":"${previousHash}","subject":"flag:x"}`;
    const hash = createHash('sha256').update(text).digest('hex');
    const detail = { b: place, a: 1 };
    const entry = {
      number: place + 1,
      at,
      actorId: null,
      action,
      subject: 'flag:x',
      detail,
      previousHash,
      hash,
    };
    previousHash = hash;
    return entry;
  });
}

const inBatches = <Item>(items: readonly Item[], size: number) =>
  Array.from({ length: Math.ceil(items.length / size) }, (_, batch) =>
    items.slice(batch * size, (batch + 1) * size),
  );

const chain = fc.array(fc.string(), { minLength: 1, maxLength: 30 }).map(chainOf);
const size = fc.integer({ min: 1, max: 7 });

describe('the audit chain', () => {
  it('is whole as it was written, however it is read', async () => {
    expect(await firstBrokenEntry([])).toBeNull();
    await fc.assert(
      fc.asyncProperty(chain, size, async (entries, batch) => {
        expect(await firstBrokenEntry(inBatches(entries, batch))).toBeNull();
      }),
    );
  });

  it('breaks at the entry that was changed', async () => {
    await fc.assert(
      fc.asyncProperty(chain, size, fc.nat(), async (entries, batch, pick) => {
        const place = pick % entries.length;
        const changed = entries.map((entry, at) => (at === place ? { ...entry, subject: 'flag:y' } : entry));
        expect(await firstBrokenEntry(inBatches(changed, batch))).toBe(place + 1);
      }),
    );
  });

  it('breaks after an entry that was taken out, and after one whose hash was made anew', async () => {
    const entries = chainOf(['a', 'b', 'c', 'd']);
    expect(await firstBrokenEntry([entries.filter(({ number }) => number !== 2)])).toBe(3);
    const [, other] = chainOf(['a', 'B']);
    expect(
      await firstBrokenEntry([entries.map((entry) => (entry.number === 2 && other ? other : entry))]),
    ).toBe(3);
  });
});
