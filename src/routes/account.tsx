import { useQuery } from '@tanstack/react-query';
import { meQuery } from '../api/me.ts';
import { PageTitle } from '../components/PageTitle.tsx';
import { AccountFacts } from './account/AccountFacts.tsx';
import { ScreenChoices } from './account/ScreenChoices.tsx';
import { SignOutButton } from './account/SignOutButton.tsx';

export function Component() {
  const { data: me } = useQuery(meQuery);
  return (
    <div className="max-w-3xl space-y-8">
      <PageTitle>Account</PageTitle>
      {me != null && <AccountFacts me={me} />}
      <ScreenChoices />
      <SignOutButton />
    </div>
  );
}
