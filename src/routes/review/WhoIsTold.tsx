import type { DecisionAction } from '#shared/api/vocabulary.ts';

interface WhoIsToldProps {
  readonly action: DecisionAction;
  /** Whoever else raised the flag; absent for a rule, and for the moderator who decides. */
  readonly raisedBy: string | undefined;
  readonly hasRecord: boolean;
}

const takers: Readonly<Partial<Record<DecisionAction, string>>> = {
  withholdSettings: 'everyone who took this revision or these settings',
  withholdRevision: 'everyone who took this revision',
  withholdDesign: 'everyone who took any revision',
  restore: 'everyone who took what was withheld',
};

/** Who reads the reason once it is decided. */
export function WhoIsTold({ action, raisedBy, hasRecord }: WhoIsToldProps) {
  const told = [
    'the uploader',
    hasRecord ? 'the member of the record' : undefined,
    raisedBy === undefined ? undefined : `${raisedBy}, who raised the flag`,
    takers[action],
  ].filter((part) => part !== undefined);
  const list = told.length === 1 ? told[0] : `${told.slice(0, -1).join(', ')} and ${told.at(-1)}`;
  return (
    <p className="text-sm leading-5 text-ink-soft">
      Told in their notices, with your reason: {list}. They read “a moderator”, not your name; the audit log
      keeps who decided.
    </p>
  );
}
