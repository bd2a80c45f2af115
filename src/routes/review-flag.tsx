import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { flagQuery } from '../api/flags.ts';
import { meQuery } from '../api/me.ts';
import { EmptyState } from '../components/EmptyState.tsx';
import { LinkButton } from '../components/LinkButton.tsx';
import { LoadProblem } from '../components/LoadProblem.tsx';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { FlagPage } from './review/FlagPage.tsx';
import { ModeratorsOnly } from './review/ModeratorsOnly.tsx';

export function Component() {
  const { flag: id = '' } = useParams();
  const me = useQuery(meQuery).data ?? null;
  const isModerator = me !== null && me.role !== 'member';
  const { data, error, refetch } = useQuery({ ...flagQuery(id), enabled: isModerator });
  if (me !== null && !isModerator) {
    return (
      <>
        <PageTitle>Review desk</PageTitle>
        <ModeratorsOnly />
      </>
    );
  }
  if (data === undefined && error !== null) {
    return (
      <>
        <PageTitle>The flag could not be read</PageTitle>
        <LoadProblem error={error} onRetry={() => void refetch()} />
      </>
    );
  }
  if (me === null || data === undefined) {
    return (
      <>
        <PageTitle hidden>Flag</PageTitle>
        <Skeleton shape="sheet" />
      </>
    );
  }
  if (data === null) {
    return (
      <>
        <PageTitle>No such flag</PageTitle>
        <EmptyState
          title="No flag stands here"
          action={<LinkButton to="/review">Open the review desk</LinkButton>}
        >
          The address may be mistyped: open the flag from the list.
        </EmptyState>
      </>
    );
  }
  return (
    <FlagPage flag={data.flag} earlier={data.earlier} myId={me.id} onShowCurrent={() => void refetch()} />
  );
}
