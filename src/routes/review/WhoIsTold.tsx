import type { DecisionAction } from '#shared/api/vocabulary.ts';

interface WhoIsToldProps {
  readonly action: DecisionAction;
  /** Absent when a rule raised the flag. */
  readonly raisedBy: string | undefined;
  readonly takeCount: number | undefined;
}

const takers = (action: DecisionAction, takeCount: number | undefined): string | null => {
  if (action !== 'withholdRevision' && action !== 'withholdDesign') return null;
  if (takeCount === undefined) return 'the members who took it';
  if (takeCount === 0) return null;
  return takeCount === 1 ? 'the one member who took it' : `the ${takeCount} members who took it`;
};

/** Who reads the reason once it is decided. */
export function WhoIsTold({ action, raisedBy, takeCount }: WhoIsToldProps) {
  const told = [
    'the uploader',
    ...(raisedBy === undefined ? [] : [`${raisedBy}, who raised the flag`]),
    takers(action, takeCount),
  ].filter((part) => part !== null);
  const list = told.length === 1 ? told[0] : `${told.slice(0, -1).join(', ')} and ${told.at(-1)}`;
  return (
    <p className="text-sm leading-5 text-ink-soft">
      Told in their notices, with your reason: {list}. On the sheet your name is not shown, only “a
      moderator”. The decision goes into the audit log with your name.
    </p>
  );
}
