import type { DecisionAction } from '#shared/api/vocabulary.ts';

interface DecisionWords {
  readonly label: string;
  /** As it reads of a decision that was made: "Moss withheld the settings". */
  readonly past: string;
  /** What it does, before it is done. */
  readonly detail: string;
}

export const decisionWords: Readonly<Record<DecisionAction, DecisionWords>> = {
  dismiss: {
    label: 'Dismiss',
    past: 'dismissed the flag',
    detail:
      'Nothing is withheld or said on the sheet. Settings that waited for this decision are handed out.',
  },
  caution: {
    label: 'Add a caution',
    past: 'added a caution',
    detail: 'Your reason stands on the sheet as a caution. It is still handed out.',
  },
  withholdSettings: {
    label: 'Withhold the settings',
    past: 'withheld the settings',
    detail: 'The settings of this record are not handed out. The drawing still is.',
  },
  withholdRevision: {
    label: 'Withhold the revision',
    past: 'withheld the revision',
    detail: 'This revision is not handed out. Other revisions still are.',
  },
  withholdDesign: {
    label: 'Withhold the design',
    past: 'withheld the design',
    detail: 'No revision of it is handed out, and it cannot be remixed.',
  },
  restore: {
    label: 'Restore',
    past: 'restored it',
    detail: 'What was withheld here is handed out again. Cautions stay.',
  },
};

interface Choice {
  readonly hasRecord: boolean;
  readonly isWithheld: boolean;
}

/** The decisions that make sense: settings only with a record, restoring only what is withheld. */
export const decisionsFor = ({ hasRecord, isWithheld }: Choice): readonly DecisionAction[] =>
  (Object.keys(decisionWords) as DecisionAction[]).filter(
    (action) => (action !== 'withholdSettings' || hasRecord) && (action !== 'restore' || isWithheld),
  );
