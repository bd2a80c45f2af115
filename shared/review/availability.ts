import type { DecisionAction } from '#shared/api/vocabulary.ts';

/** One decision of a moderator, with what its flag was about. */
export interface DecisionFact {
  readonly action: DecisionAction;
  readonly reason: string;
  /** ISO 8601, UTC. */
  readonly decidedAt: string;
  readonly flagId: string;
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
  /** Records that a moderator decided on. */
  readonly decidedOn: ReadonlySet<string>;
  /** Records whose hazards wait for a decision, even when a correction took the hazards out since. */
  readonly openHazards: ReadonlySet<string>;
}

/** One thing withheld by one flag, until a restoration lifts it. */
interface Withholding extends Reason {
  readonly kind: 'design' | 'revision' | 'settings';
  readonly flagId: string;
  /** The revision or record; the design has no id here. */
  readonly of: string;
}

/** What a decision withholds. For a record its settings too: they may be evidence for another design. */
function withholdingsOf({ action, reason, flagId, revisionId, cutId }: DecisionFact): Withholding[] {
  if (!isWithholding(action)) return [];
  const settings: Withholding[] =
    cutId === undefined ? [] : [{ kind: 'settings', of: cutId, flagId, reason }];
  if (action === 'withholdDesign') return [{ kind: 'design', of: '', flagId, reason }, ...settings];
  if (action === 'withholdRevision')
    return [{ kind: 'revision', of: revisionId, flagId, reason }, ...settings];
  return settings;
}

/**
 * Whether a restoration lifts a withholding: what its own flag withheld, and what others withheld of the same
 * thing: of the record's settings, or of the revision. A design comes back only by the flag that withheld it.
 */
function lifts({ flagId, revisionId, cutId }: DecisionFact, withheld: Withholding): boolean {
  if (withheld.flagId === flagId) return true;
  if (cutId !== undefined) return withheld.kind === 'settings' && withheld.of === cutId;
  return withheld.kind === 'revision' && withheld.of === revisionId;
}

/**
 * What follows from the decisions on one design, oldest first, and from findings and hazards that wait for one.
 * Cautions stay through a restoration.
 */
export function availabilityOf(
  decisions: readonly DecisionFact[],
  findings: readonly WaitingFinding[] = [],
  openHazards: ReadonlySet<string> = new Set(),
): Availability {
  let withheld: Withholding[] = [];
  const waiting = new Set<string>();
  const decidedOn = new Set<string>();
  const cautions: { reason: string; decidedAt: string; revisionId: string }[] = [];
  for (const fact of decisions) {
    const { action, reason, decidedAt, revisionId, cutId } = fact;
    if (cutId !== undefined) decidedOn.add(cutId);
    if (action === 'caution') cautions.push({ reason, decidedAt, revisionId });
    if (action === 'restore') withheld = withheld.filter((one) => !lifts(fact, one));
    withheld.push(...withholdingsOf(fact));
  }
  const reasons = (kind: Withholding['kind']) =>
    new Map(withheld.filter((one) => one.kind === kind).map(({ of, reason }) => [of, { reason }]));
  const design = reasons('design').get('') ?? null;
  const revisions = reasons('revision');
  const settings = reasons('settings');
  for (const { cutId, sentence } of findings) {
    if (settings.has(cutId)) continue;
    settings.set(cutId, { reason: `waits for a moderator: ${sentence}` });
    waiting.add(cutId);
  }
  return { design, revisions, settings, waiting, cautions, decidedOn, openHazards };
}

/** Whether a decision keeps something from being handed out. */
export const isWithholding = (action: DecisionAction): boolean =>
  action === 'withholdSettings' || action === 'withholdRevision' || action === 'withholdDesign';

/** Why a revision may not be taken: its design's reason, else its own; null when it may. */
export function withholdingOf(availability: Availability, revisionId: string): Reason | null {
  return availability.design ?? availability.revisions.get(revisionId) ?? null;
}

/**
 * Whether the hazards of a record were decided on. Hazards told for the first time open a flag, so while none is
 * open, what the record tells now was before the moderator who decided.
 */
export const hazardsSettled = ({ decidedOn, openHazards }: Availability, cutId: string): boolean =>
  decidedOn.has(cutId) && !openHazards.has(cutId);
