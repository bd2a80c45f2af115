import type { Deps } from '#server/deps.ts';
import { type CutOfDesign, cutsOfGeometry, type RevisionOfDesign } from '#server/features/designs/queries.ts';
import { recordNotFound } from '#server/features/designs/record-not-found.ts';

/** The record whose settings go along: the one asked for, else the newest clean one, else none. */
export async function whichRecord(
  deps: Deps,
  found: RevisionOfDesign,
  recordId: string | undefined,
): Promise<CutOfDesign | null> {
  const cuts = await cutsOfGeometry(deps.database.db, found.revision.geometryHash);
  if (recordId === undefined) return cuts.find((row) => row.cut.outcome === 'clean') ?? null;
  const asked = cuts.find((row) => row.cut.id === recordId);
  if (asked === undefined) throw recordNotFound();
  return asked;
}
