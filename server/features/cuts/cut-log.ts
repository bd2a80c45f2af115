import { and, eq, type SQL, sql } from 'drizzle-orm';
import { cut, revision } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { designNotFound } from '#server/features/designs/edit.ts';
import { designBySlug } from '#server/features/designs/queries.ts';
import type { CutLogQuery, CutRecord } from '#shared/api/cuts.ts';
import { cutLogCsv } from '#shared/cuts/cut-log-csv.ts';
import { readLogCursor, writeLogCursor } from './cut-log-cursor.ts';
import { presentCuts } from './one-record.ts';
import { cutRows } from './records.ts';

interface Page {
  items: CutRecord[];
  total: number;
  nextCursor: string | null;
}

const pageSize = 50;

/** Every record of a design, of all its revisions, newest first. */
export async function cutsOfDesign(deps: Deps, slug: string): Promise<Page> {
  const { db } = deps.database;
  const design = await designBySlug(db, slug);
  if (design === null) throw designNotFound();
  const items = await presentCuts(db, await cutRows(db, eq(revision.designId, design.id)));
  return { items, total: items.length, nextCursor: null };
}

function asked(memberId: string, { whose, material, outcome, machineId }: CutLogQuery): SQL | undefined {
  return and(
    whose === 'mine' ? eq(cut.memberId, memberId) : undefined,
    material === undefined ? undefined : eq(cut.materialId, material),
    outcome === undefined ? undefined : eq(cut.outcome, outcome),
    machineId === undefined ? undefined : eq(cut.machineId, machineId),
  );
}

function after(cursor: string | undefined): SQL | undefined {
  if (cursor === undefined) return undefined;
  const { createdAt, id } = readLogCursor(cursor);
  return sql`(${cut.createdAt}, ${cut.id}) < (${createdAt.toISOString()}::timestamptz, ${id}::uuid)`;
}

/** One page of the cut log, newest first: the club's, or the member's own. */
export async function cutLog(deps: Deps, memberId: string, query: CutLogQuery): Promise<Page> {
  const { db } = deps.database;
  const where = asked(memberId, query);
  // One more than is shown tells whether there is another page.
  const rows = await cutRows(db, and(where, after(query.cursor)), pageSize + 1);
  const shown = rows.slice(0, pageSize);
  const last = shown.at(-1)?.cut;
  return {
    items: await presentCuts(db, shown),
    total: await db.$count(cut, where),
    nextCursor: rows.length > pageSize && last !== undefined ? writeLogCursor(last) : null,
  };
}

/** The whole cut log that a query asks for, or what comes after its cursor, as CSV. */
export async function cutLogFile(deps: Deps, memberId: string, query: CutLogQuery): Promise<Buffer> {
  const { db } = deps.database;
  const rows = await cutRows(db, and(asked(memberId, query), after(query.cursor)));
  return Buffer.from(cutLogCsv(await presentCuts(db, rows)));
}
