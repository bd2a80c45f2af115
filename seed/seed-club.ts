import { hashPassword } from 'better-auth/crypto';
import { eq } from 'drizzle-orm';
import { bit, club, machine } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { createMember } from '#server/features/people/invitations.ts';
import type { SignedIn } from '#server/http/session.ts';
import { bits } from './club/bits.ts';
import { machines } from './club/machines.ts';
import { clubName, demoPassword, members } from './club/people.ts';
import type { MemberKey } from './club/types.ts';
import type { SetClock } from './seeded-ids.ts';

export interface SeededClub {
  member(key: MemberKey): SignedIn;
  machineId(owner: MemberKey, name: string): string;
}

const foundedAt = new Date('2025-05-05T09:00:00Z');

/** The Millrace Makers themselves: members, machines, bit drawers. */
export async function seedClub(deps: Deps, clock: SetClock): Promise<SeededClub> {
  clock.set(foundedAt);
  const hashes = await Promise.all(members.map(() => hashPassword(demoPassword)));
  return deps.database.db.transaction(async (tx) => {
    await tx.update(club).set({ name: clubName, drawingPrefix: 'ML' }).where(eq(club.id, 1));
    const signedIn = new Map<MemberKey, SignedIn>();
    for (const [place, { key, name, email, role }] of members.entries()) {
      const id = await createMember(deps, tx, { name, email, role, passwordHash: hashes[place] ?? '' });
      signedIn.set(key, { id, name, email, role });
    }
    const member = (key: MemberKey) => required(signedIn.get(key), key);
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
        ownerId: member(owner).id,
        createdAt: foundedAt,
      });
    }
    for (const { owner, ...given } of bits) {
      await tx
        .insert(bit)
        .values({ ...given, id: deps.ids.next(), ownerId: member(owner).id, createdAt: foundedAt });
    }
    return {
      member,
      machineId: (owner, name) => required(machineIds.get(`${owner}/${name}`), `${owner}/${name}`),
    };
  });
}

function required<Thing>(thing: Thing | undefined, what: string): Thing {
  if (thing === undefined) throw new Error(`the demo club has no ${what}`);
  return thing;
}
