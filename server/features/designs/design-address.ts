import { sql } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { rowsOf } from '#server/db/rows.ts';
import { club, drawingNumberSequence } from '#server/db/schema/index.ts';
import { slugOf } from '#shared/api/slug.ts';

/** Any number of ours: two shares at once wait for each other, since “peg” and “peg 2” can want the same address. */
const slugLock = 7_140_215;

/** The title's slug, with a number behind it where the address is taken. */
export async function freeSlug(tx: Transaction, title: string): Promise<string> {
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

/** The next number of the club's drawings, as `ML-0142`. */
export async function nextDrawingNumber(tx: Transaction): Promise<string> {
  const answer = await tx.execute(sql`select nextval(${drawingNumberSequence.seqName})::int as number`);
  const [row] = await tx.select({ prefix: club.drawingPrefix }).from(club);
  return `${row?.prefix ?? 'TL'}-${String(rowsOf<{ number: number }>(answer)[0]?.number).padStart(4, '0')}`;
}
