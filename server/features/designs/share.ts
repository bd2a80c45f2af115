import { createHash } from 'node:crypto';
import { sql } from 'drizzle-orm';
import type { ReadDrawing } from '#server/analysis/pool.ts';
import { appendAudit } from '#server/audit/append.ts';
import type { Transaction } from '#server/db/client.ts';
import { rowsOf } from '#server/db/rows.ts';
import {
  club,
  cut,
  design,
  drawingNumberSequence,
  type machine,
  revision,
  revisionGeometry,
} from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { readUpload } from '#server/features/drawings/read.ts';
import { ProblemError } from '#server/http/problem.ts';
import { createOnce, earlierAnswer, type Repeatable } from '#server/idempotency.ts';
import { localDate } from '#server/local-date.ts';
import type { Design, DesignDetails } from '#shared/api/designs.ts';
import { slugOf } from '#shared/api/slug.ts';
import { presentDesign } from './present.ts';
import { designPage } from './queries.ts';
import { refreshSearch } from './search-document.ts';
import { keepDrawing, type StoredDrawing, storeDrawing } from './store-drawing.ts';

export interface Share {
  memberId: string;
  svgBytes: Buffer;
  details: DesignDetails;
  machineRow: typeof machine.$inferSelect | null;
}

/** Publishes a design: read, store, one transaction, then the search learns of it. */
export async function shareDesign(deps: Deps, share: Share, repeatable: Repeatable): Promise<Design> {
  const earlier = await earlierAnswer<Design>(deps, repeatable);
  if (earlier !== null) return earlier;
  const { details } = share;
  const read = await readUpload(deps, share.svgBytes, {
    title: details.title,
    ...(details.scale === undefined ? {} : { millimetresPerUnit: details.scale.millimetresPerUnit }),
  });
  if (!read.inspection.units.confirmed) {
    throw new ProblemError(
      422,
      'drawing.scale-not-confirmed',
      'The file does not say how large it is. State one measured size, or choose among the readings, so that nobody cuts it at the wrong size.',
      {
        errors: [{ path: 'scale.millimetresPerUnit', message: 'State the size of the drawing' }],
      },
    );
  }
  const stored = await storeDrawing(deps, share.svgBytes, read);
  const published = await createOnce(deps, repeatable, async (tx) => {
    const slug = await publish(deps, tx, share, read, stored);
    const page = await designPage(tx, slug, share.memberId);
    if (page === null) throw new Error(`design ${slug} is missing in its own transaction`);
    return presentDesign(page);
  });
  await refreshSearch(deps, published.id);
  return published;
}

async function publish(
  deps: Deps,
  tx: Transaction,
  share: Share,
  read: ReadDrawing,
  stored: StoredDrawing,
): Promise<string> {
  const { details, memberId } = share;
  const now = deps.clock.now();
  await keepDrawing(tx, stored, now);
  const slug = await freeSlug(tx, details.title);
  const designId = deps.ids.next();
  await tx.insert(design).values({
    id: designId,
    slug,
    drawingNumber: await nextDrawingNumber(tx),
    ownerId: memberId,
    title: details.title,
    summary: details.summary,
    kind: details.kind,
    tags: details.tags,
    createdAt: now,
    updatedAt: now,
  });
  const revisionId = await insertRevision(
    deps,
    tx,
    { designId, number: 1, changeNote: 'first issue', licence: details.licence, memberId },
    read,
    stored,
  );
  await insertFirstCut(deps, tx, share, revisionId);
  await appendAudit(tx, {
    at: now,
    actorId: memberId,
    action: 'design.published',
    subject: `design:${designId}`,
    detail: { revision: 1 },
  });
  return slug;
}

async function insertRevision(
  deps: Deps,
  tx: Transaction,
  given: {
    designId: string;
    number: number;
    changeNote: string;
    licence: DesignDetails['licence'];
    memberId: string;
  },
  read: ReadDrawing,
  stored: StoredDrawing,
): Promise<string> {
  const { scaleReadings: _readings, geometry, ...drawing } = read.inspection;
  const id = deps.ids.next();
  await tx.insert(revision).values({
    id,
    designId: given.designId,
    number: given.number,
    geometryHash: createHash('sha256').update(read.geometryText).digest('hex'),
    licence: given.licence,
    changeNote: given.changeNote,
    drawing,
    hullMm: geometry.hullMm,
    outline: read.outline,
    originalKey: stored.original.key,
    drawingKey: stored.drawing.key,
    createdBy: given.memberId,
    createdAt: deps.clock.now(),
  });
  await tx.insert(revisionGeometry).values({ revisionId: id, geometry });
  return id;
}

async function insertFirstCut(deps: Deps, tx: Transaction, share: Share, revisionId: string): Promise<void> {
  const { details, machineRow, memberId } = share;
  if (details.cut === undefined || machineRow === null) return;
  const { ownerId: _owner, version: _version, createdAt: _created, ...machineThen } = machineRow;
  await tx.insert(cut).values({
    ...details.cut,
    notes: details.cut.notes ?? '',
    id: deps.ids.next(),
    revisionId,
    memberId,
    machine: withoutNulls(machineThen),
    cutOn: localDate(deps.clock.now(), deps.clubTimeZone),
    createdAt: deps.clock.now(),
  });
}

function withoutNulls<Row extends { accelerationMmPerS2: number | null }>(row: Row) {
  const { accelerationMmPerS2, ...rest } = row;
  return accelerationMmPerS2 === null ? rest : { ...rest, accelerationMmPerS2 };
}

/** Any number of ours: two shares at once wait for each other, since “peg” and “peg 2” can want the same address. */
const slugLock = 7_140_215;

/** The title's slug, with a number behind it where the address is taken. */
async function freeSlug(tx: Transaction, title: string): Promise<string> {
  const base = slugOf(title);
  await tx.execute(sql`select pg_advisory_xact_lock(${slugLock})`);
  const taken = await tx.execute(
    sql`select slug from design where slug = ${base} or slug ~ ${`^${base}-[0-9]+$`}`,
  );
  const slugs = new Set(rowsOf<{ slug: string }>(taken).map((row) => row.slug));
  if (!slugs.has(base)) return base;
  let number = 2;
  while (slugs.has(`${base}-${number}`)) number += 1;
  return `${base}-${number}`;
}

async function nextDrawingNumber(tx: Transaction): Promise<string> {
  const answer = await tx.execute(sql`select nextval(${drawingNumberSequence.seqName})::int as number`);
  const [row] = await tx.select({ prefix: club.drawingPrefix }).from(club);
  return `${row?.prefix ?? 'TL'}-${String(rowsOf<{ number: number }>(answer)[0]?.number).padStart(4, '0')}`;
}
