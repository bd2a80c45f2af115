import { isDeepStrictEqual } from 'node:util';
import { desc, eq } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { cut, cutEarlier } from '#server/db/schema/index.ts';

type Told = Pick<
  typeof cut.$inferSelect,
  | 'bit'
  | 'bitMaxRpm'
  | 'materialId'
  | 'stockThicknessMm'
  | 'settings'
  | 'overridePercent'
  | 'machine'
  | 'wentWrong'
>;

/** What a record told before its latest correction; null when it was never corrected. */
export async function toldBefore(tx: Transaction, cutId: string): Promise<Told | null> {
  const [row] = await tx
    .select({ told: cutEarlier.told })
    .from(cutEarlier)
    .where(eq(cutEarlier.cutId, cutId))
    .orderBy(desc(cutEarlier.version))
    .limit(1);
  // The whole row as it was: only its instants became text, and none is among these.
  return row === undefined ? null : (row.told as unknown as Told);
}

/** Whether the latest correction of a record left alone everything that the rules look at. */
export async function keptSettings(tx: Transaction, cutId: string): Promise<boolean> {
  const before = await toldBefore(tx, cutId);
  const [now] = await tx.select().from(cut).where(eq(cut.id, cutId));
  return before !== null && now !== undefined && isDeepStrictEqual(judged(before), judged(now));
}

const judged = ({
  bit,
  bitMaxRpm,
  materialId,
  stockThicknessMm,
  settings,
  overridePercent,
  machine,
}: Told) => [bit, bitMaxRpm, materialId, stockThicknessMm, settings, overridePercent, machine];
