import { useState } from 'react';
import type { CutRecord } from '#shared/api/cuts.ts';
import { useNoteInService } from '../../../api/cuts.ts';
import { isProblem, sentenceOf } from '../../../api/problem-error.ts';
import { Button } from '../../../components/Button.tsx';
import { Dialog } from '../../../components/Dialog.tsx';
import { ProblemNote } from '../../../components/ProblemNote.tsx';
import { RadioCards } from '../../../components/RadioCards.tsx';
import { TextAreaField } from '../../../components/TextAreaField.tsx';

interface InServiceDialogProps {
  readonly record: CutRecord;
  readonly onClose: () => void;
}

const cards = [
  { value: 'holds', label: 'It holds', detail: 'In use since, and sound.' },
  { value: 'broke', label: 'It broke in use', detail: 'Counts against, however clean the cut was.' },
];

/** Weeks later: how the part holds. A new note stands in the place of the one before. */
export function InServiceDialog({ record, onClose }: InServiceDialogProps) {
  const { mutate, isPending, error } = useNoteInService(record.id);
  const [result, setResult] = useState<string>(record.inService?.result ?? '');
  const [notes, setNotes] = useState('');
  const [wasTried, setWasTried] = useState(false);
  const save = () => {
    setWasTried(true);
    if (result !== 'holds' && result !== 'broke') return;
    mutate({ result, ...(notes.trim() === '' ? {} : { notes }) }, { onSuccess: onClose });
  };
  return (
    <Dialog
      title="How does it hold?"
      isOpen
      onClose={onClose}
      actions={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button look="main" disabled={isPending} onClick={save}>
            {isPending ? 'Saving…' : 'Save the note'}
          </Button>
        </>
      }
    >
      <div className="space-y-4">
        {error !== null && (
          <ProblemNote
            problem={isProblem(error) ? error.problem : { title: 'Not saved', detail: sentenceOf(error) }}
          />
        )}
        <RadioCards
          legend="The part in use"
          name="in-service"
          cards={cards}
          value={result}
          onChange={(event) => setResult(event.target.value)}
          error={wasTried && result === '' ? 'Say whether it holds' : undefined}
        />
        <TextAreaField
          label="Notes"
          isOptional
          rows={3}
          maxLength={1000}
          hint="Where it broke, after how long, under what load."
          value={notes}
          onChange={(event) => setNotes(event.target.value)}
        />
      </div>
    </Dialog>
  );
}
