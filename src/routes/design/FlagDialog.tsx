import { useState } from 'react';
import type { Design } from '#shared/api/designs.ts';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import { useRaiseFlag } from '../../api/flags.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { Button } from '../../components/Button.tsx';
import { CheckField } from '../../components/CheckField.tsx';
import { Dialog } from '../../components/Dialog.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { SelectField } from '../../components/SelectField.tsx';
import { TextAreaField } from '../../components/TextAreaField.tsx';
import { materialLabels } from '../../words/labels.ts';
import { sayDay } from '../../words/say-day.ts';
import { DecisionChoice } from '../review/DecisionChoice.tsx';
import { decisionsFor, decisionWords } from '../review/decision-words.ts';
import { isWithheldNow } from '../review/is-withheld-now.ts';
import { WhoIsTold } from '../review/WhoIsTold.tsx';

interface FlagDialogProps {
  readonly design: Design;
  readonly recordId: string | null;
  /** A moderator who does not own the design may decide in the same step. */
  readonly mayDecide: boolean;
  readonly onClose: () => void;
}

/** Calls for a decision on a revision or on one of its records. */
export function FlagDialog({ design, recordId, mayDecide, onClose }: FlagDialogProps) {
  const [about, setAbout] = useState(recordId ?? '');
  const [reason, setReason] = useState('');
  const [decides, setDecides] = useState(false);
  const [action, setAction] = useState<DecisionAction | null>(null);
  const [wasTried, setWasTried] = useState(false);
  const { mutate, isPending, isSuccess, error } = useRaiseFlag();
  const record = design.cuts.find(({ id }) => id === about);
  const revision = record?.revision ?? design.revision.number;
  const isWithheld = isWithheldNow(design, { revision, recordId: record?.id });
  const actions = decisionsFor({ hasRecord: record !== undefined, isWithheld });
  const chosen = action !== null && actions.includes(action) ? action : null;

  const send = () => {
    setWasTried(true);
    const given = reason.trim();
    if (given === '' || (decides && chosen === null)) return;
    mutate({
      designSlug: design.slug,
      revision,
      reason: given,
      ...(record === undefined ? {} : { recordId: record.id }),
      ...(decides && chosen !== null ? { decision: { action: chosen, reason: given } } : {}),
    });
  };
  if (isSuccess) {
    return (
      <Dialog
        title={decides ? 'Flagged and decided' : 'Flagged'}
        isOpen
        onClose={onClose}
        actions={
          <Button look="main" onClick={onClose}>
            Back to the sheet
          </Button>
        }
      >
        <p role="status">
          {decides
            ? 'Your decision holds from now on, and it is in the audit log.'
            : 'A moderator will look at it. What they decide is told in your notices.'}
        </p>
      </Dialog>
    );
  }
  return (
    <Dialog
      title={`Flag ${design.title}`}
      isOpen
      onClose={onClose}
      actions={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button look={decides ? 'danger' : 'main'} disabled={isPending} onClick={send}>
            {decides && chosen !== null
              ? `Flag it and: ${decisionWords[chosen].label.toLowerCase()}`
              : 'Flag it'}
          </Button>
        </>
      }
    >
      <div className="space-y-5">
        <p>For what is unsafe, wrong or not the uploader’s to share. A moderator reads it and decides.</p>
        <SelectField
          label="What it is about"
          value={about}
          onChange={(event) => setAbout(event.target.value)}
          options={[
            { value: '', label: `Revision ${design.revision.number}: its drawing` },
            ...design.cuts.map(({ id, member, createdAt, materialId, revision: of }) => ({
              value: id,
              label: `The record of ${member.name}, ${sayDay(createdAt)}: ${materialLabels[materialId]}, revision ${of}`,
            })),
          ]}
        />
        <TextAreaField
          label="Reason"
          hint="What happened, or what would: with numbers, if you have them."
          maxLength={1000}
          value={reason}
          onChange={(event) => setReason(event.target.value)}
          error={wasTried && reason.trim() === '' ? 'Say what is wrong with it' : undefined}
        />
        {mayDecide && (
          <CheckField
            label="Decide it now, with this reason"
            checked={decides}
            onChange={(event) => setDecides(event.target.checked)}
          />
        )}
        {decides && (
          <DecisionChoice
            actions={actions}
            value={chosen}
            onChoose={setAction}
            error={wasTried && chosen === null ? 'Choose a decision' : undefined}
          />
        )}
        {decides && chosen !== null && (
          <WhoIsTold action={chosen} raisedBy={undefined} hasRecord={record !== undefined} />
        )}
        {error !== null && (
          <ProblemNote
            problem={isProblem(error) ? error.problem : { title: 'Not flagged', detail: sentenceOf(error) }}
          />
        )}
      </div>
    </Dialog>
  );
}
