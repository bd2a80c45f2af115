import { eq } from 'drizzle-orm';
import { bit, machine } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { Bit, Machine } from '#shared/api/bench.ts';
import { mine } from './policy.ts';
import { presentBit, presentMachine } from './present.ts';

/** One of the member's own machines, or 404: others' machines are not there. */
export async function machineOfMember(deps: Deps, memberId: string, machineId: string): Promise<Machine> {
  const [row] = await deps.database.db
    .select()
    .from(machine)
    .where(mine(machine, machineId, memberId));
  if (row === undefined)
    throw new ProblemError(404, 'machine.not-found', 'There is no such machine on your bench.');
  return presentMachine(row);
}

/** The member's bits: all of them, or those named; a bit that is not theirs is a 404. */
export async function bitsOfMember(deps: Deps, memberId: string, bitIds?: readonly string[]): Promise<Bit[]> {
  const bits = (await deps.database.db.select().from(bit).where(eq(bit.ownerId, memberId))).map(presentBit);
  if (bitIds === undefined) return bits;
  return bitIds.map((bitId) => {
    const found = bits.find((bit) => bit.id === bitId);
    if (found === undefined)
      throw new ProblemError(404, 'bit.not-found', 'There is no such bit in your drawer.');
    return found;
  });
}
