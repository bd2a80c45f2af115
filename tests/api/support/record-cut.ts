import type supertest from 'supertest';
import type { BitCreate } from '#shared/api/bench.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import { bitOf, cutOf } from '../../support/samples.ts';
import type { Person, TestClub } from '../../support/test-club.ts';

/** What a member tells of a cut of revision 1 with a described bit; tests change what they are about. */
export const toldOf = (machineId: string, change: Record<string, unknown> = {}) => ({
  revision: 1,
  ...cutOf(machineId),
  ...change,
});

/** The request that records a cut; `told` may be anything, so that wrong things can be sent too. */
export function record(person: Person, slug: string, told: object, key?: string): supertest.Test {
  const request = person.call('post', `/api/designs/${slug}/cuts`);
  if (key !== undefined) request.set('Idempotency-Key', key);
  return request.send(told);
}

/** A record on a machine of the member's own that must succeed. */
export async function recorded(
  club: TestClub,
  person: Person,
  slug: string,
  change: Record<string, unknown> = {},
): Promise<CutRecord> {
  const machine = await club.machine(person);
  return (await record(person, slug, toldOf(machine.id, change)).expect(201)).body as CutRecord;
}

/** A bit in somebody's drawer, through the API. */
export async function ownBit(person: Person, change: Partial<BitCreate> = {}): Promise<{ id: string }> {
  return (await person.call('post', '/api/bits').send(bitOf(change)).expect(201)).body as { id: string };
}
