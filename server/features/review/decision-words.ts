import type { DecisionAction } from '#shared/api/vocabulary.ts';

/** A design's revision as sentences name it. */
export interface Named {
  title: string;
  drawingNumber: string;
  revision: number;
}

/** What else a sentence has to say: whether the flag is on a record, and what is withheld after the decision. */
export interface Circumstances {
  isOnRecord?: boolean;
  stillWithheld?: 'design' | 'revision' | null;
}

/** What a decision is called after “decided this a moment ago:”. */
const names: Record<DecisionAction, string> = {
  dismiss: 'dismissed',
  caution: 'caution',
  withholdSettings: 'settings withheld',
  withholdRevision: 'revision withheld',
  withholdDesign: 'design withheld',
  restore: 'restored',
};

export const revisionName = ({ title, drawingNumber, revision }: Named): string =>
  `“${title}” (${drawingNumber}, revision ${revision})`;

/** What was decided, to somebody whom it concerns. */
export function decisionSentence(
  action: DecisionAction,
  named: Named,
  reason: string,
  { isOnRecord = false, stillWithheld = null }: Circumstances = {},
): string {
  const revision = revisionName(named);
  const whole = `the design “${named.title}” (${named.drawingNumber})`;
  const done: Record<DecisionAction, string> = {
    dismiss: `looked at a flag on ${revision} and dismissed it`,
    caution: `put a caution on ${revision}`,
    withholdSettings: `withheld settings recorded for ${revision}`,
    withholdRevision: `withheld ${revision}`,
    withholdDesign: `withheld ${whole}`,
    restore: isOnRecord ? `restored settings recorded for ${revision}` : `restored ${revision}`,
  };
  return `A moderator ${done[action]}: “${reason}”${stillSentence(stillWithheld)}`;
}

const stillSentence = (what: Circumstances['stillWithheld']): string =>
  what === 'design'
    ? ' The whole design is still withheld.'
    : what === 'revision'
      ? ' The revision is still withheld.'
      : '';

/** To a member who took what is withheld or restored now. */
export function takerSentence(
  action: DecisionAction,
  named: Named,
  reason: string,
  { isOnRecord = false, stillWithheld = null }: Circumstances = {},
): string {
  const taken = `You took ${revisionName(named)}.`;
  const still = stillSentence(stillWithheld);
  const restored = isOnRecord ? 'settings recorded for it' : 'it';
  if (action === 'restore') return `${taken} A moderator restored ${restored}: “${reason}”${still}`;
  const what =
    action === 'withholdSettings'
      ? 'A moderator withheld settings recorded for it: do not cut with them.'
      : action === 'withholdDesign'
        ? 'A moderator withheld the whole design: do not cut it.'
        : 'A moderator withheld it: do not cut it.';
  return `${taken} ${what} The reason: “${reason}”${still}`;
}

const anHourMs = 60 * 60 * 1000;

/** Who decided a flag and how, for the moderator who came second. */
export function whoDecided(
  decided: { action: DecisionAction; reason: string; decidedAt: Date; deciderName: string; isMine: boolean },
  now: Date,
): string {
  const who = decided.isMine ? 'You' : decided.deciderName;
  const isRecent = now.getTime() - decided.decidedAt.getTime() < anHourMs;
  const when = isRecent ? 'a moment ago' : `on ${decided.decidedAt.toISOString().slice(0, 10)}`;
  return `${who} decided this ${when}: ${names[decided.action]}, “${decided.reason}”.`;
}
