import { and, asc, eq, isNotNull, isNull, type SQL, sql } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { decision, flag } from '#server/db/schema/index.ts';
import {
  type Availability,
  availabilityOf,
  type DecisionFact,
  type WaitingFinding,
} from '#shared/review/availability.ts';

const nothingDecided = availabilityOf([]);

export interface Availabilities {
  /** A design that nobody decided on hands out everything. */
  of(designId: string): Availability;
  /** Revisions that are withheld by themselves, of all these designs. */
  withheldRevisionIds: readonly string[];
}

/** What may be handed out of each design: of all, or of those named. */
export async function availabilities(db: Queries, designIds?: readonly string[]): Promise<Availabilities> {
  const ofThese =
    designIds === undefined ? sql`true` : sql`${flag.designId} = any(${sql.param(designIds)}::uuid[])`;
  const facts = await decisionFacts(db, ofThese);
  const findings = await waitingFindings(db, ofThese);
  const hazards = await openHazards(db, ofThese);
  const byDesign = new Map(
    [...new Set([...facts.keys(), ...findings.keys(), ...hazards.keys()])].map((designId) => [
      designId,
      availabilityOf(facts.get(designId) ?? [], findings.get(designId), new Set(hazards.get(designId))),
    ]),
  );
  return {
    of: (designId) => byDesign.get(designId) ?? nothingDecided,
    withheldRevisionIds: [...byDesign.values()].flatMap(({ revisions }) => [...revisions.keys()]),
  };
}

async function decisionFacts(db: Queries, ofThese: SQL): Promise<Map<string, DecisionFact[]>> {
  const rows = await db
    .select({
      designId: flag.designId,
      flagId: flag.id,
      revisionId: flag.revisionId,
      cutId: flag.cutId,
      decision,
    })
    .from(decision)
    .innerJoin(flag, eq(flag.id, decision.flagId))
    .where(ofThese)
    .orderBy(asc(decision.decidedAt), asc(decision.id));
  return byDesignOf(rows, (row) => ({
    action: row.decision.action,
    reason: row.decision.reason,
    decidedAt: row.decision.decidedAt.toISOString(),
    flagId: row.flagId,
    revisionId: row.revisionId,
    cutId: row.cutId ?? undefined,
  }));
}

/** Open *do not cut* flags that a rule raised on settings, oldest first. */
async function waitingFindings(db: Queries, ofThese: SQL): Promise<Map<string, WaitingFinding[]>> {
  const rows = await db
    .select({ designId: flag.designId, cutId: flag.cutId, sentence: flag.reason })
    .from(flag)
    .where(
      and(
        eq(flag.isOpen, true),
        eq(flag.level, 'do-not-cut'),
        isNull(flag.raisedBy),
        isNotNull(flag.finding),
        isNotNull(flag.cutId),
        ofThese,
      ),
    )
    .orderBy(asc(flag.createdAt), asc(flag.id));
  return byDesignOf(rows, ({ cutId, sentence }) => ({ cutId: String(cutId), sentence }));
}

/** Records with an open flag that the program raised for the hazards they reported (see `hazardFlag`). */
async function openHazards(db: Queries, ofThese: SQL): Promise<Map<string, string[]>> {
  const rows = await db
    .select({ designId: flag.designId, cutId: flag.cutId })
    .from(flag)
    .where(
      and(
        eq(flag.isOpen, true),
        eq(flag.level, 'do-not-cut'),
        isNull(flag.raisedBy),
        isNull(flag.finding),
        isNotNull(flag.cutId),
        ofThese,
      ),
    );
  return byDesignOf(rows, ({ cutId }) => String(cutId));
}

function byDesignOf<Row extends { designId: string }, Fact>(
  rows: readonly Row[],
  factOf: (row: Row) => Fact,
): Map<string, Fact[]> {
  const byDesign = new Map<string, Fact[]>();
  for (const row of rows) {
    const list = byDesign.get(row.designId) ?? [];
    byDesign.set(row.designId, list);
    list.push(factOf(row));
  }
  return byDesign;
}
