import { type ReactNode, useEffect, useRef } from 'react';
import type { FieldValues } from 'react-hook-form';
import { Button } from '../../components/Button.tsx';
import { ErrorSummary } from '../../components/ErrorSummary.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { goToField } from './field-problems.ts';
import type { SavedForm } from './use-saved-form.ts';

interface FormFrameProps<Given extends FieldValues> {
  readonly saved: SavedForm<Given>;
  /** What the button says, such as "Add machine". */
  readonly does: string;
  readonly onCancel?: () => void;
  /** What to say when somebody else, or another window, changed the thing first. */
  readonly conflict?: ReactNode;
  readonly children: ReactNode;
}

/** What every form has: all that is wrong at its head, its fields, its buttons. */
export function FormFrame<Given extends FieldValues>(props: FormFrameProps<Given>) {
  const { saved, does, onCancel, conflict, children } = props;
  const refused = useRef<HTMLDivElement>(null);
  const isRefused = saved.refusal !== null || saved.current !== null;
  // The button is at the foot of a long form and the reason at its head: the reason comes into view.
  useEffect(() => {
    if (isRefused) refused.current?.focus();
  }, [isRefused]);
  return (
    <form
      noValidate
      className="grid gap-6"
      onSubmit={(event) => {
        event.preventDefault();
        saved.submit();
      }}
    >
      <ErrorSummary problems={saved.problems} onGoTo={goToField} />
      {isRefused && (
        <div ref={refused} tabIndex={-1} className="scroll-mt-24 focus-visible:outline-none">
          {saved.refusal !== null && <ProblemNote problem={saved.refusal} />}
          {conflict}
        </div>
      )}
      {children}
      <div className="flex flex-wrap gap-3 border-t border-ink pt-4">
        <Button look="main" type="submit" disabled={saved.isSaving}>
          {saved.isSaving ? 'Saving…' : does}
        </Button>
        {onCancel !== undefined && <Button onClick={onCancel}>Cancel</Button>}
      </div>
    </form>
  );
}
