import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import { designQuery } from '../api/designs.ts';
import { isProblem } from '../api/problem-error.ts';
import { EmptyState } from '../components/EmptyState.tsx';
import { LinkButton } from '../components/LinkButton.tsx';
import { LoadProblem } from '../components/LoadProblem.tsx';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { DesignPage } from './design/DesignPage.tsx';

export function Component() {
  const { slug = '' } = useParams();
  const [params, setParams] = useSearchParams();
  const { data, error, refetch } = useQuery(designQuery(slug));
  if (isProblem(error, 404)) {
    return (
      <>
        <PageTitle>No such design</PageTitle>
        <EmptyState title="No sheet lies here" action={<LinkButton to="/">Open the loft</LinkButton>}>
          {error.problem.detail}
        </EmptyState>
      </>
    );
  }
  if (error !== null && data === undefined) {
    return (
      <>
        <PageTitle>The design could not be read</PageTitle>
        <LoadProblem error={error} onRetry={() => void refetch()} />
      </>
    );
  }
  if (data === undefined) {
    return (
      <>
        <PageTitle hidden>Design</PageTitle>
        <Skeleton shape="sheet" />
      </>
    );
  }
  const chooseRecord = (recordId: string | null) =>
    setParams(recordId === null ? {} : { record: recordId }, { replace: true, preventScrollReset: true });
  const asked = Number(params.get('revision'));
  const isOlder = asked !== data.revision.number && data.revisions.some(({ number }) => number === asked);
  return (
    <DesignPage
      design={data}
      recordId={params.get('record')}
      olderRevision={isOlder ? asked : null}
      onChooseRecord={chooseRecord}
    />
  );
}
