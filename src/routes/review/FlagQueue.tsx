import { useInfiniteQuery } from '@tanstack/react-query';
import type { Flag } from '#shared/api/flags.ts';
import { flagListQuery } from '../../api/flags.ts';
import { Button } from '../../components/Button.tsx';
import { EmptyState } from '../../components/EmptyState.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';
import { LoadProblem } from '../../components/LoadProblem.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { FlagRow } from './FlagRow.tsx';

/** Flags that wait, gravest and oldest first, or those that were decided. */
export function FlagQueue({ state }: { readonly state: Flag['state'] }) {
  const list = useInfiniteQuery(flagListQuery(state));
  if (list.data === undefined && list.error !== null) {
    return <LoadProblem error={list.error} onRetry={() => void list.refetch()} />;
  }
  if (list.data === undefined) return <Skeleton />;
  const flags = list.data.pages.flatMap(({ items }) => items);
  if (flags.length === 0) {
    return state === 'open' ? (
      <EmptyState title="No flag is open" action={<LinkButton to="/">Open the loft</LinkButton>}>
        Nothing waits for a decision. You can flag a design yourself, from its sheet, and decide in the same
        step.
      </EmptyState>
    ) : (
      <EmptyState title="Nothing was decided yet">
        Decisions stand here with their reasons, once a moderator has made one.
      </EmptyState>
    );
  }
  const now = new Date();
  return (
    <>
      <ul aria-label={state === 'open' ? 'Open flags' : 'Decided flags'} className="max-w-4xl space-y-4">
        {flags.map((flag) => (
          <FlagRow key={flag.id} flag={flag} now={now} />
        ))}
      </ul>
      {list.hasNextPage && (
        <p className="mt-6">
          <Button disabled={list.isFetchingNextPage} onClick={() => void list.fetchNextPage()}>
            {list.isFetchingNextPage ? 'Fetching more' : 'Show more flags'}
          </Button>
        </p>
      )}
    </>
  );
}
