import { zodResolver } from '@hookform/resolvers/zod';
import { useNavigate } from 'react-router-dom';
import { type InvitationAcceptance, invitationAcceptance } from '#shared/api/people.ts';
import { acceptInvitation } from '../../api/invitations.ts';
import { useSignIn } from '../../api/me.ts';
import { ProblemError } from '../../api/problem-error.ts';
import { TextField } from '../../components/TextField.tsx';
import { FormFrame } from '../form/FormFrame.tsx';
import { useSavedForm } from '../form/use-saved-form.ts';

const labels = { name: 'Name', email: 'E-mail', password: 'Password' };

/** An address that is taken is a matter of one field. */
const atField = (error: unknown): unknown => {
  if (!(error instanceof ProblemError) || error.problem.type !== 'member.exists') return error;
  const errors = [{ path: 'email', message: error.problem.detail }];
  return new ProblemError({ ...error.problem, errors });
};

interface JoinFormProps {
  readonly code: string;
  /** The account is made; signing in follows, and this form stays until its page is left. */
  readonly onJoined: () => void;
}

export function JoinForm({ code, onJoined }: JoinFormProps) {
  const navigate = useNavigate();
  const signIn = useSignIn();
  const saved = useSavedForm<InvitationAcceptance>({
    resolver: zodResolver(invitationAcceptance),
    values: { name: '', email: '', password: '' },
    labels,
    save: async (given) => {
      await acceptInvitation(code, given).catch((error: unknown) => {
        throw atField(error);
      });
      onJoined();
      // Whatever signing in says is said on its own page.
      await signIn.mutateAsync(given).catch(() => undefined);
    },
    onSaved: () => void navigate('/welcome'),
  });
  const { errorAt, form } = saved;
  return (
    <FormFrame saved={saved} does="Join the club">
      <TextField
        label="Name"
        hint="As the club knows you; it stands on what you share"
        autoComplete="name"
        error={errorAt('name')}
        {...form.register('name')}
      />
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        hint="You sign in with it; only administrators see it"
        error={errorAt('email')}
        {...form.register('email')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters; a sentence is easy to keep in mind"
        error={errorAt('password')}
        {...form.register('password')}
      />
    </FormFrame>
  );
}
