import { useNavigate } from 'react-router-dom';
import { useSignOut } from '../../api/me.ts';
import { sentenceOf } from '../../api/problem-error.ts';
import { Button } from '../../components/Button.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';

interface SignOutButtonProps {
  /** Where to go then. */
  readonly to?: string;
}

export function SignOutButton({ to = '/sign-in' }: SignOutButtonProps) {
  const signOut = useSignOut();
  const navigate = useNavigate();
  return (
    <div className="space-y-4 border-t border-ink pt-6">
      {signOut.error !== null && (
        <ProblemNote problem={{ title: 'Still signed in', detail: sentenceOf(signOut.error) }} />
      )}
      <Button
        disabled={signOut.isPending}
        onClick={() => signOut.mutate(undefined, { onSuccess: () => void navigate(to) })}
      >
        Sign out
      </Button>
    </div>
  );
}
