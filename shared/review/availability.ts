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

/** A *do not cut* finding of a rule on a record's settings that no moderator has decided on yet. */
export interface WaitingFinding {
  readonly cutId: string;
  readonly sentence: string;
}

interface Reason {
  readonly reason: string;
}

/** What may be handed out of one design, and what moderators said of it. */
export interface Availability {
  /** The whole design is withheld. */
  readonly design: Reason | null;
  readonly revisions: ReadonlyMap<string, Reason>;
  /** Records whose settings are withheld: by a moderator, or until a moderator decides. */
  readonly settings: ReadonlyMap<string, Reason>;
  /** Those among `settings` that no moderator withheld: they wait for a decision on a finding. */
  readonly waiting: ReadonlySet<string>;
  readonly cautions: readonly {
    readonly reason: string;
    readonly decidedAt: string;
    readonly revisionId: string;
  }[];
  /** When a moderator last decided on a record: hazards told by then are settled. */
  readonly settledAt: ReadonlyMap<string, string>;
}

/**
 * What follows from the decisions on one design, oldest first, and from findings that wait for one. A restoration
 * lifts the withholding of the design, of its flag's revision and of its flag's record; cautions stay. Any decision
 * on a record settles its hazards. Withholding a revision or design for a record withholds its settings too: they
 * may be evidence for another design of the same geometry.
 */
export function availabilityOf(
  decisions: readonly DecisionFact[],
  findings: readonly WaitingFinding[] = [],
): Availability {
  let design: Reason | null = null;
  const revisions = new Map<string, Reason>();
  const settings = new Map<string, Reason>();
  const waiting = new Set<string>();
  const settledAt = new Map<string, string>();
  const cautions: { reason: string; decidedAt: string; revisionId: string }[] = [];
  for (const { action, reason, decidedAt, revisionId, cutId } of decisions) {
    if (cutId !== undefined) {
      settledAt.set(cutId, decidedAt);
      if (isWithholding(action)) settings.set(cutId, { reason });
    }
    switch (action) {
      case 'dismiss':
      case 'withholdSettings':
        break;
      case 'caution':
        cautions.push({ reason, decidedAt, revisionId });
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
  for (const { cutId, sentence } of findings) {
    if (settings.has(cutId)) continue;
    settings.set(cutId, { reason: `waits for a moderator: ${sentence}` });
    waiting.add(cutId);
  }
  return { design, revisions, settings, waiting, cautions, settledAt };
}

/** Whether a decision keeps something from being handed out. */
export const isWithholding = (action: DecisionAction): boolean =>
  action === 'withholdSettings' || action === 'withholdRevision' || action === 'withholdDesign';

/** Why a revision may not be taken: its design's reason, else its own; null when it may. */
export function withholdingOf(availability: Availability, revisionId: string): Reason | null {
  return availability.design ?? availability.revisions.get(revisionId) ?? null;
}

/** Whether the hazards of a record, as it now stands, were decided on. */
export function hazardsSettled(availability: Availability, record: { id: string; toldAt: string }): boolean {
  const settledAt = availability.settledAt.get(record.id);
  return settledAt !== undefined && settledAt >= record.toldAt;
}
