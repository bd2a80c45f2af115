import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { auditQuery } from '../../api/audit.ts';
import { meQuery } from '../../api/me.ts';
import { membersQuery } from '../../api/members.ts';
import { Button } from '../../components/Button.tsx';
import { LoadProblem } from '../../components/LoadProblem.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { AuditRow } from './AuditRow.tsx';
import { ChainState } from './ChainState.tsx';

/** Every decision and change of rights, newest first; entries are only ever added. */
export function AuditLog() {
  const list = useInfiniteQuery(auditQuery);
  const me = useQuery(meQuery).data ?? null;
  // Only administrators may read the list of members; others see their own name.
  const members = useQuery({ ...membersQuery, enabled: me?.role === 'administrator' });
  if (list.data === undefined && list.error !== null) {
    return <LoadProblem error={list.error} onRetry={() => void list.refetch()} />;
  }
  const [first] = list.data?.pages ?? [];
  if (list.data === undefined || first === undefined) return <Skeleton />;
  const nameOf = (actorId: string | null): string => {
    if (actorId === null) return 'the program';
    if (actorId === me?.id) return 'you';
    const member = members.data?.items.find(({ id }) => id === actorId);
    return member?.name ?? `member ${actorId.slice(-6)}`;
  };
  return (
    <div className="max-w-4xl space-y-5">
      <ChainState isWhole={first.chainIsWhole} total={first.total} />
      <ol aria-label="Audit log" className="border-t border-ink">
        {list.data.pages
          .flatMap(({ items }) => items)
          .map((entry) => (
            <AuditRow key={entry.number} entry={entry} actor={nameOf(entry.actorId)} />
          ))}
      </ol>
      {list.hasNextPage && (
        <Button disabled={list.isFetchingNextPage} onClick={() => void list.fetchNextPage()}>
          {list.isFetchingNextPage ? 'Fetching more' : 'Show earlier entries'}
        </Button>
      )}
    </div>
  );
}
