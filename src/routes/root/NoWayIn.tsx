import { useQueryClient } from '@tanstack/react-query';
import { useSignOut } from '../../api/me.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { Button } from '../../components/Button.tsx';
import { PageTitle } from '../../components/PageTitle.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';

/** The club's server does not answer, or does not let this member in. */
export function NoWayIn({ error }: { readonly error: unknown }) {
  const client = useQueryClient();
  const signOut = useSignOut();
  const isRefusal = isProblem(error, 403);
  const problem = isProblem(error)
    ? error.problem
    : { title: 'The club is not reached', detail: sentenceOf(error) };
  return (
    <div className="max-w-2xl space-y-6">
      <PageTitle>{isRefusal ? 'No way in' : 'The club is not reached'}</PageTitle>
      <ProblemNote problem={problem} />
      <div className="flex gap-3">
        <Button look="main" onClick={() => void client.invalidateQueries()}>
          Try again
        </Button>
        {isRefusal && (
          <Button onClick={() => signOut.mutate()} disabled={signOut.isPending}>
            Sign out
          </Button>
        )}
      </div>
    </div>
  );
}
