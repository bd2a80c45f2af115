import { useQuery } from '@tanstack/react-query';
import { Navigate, useSearchParams } from 'react-router-dom';
import { meQuery } from '../api/me.ts';
import { PageTitle } from '../components/PageTitle.tsx';
import { safeNext } from './root/safe-next.ts';
import { SignInForm } from './sign-in/SignInForm.tsx';

export function Component() {
  const [search] = useSearchParams();
  const { data: me } = useQuery(meQuery);
  if (me != null) return <Navigate to={safeNext(search.get('next'))} replace />;
  return (
    <div className="mx-auto grid max-w-md gap-6 md:pt-8">
      <div className="space-y-2">
        <PageTitle>Sign in</PageTitle>
        <p className="text-ink-soft">
          The club’s files for routers: drawings with the settings that worked, on which machine and in what.
        </p>
      </div>
      <SignInForm />
      <p className="text-sm text-ink-soft">
        No account? Members come in by a link from an administrator of the club, who also helps when a
        password is lost.
      </p>
    </div>
  );
}
