import { useQuery } from '@tanstack/react-query';
import { Bell } from 'lucide-react';
import { NavLink } from 'react-router-dom';
import { noticesQuery } from '../api/notices.ts';

/** The way to the notices, with how many are not read. */
export function NoticesLink() {
  const unread = useQuery(noticesQuery).data?.unread ?? 0;
  return (
    <NavLink
      to="/notices"
      aria-label={unread === 0 ? 'Notices' : `Notices, ${unread} not read`}
      title="Notices"
      className="relative grid size-9 shrink-0 place-items-center border border-transparent hover:border-ink aria-[current=page]:border-ink"
    >
      <Bell size={20} strokeWidth={1.5} aria-hidden="true" />
      {unread > 0 && (
        <span
          aria-hidden="true"
          className="figures absolute -top-1 -right-1 min-w-4.5 bg-layout px-1 text-center text-[0.6875rem] leading-4.5 font-bold text-paper"
        >
          {unread > 99 ? '99' : unread}
        </span>
      )}
    </NavLink>
  );
}
