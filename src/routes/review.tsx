import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { meQuery } from '../api/me.ts';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { AuditLog } from './review/AuditLog.tsx';
import { FlagQueue } from './review/FlagQueue.tsx';
import { ModeratorsOnly } from './review/ModeratorsOnly.tsx';

const tabs = [
  { tab: 'open', label: 'Open', href: '/review' },
  { tab: 'decided', label: 'Decided', href: '/review?tab=decided' },
  { tab: 'audit', label: 'Audit log', href: '/review?tab=audit' },
] as const;

/** Where moderators work the flags; which part is open stands in the address. */
export function Component() {
  const [params] = useSearchParams();
  const me = useQuery(meQuery).data ?? null;
  const { tab } = tabs.find((each) => each.tab === params.get('tab')) ?? tabs[0];
  if (me === null) return <Skeleton />;
  if (me.role === 'member') {
    return (
      <>
        <PageTitle>Review desk</PageTitle>
        <ModeratorsOnly />
      </>
    );
  }
  return (
    <div className="space-y-6">
      <div>
        <PageTitle>Review desk</PageTitle>
        <p className="mt-1 max-w-prose text-ink-soft">
          Flags of members, moderators and rules, the gravest and oldest first. Each decision has a reason
          that members read.
        </p>
      </div>
      <nav aria-label="Parts of the review desk" className="flex flex-wrap gap-x-6 border-b border-ink">
        {tabs.map(({ tab: name, label, href }) => (
          <Link
            key={name}
            to={href}
            aria-current={name === tab ? 'page' : undefined}
            className="-mb-px flex min-h-10 items-center border-b-4 border-transparent text-ink-soft hover:text-ink aria-[current=page]:border-layout aria-[current=page]:font-semibold aria-[current=page]:text-ink"
          >
            {label}
          </Link>
        ))}
      </nav>
      {tab === 'audit' ? <AuditLog /> : <FlagQueue key={tab} state={tab} />}
    </div>
  );
}
