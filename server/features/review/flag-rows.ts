import { desc, eq, type SQL, sql } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { decision, design, flag, revision, take, user } from '#server/db/schema/index.ts';

/** Flags with what the review desk shows beside them; in the order asked for. */
export async function flagRows(
  db: Queries,
  given: { where?: SQL | undefined; order?: SQL[]; limit?: number },
) {
  const rows = await db
    .select({
      flag,
      design: {
        slug: design.slug,
        title: design.title,
        drawingNumber: design.drawingNumber,
        ownerId: design.ownerId,
      },
      number: revision.number,
      geometryHash: revision.geometryHash,
      raiserName: user.name,
      takeCount: sql<number>`(select count(distinct ${take.memberId})::int from ${take} where ${take.revisionId} = ${flag.revisionId})`,
    })
    .from(flag)
    .innerJoin(design, eq(design.id, flag.designId))
    .innerJoin(revision, eq(revision.id, flag.revisionId))
    .leftJoin(user, eq(user.id, flag.raisedBy))
    .where(given.where)
    .orderBy(...(given.order ?? [sql`${flag.id}`]))
    .limit(given.limit ?? 1);
  const decided = await latestDecisions(
    db,
    rows.map((row) => row.flag.id),
  );
  return rows.map((row) => ({ ...row, decision: decided.get(row.flag.id) ?? null }));
}
export type FlagRow = Awaited<ReturnType<typeof flagRows>>[number];

export async function flagRow(db: Queries, id: string): Promise<FlagRow | null> {
  const [row] = await flagRows(db, { where: eq(flag.id, id) });
  return row ?? null;
}

async function latestDecisions(db: Queries, flagIds: readonly string[]) {
  if (flagIds.length === 0) return new Map<string, never>();
  const rows = await db
    .selectDistinctOn([decision.flagId], { decision, deciderName: user.name })
    .from(decision)
    .innerJoin(user, eq(user.id, decision.decidedBy))
    .where(sql`${decision.flagId} = any(${sql.param(flagIds)}::uuid[])`)
    .orderBy(decision.flagId, desc(decision.decidedAt), desc(decision.id));
  return new Map(rows.map((row) => [row.decision.flagId, row]));
}
