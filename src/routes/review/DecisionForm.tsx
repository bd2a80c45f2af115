import { useState } from 'react';
import type { Flag } from '#shared/api/flags.ts';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import { useDecideFlag } from '../../api/flags.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { Button } from '../../components/Button.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { TextAreaField } from '../../components/TextAreaField.tsx';
import { DecidedMeanwhile } from './DecidedMeanwhile.tsx';
import { DecisionChoice } from './DecisionChoice.tsx';
import { decisionWords } from './decision-words.ts';
import { WhoIsTold } from './WhoIsTold.tsx';

interface DecisionFormProps {
  readonly flag: Flag;
  readonly actions: readonly DecisionAction[];
  readonly onShowCurrent: () => void;
}

const isFlag = (value: unknown): value is Flag =>
  typeof value === 'object' && value !== null && 'state' in value && 'version' in value;

/** One decision, with its reason: what it does and who is told stand beside it before it is made. */
export function DecisionForm({ flag, actions, onShowCurrent }: DecisionFormProps) {
  const [action, setAction] = useState<DecisionAction | null>(null);
  const [reason, setReason] = useState('');
  const [wasTried, setWasTried] = useState(false);
  const { mutate, isPending, error } = useDecideFlag(flag.id);
  const current = isProblem(error, 409) && isFlag(error.problem.current) ? error.problem.current : null;
  if (current !== null) return <DecidedMeanwhile now={current} mine={reason} onShow={onShowCurrent} />;

  const decide = () => {
    setWasTried(true);
    if (action === null || reason.trim() === '') return;
    mutate({ action, reason: reason.trim(), version: flag.version });
  };
  const withholds = action?.startsWith('withhold') === true;
  return (
    <form
      noValidate
      aria-labelledby="decide-head"
      className="space-y-5"
      onSubmit={(event) => {
        event.preventDefault();
        decide();
      }}
    >
      <h2 id="decide-head" className="text-xl leading-7">
        Decide
      </h2>
      <DecisionChoice
        actions={actions}
        value={action}
        onChoose={setAction}
        error={wasTried && action === null ? 'Choose a decision' : undefined}
      />
      <TextAreaField
        label="Reason"
        hint="What members read: what is wrong, and what would put it right."
        maxLength={1000}
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        error={wasTried && reason.trim() === '' ? 'Say why: members read it' : undefined}
      />
      {action !== null && (
        <WhoIsTold action={action} raisedBy={flag.raisedBy?.name} hasRecord={flag.recordId !== undefined} />
      )}
      {error !== null && (
        <ProblemNote
          problem={isProblem(error) ? error.problem : { title: 'Not decided', detail: sentenceOf(error) }}
        />
      )}
      <Button look={withholds ? 'danger' : 'main'} type="submit" disabled={isPending}>
        {action === null ? 'Decide' : decisionWords[action].label}
      </Button>
    </form>
  );
}
