import { eq } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { cut, design, flag, revision } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { insertNotice } from '#server/features/notices/insert-notice.ts';
import { revisionName } from './decision-words.ts';

/** Tells the owner of the design, and of the record, that something of theirs was flagged; not the flagger. */
export async function tellOfFlag(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  flagId: string,
): Promise<void> {
  const [row] = await tx
    .select({
      flag,
      ownerId: design.ownerId,
      recordBy: cut.memberId,
      title: design.title,
      drawingNumber: design.drawingNumber,
      revision: revision.number,
    })
    .from(flag)
    .innerJoin(design, eq(design.id, flag.designId))
    .innerJoin(revision, eq(revision.id, flag.revisionId))
    .leftJoin(cut, eq(cut.id, flag.cutId))
    .where(eq(flag.id, flagId));
  if (row === undefined) return;
  const what = `${row.recordBy === null ? '' : 'a cut record of '}${revisionName(row)}`;
  const isRule = row.flag.finding !== null && row.recordBy !== null;
  const wait = isRule ? ' Its settings are not handed out until a moderator decides.' : '';
  const sentence =
    row.flag.raisedBy === null
      ? `A rule flagged ${what}: ${row.flag.reason}${wait}`
      : `A member flagged ${what}: “${row.flag.reason}” A moderator will look at it.`;
  const concerned = new Set([row.ownerId, ...(row.recordBy === null ? [] : [row.recordBy])]);
  for (const memberId of concerned) {
    if (memberId === row.flag.raisedBy) continue;
    await insertNotice(deps, tx, { memberId, kind: 'flag-raised', sentence, designId: row.flag.designId });
  }
}
