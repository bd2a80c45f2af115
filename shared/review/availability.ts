import type { DecisionAction } from '#shared/api/vocabulary.ts';

/** One decision of a moderator, with what its flag was about. */
export interface DecisionFact {
  readonly action: DecisionAction;
  readonly reason: string;
  /** ISO 8601, UTC. */
  readonly decidedAt: string;
  readonly revisionId: string;
  /** The record that was flagged; absent for a flag on the revision itself. */
  readonly cutId?: string | undefined;
}

interface Reason {
  readonly reason: string;
}

/** What may be handed out of one design, and what moderators said of it. */
export interface Availability {
  /** The whole design is withheld. */
  readonly design: Reason | null;
  readonly revisions: ReadonlyMap<string, Reason>;
  /** Records whose settings are withheld. */
  readonly settings: ReadonlyMap<string, Reason>;
  readonly cautions: readonly {
    readonly reason: string;
    readonly decidedAt: string;
    readonly revisionId: string;
  }[];
  /** When a moderator last decided on a record: hazards told by then are settled. */
  readonly settledAt: ReadonlyMap<string, string>;
}

/**
 * What follows from the decisions on one design, oldest first. A restoration lifts the withholding of the design,
 * of its flag's revision and of its flag's record; cautions stay. Any decision on a record settles its hazards.
 */
export function availabilityOf(decisions: readonly DecisionFact[]): Availability {
  let design: Reason | null = null;
  const revisions = new Map<string, Reason>();
  const settings = new Map<string, Reason>();
  const settledAt = new Map<string, string>();
  const cautions: { reason: string; decidedAt: string; revisionId: string }[] = [];
  for (const { action, reason, decidedAt, revisionId, cutId } of decisions) {
    if (cutId !== undefined) settledAt.set(cutId, decidedAt);
    switch (action) {
      case 'dismiss':
        break;
      case 'caution':
        cautions.push({ reason, decidedAt, revisionId });
        break;
      case 'withholdSettings':
        if (cutId !== undefined) settings.set(cutId, { reason });
        break;
      case 'withholdRevision':
        revisions.set(revisionId, { reason });
        break;
      case 'withholdDesign':
        design = { reason };
        break;
      case 'restore':
        design = null;
        revisions.delete(revisionId);
        if (cutId !== undefined) settings.delete(cutId);
    }
  }
  return { design, revisions, settings, cautions, settledAt };
}

/** Why a revision may not be taken: its design's reason, else its own; null when it may. */
export function withholdingOf(availability: Availability, revisionId: string): Reason | null {
  return availability.design ?? availability.revisions.get(revisionId) ?? null;
}

/** Whether the hazards of a record, as it now stands, were decided on. */
export function hazardsSettled(availability: Availability, record: { id: string; toldAt: string }): boolean {
  const settledAt = availability.settledAt.get(record.id);
  return settledAt !== undefined && settledAt >= record.toldAt;
}
