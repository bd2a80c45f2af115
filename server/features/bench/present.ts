import type { bit, machine, stock } from '#server/db/schema/index.ts';
import type { Bit, Machine, Stock } from '#shared/api/bench.ts';

/** Columns without a value are left out of the contract's objects, and the owner is always the reader. */
function withoutNulls<Row extends { ownerId: string; createdAt: Date }>(row: Row) {
  const { ownerId: _owner, createdAt, ...rest } = row;
  const given = Object.fromEntries(Object.entries(rest).filter(([, value]) => value !== null));
  return { ...given, createdAt: createdAt.toISOString() };
}

export const presentMachine = (row: typeof machine.$inferSelect) => withoutNulls(row) as unknown as Machine;
export const presentBit = (row: typeof bit.$inferSelect) => withoutNulls(row) as unknown as Bit;
export const presentStock = (row: typeof stock.$inferSelect) => withoutNulls(row) as unknown as Stock;
