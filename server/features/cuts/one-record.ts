import { eq } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { isUuid } from '#server/db/is-uuid.ts';
import { cut } from '#server/db/schema/index.ts';
import { availabilities } from '#server/features/review/decisions.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import { presentCutRecord } from './present.ts';
import { type CutRow, cutRows } from './records.ts';

/** The record at an address, or 404. */
export async function requireCut(db: Queries, id: string): Promise<CutRow> {
  const [row] = isUuid(id) ? await cutRows(db, eq(cut.id, id)) : [];
  if (row === undefined) throw new ProblemError(404, 'cut.not-found', 'There is no such cut record.');
  return row;
}

/** The record at an address when it is the member's own; 404 when it is not there, 403 when it is another's. */
export async function requireOwnCut(db: Queries, id: string, memberId: string): Promise<CutRow> {
  const row = await requireCut(db, id);
  if (row.cut.memberId !== memberId) {
    throw new ProblemError(
      403,
      'cut.not-yours',
      `Only ${row.memberName}, who made this cut, may add to its record or correct it.`,
    );
  }
  return row;
}

/** Records as everybody reads them, with what moderators decided on them. */
export async function presentCuts(db: Queries, rows: readonly CutRow[]): Promise<CutRecord[]> {
  if (rows.length === 0) return [];
  const decided = await availabilities(db, [...new Set(rows.map((row) => row.design.id))]);
  return rows.map((row) => presentCutRecord(row, decided.of(row.design.id)));
}

/** One record as everybody reads it, fresh from the database. */
export async function shownCut(db: Queries, id: string): Promise<CutRecord> {
  const [shown] = await presentCuts(db, [await requireCut(db, id)]);
  if (shown === undefined) throw new Error(`record ${id} is not shown`);
  return shown;
}
