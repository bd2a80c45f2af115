import { cut, design, pendingObject, revision, storedObject, take } from '#server/db/schema/index.ts';
import type { TestClub } from '../../support/test-club.ts';

/** How many rows there are of what a share writes: none of them may grow when a share is refused. */
export async function storedThings({ deps }: TestClub) {
  const { db } = deps.database;
  return {
    designs: await db.$count(design),
    revisions: await db.$count(revision),
    cuts: await db.$count(cut),
    storedObjects: await db.$count(storedObject),
    pendingObjects: await db.$count(pendingObject),
  };
}

export const takeCount = ({ deps }: TestClub) => deps.database.db.$count(take);
