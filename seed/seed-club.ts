import { hashPassword } from 'better-auth/crypto';
import { eq } from 'drizzle-orm';
import { bit, club, machine } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { createMember } from '#server/features/people/invitations.ts';
import { bits } from './club/bits.ts';
import { machines } from './club/machines.ts';
import { clubName, demoPassword, members } from './club/people.ts';
import type { MemberKey } from './club/types.ts';
import type { SetClock } from './seeded-ids.ts';

export interface SeededClub {
  memberId(key: MemberKey): string;
  machineId(owner: MemberKey, name: string): string;
}

const foundedAt = new Date('2025-05-05T09:00:00Z');

/** The Millrace Makers themselves: members, machines, bit drawers. */
export async function seedClub(deps: Deps, clock: SetClock): Promise<SeededClub> {
  clock.set(foundedAt);
  const hashes = await Promise.all(members.map(() => hashPassword(demoPassword)));
  return deps.database.db.transaction(async (tx) => {
    await tx.update(club).set({ name: clubName, drawingPrefix: 'ML' }).where(eq(club.id, 1));
    const memberIds = new Map<MemberKey, string>();
    for (const [place, { key, name, email, role }] of members.entries()) {
      memberIds.set(
        key,
        await createMember(deps, tx, { name, email, role, passwordHash: hashes[place] ?? '' }),
      );
    }
    const memberId = (key: MemberKey) => required(memberIds.get(key), key);
    const machineIds = new Map<string, string>();
    for (const { owner, ...given } of machines) {
      const id = deps.ids.next();
      machineIds.set(`${owner}/${given.name}`, id);
      const { spindle, colletsMm, ...rest } = given;
      const copy =
        spindle.kind === 'dial' ? { ...spindle, positionsRpm: [...spindle.positionsRpm] } : spindle;
      await tx.insert(machine).values({
        ...rest,
        spindle: copy,
        colletsMm: [...colletsMm],
        id,
        ownerId: memberId(owner),
        createdAt: foundedAt,
      });
    }
    for (const { owner, ...given } of bits) {
      await tx
        .insert(bit)
        .values({ ...given, id: deps.ids.next(), ownerId: memberId(owner), createdAt: foundedAt });
    }
    return {
      memberId,
      machineId: (owner, name) => required(machineIds.get(`${owner}/${name}`), `${owner}/${name}`),
    };
  });
}

function required(id: string | undefined, what: string): string {
  if (id === undefined) throw new Error(`the demo club has no ${what}`);
  return id;
}
