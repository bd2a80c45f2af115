import { UserRound } from 'lucide-react';
import { NavLink } from 'react-router-dom';
import type { Role } from '#shared/api/vocabulary.ts';
import { OpenFlagCount } from './OpenFlagCount.tsx';
import { type Place, placesFor, reviewDesk } from './places.ts';
import { Ruler } from './Ruler.tsx';

const account: Place = { to: '/account', label: 'Account', Icon: UserRound };

/** The strip's places within reach of a thumb. */
export function BottomBar({ role }: { readonly role: Role }) {
  return (
    <nav
      aria-label="Main"
      className="fixed inset-x-0 bottom-0 z-20 border-t border-ink bg-paper pb-[env(safe-area-inset-bottom)] md:hidden print:hidden"
    >
      <Ruler from="above" />
      <ul className="flex">
        {[...placesFor(role), account].map(({ to, label, shortLabel = label, Icon }) => (
          <li key={to} className="min-w-0 flex-1">
            <NavLink
              to={to}
              end={to === '/'}
              className="flex min-h-14 flex-col items-center justify-center gap-0.5 text-center text-xs text-ink-soft aria-[current=page]:font-bold aria-[current=page]:text-ink"
            >
              {({ isActive }) => (
                <>
                  <span className="relative">
                    <Icon size={20} strokeWidth={1.5} aria-hidden="true" />
                    {to === reviewDesk.to && (
                      <span className="absolute -top-2 left-full">
                        <OpenFlagCount />
                      </span>
                    )}
                  </span>
                  <span className={isActive ? 'border-b-2 border-layout' : 'border-b-2 border-transparent'}>
                    {shortLabel}
                  </span>
                </>
              )}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}
