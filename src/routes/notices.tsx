import { useQuery } from '@tanstack/react-query';
import { noticesQuery } from '../api/notices.ts';
import { EmptyState } from '../components/EmptyState.tsx';
import { LinkButton } from '../components/LinkButton.tsx';
import { LoadProblem } from '../components/LoadProblem.tsx';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { NoticeRow } from './notices/NoticeRow.tsx';

const unreadWords = (unread: number): string => {
  if (unread === 0) return 'All read.';
  return unread === 1 ? '1 not read yet.' : `${unread} not read yet.`;
};

/** What happened to the member's designs, flags and what they took. */
export function Component() {
  const { data, error, refetch } = useQuery(noticesQuery);
  return (
    <div className="max-w-3xl space-y-6">
      <div>
        <PageTitle>Notices</PageTitle>
        <p className="mt-1 text-ink-soft" aria-live="polite">
          {data === undefined ? 'Fetching them.' : unreadWords(data.unread)}
        </p>
      </div>
      {data === undefined && error !== null && <LoadProblem error={error} onRetry={() => void refetch()} />}
      {data === undefined && error === null && <Skeleton />}
      {data?.items.length === 0 && (
        <EmptyState title="No notices yet" action={<LinkButton to="/">Open the loft</LinkButton>}>
          When somebody cuts, remixes or flags a design of yours, or a moderator decides on something you
          flagged or took, it is told here.
        </EmptyState>
      )}
      {data !== undefined && data.items.length > 0 && (
        <ul aria-label="Notices" className="border-t border-ink">
          {data.items.map((notice) => (
            <NoticeRow key={notice.id} notice={notice} />
          ))}
        </ul>
      )}
    </div>
  );
}
