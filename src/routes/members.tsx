import { useQuery } from '@tanstack/react-query';
import { meQuery } from '../api/me.ts';
import { EmptyState } from '../components/EmptyState.tsx';
import { LinkButton } from '../components/LinkButton.tsx';
import { PageTitle } from '../components/PageTitle.tsx';
import { InvitationList } from './members/InvitationList.tsx';
import { InviteForm } from './members/InviteForm.tsx';
import { MemberList } from './members/MemberList.tsx';

export function Component() {
  const { data: me } = useQuery(meQuery);
  if (me?.role !== 'administrator') {
    return (
      <>
        <PageTitle>Members</PageTitle>
        <EmptyState
          title="Only administrators see this list"
          action={<LinkButton to="/">Open the loft</LinkButton>}
        >
          Ask an administrator of the club to invite somebody or to change a role.
        </EmptyState>
      </>
    );
  }
  return (
    <div className="max-w-4xl space-y-10">
      <PageTitle>Members</PageTitle>
      <MemberList />
      <section aria-labelledby="invitations" className="space-y-4">
        <h2 id="invitations" className="border-b-2 border-ink pb-2 text-xl leading-7">
          Invitations
        </h2>
        <InviteForm />
        <InvitationList />
      </section>
    </div>
  );
}
