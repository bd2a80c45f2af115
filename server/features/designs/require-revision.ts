import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import { type RevisionOfDesign, revisionOf } from './queries.ts';

export const revisionNotFound = () =>
  new ProblemError(404, 'revision.not-found', 'There is no such revision of this design.');

/** A revision named in an address, or 404. */
export async function requireRevision(deps: Deps, slug: string, number: string): Promise<RevisionOfDesign> {
  const found = /^[1-9]\d{0,5}$/.test(number)
    ? await revisionOf(deps.database.db, slug, Number(number))
    : null;
  if (found === null) throw revisionNotFound();
  return found;
}
