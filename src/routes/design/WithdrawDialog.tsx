import type { Design } from '#shared/api/designs.ts';
import { useWithdrawDesign } from '../../api/designs.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { Button } from '../../components/Button.tsx';
import { Dialog } from '../../components/Dialog.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';

interface WithdrawDialogProps {
  readonly design: Design;
  readonly isOpen: boolean;
  readonly onClose: () => void;
}

/** It cannot be taken back here, so it is asked before, not undone after. */
export function WithdrawDialog({ design, isOpen, onClose }: WithdrawDialogProps) {
  const { mutate, isPending, error } = useWithdrawDesign(design.slug);
  return (
    <Dialog
      title={`Withdraw ${design.title}?`}
      isOpen={isOpen}
      onClose={onClose}
      actions={
        <>
          <Button onClick={onClose}>Keep it in the loft</Button>
          <Button
            look="danger"
            disabled={isPending}
            onClick={() => mutate(undefined, { onSuccess: onClose })}
          >
            Withdraw it
          </Button>
        </>
      }
    >
      <div className="space-y-3">
        <p>
          It leaves the loft and is not handed out any more. Nothing is erased: its page, its records and who
          took it stay.
        </p>
        {error !== null && (
          <ProblemNote
            problem={isProblem(error) ? error.problem : { title: 'Not withdrawn', detail: sentenceOf(error) }}
          />
        )}
      </div>
    </Dialog>
  );
}
