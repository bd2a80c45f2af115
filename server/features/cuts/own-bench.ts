import type { Transaction } from '#server/db/client.ts';
import { bit, machine } from '#server/db/schema/index.ts';
import { mine } from '#server/features/bench/policy.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { BitUsed } from '#shared/api/cuts.ts';
import { machineThen } from './machine-then.ts';

type MachineThen = ReturnType<typeof machineThen>;

/** What a record copies from the bench of the member who made the cut. */
export interface BenchOfCut {
  machineId: string;
  machine: MachineThen;
  bitId: string | null;
  bit: BitUsed;
  /** The greatest speed marked on the bit of the drawer; null when none is marked, or the bit was described. */
  bitMaxRpm: number | null;
}

/** The machine named, or 404: others' machines are not there. */
async function ownMachine(tx: Transaction, memberId: string, machineId: string): Promise<MachineThen> {
  const [row] = await tx
    .select()
    .from(machine)
    .where(mine(machine, machineId, memberId));
  if (row !== undefined) return machineThen(row);
  throw new ProblemError(
    404,
    'machine.not-found',
    'The machine of this cut is not on your bench. Choose one of yours, or add it to your bench first.',
  );
}

async function ownBit(tx: Transaction, memberId: string, bitId: string) {
  const [row] = await tx
    .select()
    .from(bit)
    .where(mine(bit, bitId, memberId));
  if (row === undefined) {
    throw new ProblemError(
      404,
      'bit.not-found',
      'That bit is not in your drawer. Choose one of yours, or describe the bit that you used.',
    );
  }
  const { diameterMm, flutes, kind, maxRpm } = row;
  return { bitId, bit: { diameterMm, flutes, kind }, bitMaxRpm: maxRpm };
}

const sameBit = (a: BitUsed, b: BitUsed): boolean =>
  a.diameterMm === b.diameterMm && a.flutes === b.flutes && a.kind === b.kind;

/**
 * Machine and bit of a record as they were at the cut. A correction that names the ones it had keeps them as they
 * were copied, even when they have left the bench since.
 */
export async function benchOfCut(
  tx: Transaction,
  memberId: string,
  told: { machineId: string; bitId?: string | undefined; bit?: BitUsed | undefined },
  before?: BenchOfCut,
): Promise<BenchOfCut> {
  const kept = before?.machineId === told.machineId ? before.machine : undefined;
  const { machineId } = told;
  const of = { machineId, machine: kept ?? (await ownMachine(tx, memberId, machineId)) };
  if (before !== undefined) {
    const { bitId, bit, bitMaxRpm } = before;
    const isSame = told.bit === undefined ? told.bitId === bitId : sameBit(told.bit, bit);
    if (isSame) return { ...of, bitId, bit, bitMaxRpm };
  }
  if (told.bitId !== undefined) return { ...of, ...(await ownBit(tx, memberId, told.bitId)) };
  if (told.bit === undefined) throw new Error('a record without a bit passed its schema');
  return { ...of, bitId: null, bit: told.bit, bitMaxRpm: null };
}
