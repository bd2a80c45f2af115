import { asc, eq, sql } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { decision, flag } from '#server/db/schema/index.ts';
import { type Availability, availabilityOf, type DecisionFact } from '#shared/review/availability.ts';

const nothingDecided = availabilityOf([]);

export interface Availabilities {
  /** A design that nobody decided on hands out everything. */
  of(designId: string): Availability;
}

/** What may be handed out of each design: of all, or of those named. */
export async function availabilities(db: Queries, designIds?: readonly string[]): Promise<Availabilities> {
  const rows = await db
    .select({ designId: flag.designId, revisionId: flag.revisionId, cutId: flag.cutId, decision })
    .from(decision)
    .innerJoin(flag, eq(flag.id, decision.flagId))
    .where(designIds === undefined ? sql`true` : sql`${flag.designId} = any(${sql.param(designIds)}::uuid[])`)
    .orderBy(asc(decision.decidedAt), asc(decision.id));
  const facts = new Map<string, DecisionFact[]>();
  for (const row of rows) {
    const list = facts.get(row.designId) ?? [];
    facts.set(row.designId, list);
    list.push({
      action: row.decision.action,
      reason: row.decision.reason,
      decidedAt: row.decision.decidedAt.toISOString(),
      revisionId: row.revisionId,
      cutId: row.cutId ?? undefined,
    });
  }
  const byDesign = new Map([...facts].map(([designId, list]) => [designId, availabilityOf(list)]));
  return { of: (designId) => byDesign.get(designId) ?? nothingDecided };
}
