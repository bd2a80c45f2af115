import type { Deps } from '#server/deps.ts';
import { type CutRow, cutRows, ofGeometries } from '#server/features/cuts/records.ts';
import type { RevisionOfDesign } from '#server/features/designs/queries.ts';
import { recordNotFound } from '#server/features/designs/record-not-found.ts';
import { availabilities } from '#server/features/review/decisions.ts';
import { ProblemError } from '#server/http/problem.ts';

/** The record whose settings go along: the one asked for, else the newest clean one, else none. */
export async function whichRecord(
  deps: Deps,
  found: RevisionOfDesign,
  recordId: string | undefined,
): Promise<CutRow | null> {
  const { db } = deps.database;
  const rows = await cutRows(db, ofGeometries([found.revision.geometryHash]));
  const decided = await availabilities(db, [...new Set(rows.map((row) => row.design.id))]);
  const withheld = (row: CutRow) => decided.of(row.design.id).settings.get(row.cut.id);
  const waits = (row: CutRow) => decided.of(row.design.id).waiting.has(row.cut.id);
  if (recordId === undefined) {
    return rows.find((row) => row.cut.outcome === 'clean' && withheld(row) === undefined) ?? null;
  }
  const asked = rows.find((row) => row.cut.id === recordId);
  if (asked === undefined) throw recordNotFound();
  const reason = withheld(asked)?.reason;
  if (reason !== undefined) {
    const who = waits(asked)
      ? 'These settings carry a “do not cut” finding, which'
      : 'A moderator withheld these settings:';
    throw new ProblemError(403, 'settings.withheld', `${who} ${reason}`);
  }
  return asked;
}
