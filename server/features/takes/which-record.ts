import type { Deps } from '#server/deps.ts';
import { type CutRow, cutRows, ofGeometries } from '#server/features/cuts/records.ts';
import { recordNotFound } from '#server/features/designs/record-not-found.ts';
import { withheldSettings } from '#server/features/designs/withheld-settings.ts';
import { type Availabilities, availabilities } from '#server/features/review/decisions.ts';
import { ProblemError } from '#server/http/problem.ts';
import { mayBeDefault } from '#shared/evidence/default-settings.ts';
import { hazardsSettled } from '#shared/review/availability.ts';

/**
 * The record whose settings go along: the one asked for, else the newest clean one that nothing speaks against,
 * else none. Withheld settings are refused with the reason.
 */
export async function whichRecord(
  deps: Deps,
  geometryHash: string,
  recordId: string | undefined,
): Promise<CutRow | null> {
  const { db } = deps.database;
  const rows = await cutRows(db, ofGeometries([geometryHash]));
  const decided = await availabilities(db, [...new Set(rows.map((row) => row.design.id))]);
  if (recordId === undefined) {
    return rows.find((row) => isClean(row, decided) && withheldSettings(row, rows, decided) === null) ?? null;
  }
  const asked = rows.find((row) => row.cut.id === recordId);
  if (asked === undefined) throw recordNotFound();
  const withheld = withheldSettings(asked, rows, decided);
  if (withheld !== null) {
    const who = withheld.waits
      ? 'These settings carry a “do not cut” finding, which'
      : 'A moderator withheld these settings:';
    throw new ProblemError(403, 'settings.withheld', `${who} ${withheld.reason}`);
  }
  return asked;
}

const isClean = (row: CutRow, decided: Availabilities): boolean => {
  const availability = decided.of(row.design.id);
  return mayBeDefault({
    outcome: row.cut.outcome,
    wentWrong: row.cut.wentWrong,
    ...(row.inService === null ? {} : { inService: row.inService.result }),
    hazardsSettled: hazardsSettled(availability, row.cut.id),
    hazardOpen: availability.openHazards.has(row.cut.id),
  });
};
