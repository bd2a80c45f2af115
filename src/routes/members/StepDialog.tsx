import { useChangeMember } from '../../api/members.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { Button } from '../../components/Button.tsx';
import { Dialog } from '../../components/Dialog.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { type MemberStep, stepChange, stepWords } from './member-step.ts';

interface StepDialogProps {
  readonly step: MemberStep;
  readonly onClose: () => void;
}

/** What it means, before it is done. */
export function StepDialog({ step, onClose }: StepDialogProps) {
  const { mutate, isPending, error } = useChangeMember();
  const { title, detail, does } = stepWords(step);
  const send = () => mutate({ id: step.member.id, change: stepChange(step) }, { onSuccess: onClose });
  return (
    <Dialog
      title={title}
      isOpen
      onClose={onClose}
      actions={
        <>
          <Button onClick={onClose}>Leave as it is</Button>
          <Button
            look={step.kind === 'suspend' ? 'danger' : 'main'}
            onClick={send}
            disabled={isPending || isProblem(error, 409)}
          >
            {does}
          </Button>
        </>
      }
    >
      <p>{detail}</p>
      {error !== null && (
        <div className="mt-4">
          <ProblemNote
            problem={isProblem(error) ? error.problem : { title: 'Not changed', detail: sentenceOf(error) }}
          />
        </div>
      )}
    </Dialog>
  );
}
