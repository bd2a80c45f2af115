import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Navigate, Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { useEndOfSession } from '../api/end-of-session.ts';
import { machinesQuery } from '../api/machines.ts';
import { meQuery } from '../api/me.ts';
import { Shell } from '../components/Shell.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { NoWayIn } from './root/NoWayIn.tsx';
import { whereTo } from './root/where-to.ts';

export function Component() {
  useEndOfSession();
  const { pathname, search } = useLocation();
  const me = useQuery(meQuery);
  const member = me.data ?? null;
  const bench = useQuery({ ...machinesQuery, enabled: member !== null });
  const machines = bench.data?.items ?? [];
  const shell = (content: ReactNode) => (
    <Shell member={member} machines={machines}>
      {content}
      <ScrollRestoration />
    </Shell>
  );

  const error = me.error ?? bench.error;
  if (me.data === undefined && me.error !== null) return shell(<NoWayIn error={me.error} />);
  if (me.data === undefined || (member !== null && bench.isPending)) return shell(<Skeleton />);
  if (member !== null && bench.data === undefined && error !== null) return shell(<NoWayIn error={error} />);
  const elsewhere = whereTo({
    pathname,
    search,
    isSignedIn: member !== null,
    machineCount: bench.data?.items.length,
  });
  return shell(elsewhere === null ? <Outlet /> : <Navigate to={elsewhere} replace />);
}
