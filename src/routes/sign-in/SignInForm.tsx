import { type FormEvent, useState } from 'react';
import { useSignIn } from '../../api/me.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { Button } from '../../components/Button.tsx';
import type { FieldProblem } from '../../components/ErrorSummary.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { TextField } from '../../components/TextField.tsx';
import { whatIsMissing } from './what-is-missing.ts';

/** Signing in makes the page above leave; a refusal is said at the fields it is about. */
export function SignInForm() {
  const signIn = useSignIn();
  const [missing, setMissing] = useState<readonly FieldProblem[]>([]);
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    const given = new FormData(form);
    const email = String(given.get('email'));
    const password = String(given.get('password'));
    const found = whatIsMissing(email, password);
    setMissing(found);
    const goTo = (name: string) => form.querySelector<HTMLInputElement>(`[name="${name}"]`)?.focus();
    const first = found[0];
    // The cursor in the field has the reason read out, and the next try begins there.
    if (first === undefined) {
      signIn.mutate({ email: email.trim(), password }, { onError: () => goTo('password') });
    } else goTo(first.path);
  };
  const messageAt = (path: string) => missing.find((problem) => problem.path === path)?.message;
  const isRefused = isProblem(signIn.error, 401);
  return (
    <form onSubmit={submit} noValidate className="border border-ink bg-paper p-1">
      <div className="grid gap-4 border border-rule p-5 md:p-6">
        {signIn.error !== null && !isRefused && (
          <ProblemNote
            problem={
              isProblem(signIn.error)
                ? signIn.error.problem
                : { title: 'Not signed in', detail: sentenceOf(signIn.error) }
            }
          />
        )}
        <TextField
          label="E-mail"
          name="email"
          type="email"
          autoComplete="username"
          required
          error={messageAt('email')}
        />
        <TextField
          label="Password"
          name="password"
          type="password"
          autoComplete="current-password"
          required
          error={messageAt('password') ?? (isRefused ? sentenceOf(signIn.error) : undefined)}
        />
        <Button look="main" type="submit" disabled={signIn.isPending} className="mt-1">
          {signIn.isPending ? 'Signing in…' : 'Sign in'}
        </Button>
      </div>
    </form>
  );
}
