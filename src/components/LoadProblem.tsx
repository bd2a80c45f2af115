import { isProblem, sentenceOf } from '../api/problem-error.ts';
import { Button } from './Button.tsx';
import { ProblemNote } from './ProblemNote.tsx';

/** A part of a page that could not be read, with a way to try again. */
export function LoadProblem({ error, onRetry }: { readonly error: unknown; readonly onRetry: () => void }) {
  const problem = isProblem(error)
    ? error.problem
    : { title: 'This could not be read', detail: sentenceOf(error) };
  return (
    <div className="max-w-2xl space-y-4">
      <ProblemNote problem={problem} />
      <Button onClick={onRetry}>Try again</Button>
    </div>
  );
}
