import { Link, NavLink } from 'react-router-dom';
import type { Role } from '#shared/api/vocabulary.ts';
import { type MachineChoice, MachineSelect } from './MachineSelect.tsx';
import { Mark } from './Mark.tsx';
import { NoticesLink } from './NoticesLink.tsx';
import { OpenFlagCount } from './OpenFlagCount.tsx';
import { placesFor, reviewDesk } from './places.ts';
import { Ruler } from './Ruler.tsx';
import { SearchField } from './SearchField.tsx';
import { ThemeSwitch } from './ThemeSwitch.tsx';
import { UnitsSwitch } from './UnitsSwitch.tsx';

export interface StripMember {
  readonly name: string;
  readonly role: Role;
}

interface StripProps {
  /** Null before signing in: only the mark, the units and the theme are offered. */
  readonly member: StripMember | null;
  readonly machines: readonly MachineChoice[];
}

const initials = (name: string): string =>
  name
    .split(/\s+/)
    .map((word) => word.charAt(0))
    .slice(0, 2)
    .join('')
    .toUpperCase();

const placeLook =
  'border-b-2 border-transparent py-1 whitespace-nowrap text-ink-soft hover:text-ink aria-[current=page]:border-layout aria-[current=page]:font-semibold aria-[current=page]:text-ink';

/** The bar at the top; its lower edge is a rule. */
export function Strip({ member, machines }: StripProps) {
  return (
    <header className="z-20 border-b border-ink bg-paper md:sticky md:top-0 print:hidden">
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2 px-4 py-2 md:gap-x-6 md:px-7 xl:min-h-14 xl:flex-nowrap xl:py-1">
        <Link to="/" aria-label="Tallyloft, to the loft" className="flex shrink-0 items-center gap-2.5">
          <Mark />
          <span
            className={`text-xl font-bold tracking-tight md:text-2xl ${member ? 'max-sm:hidden md:max-[1400px]:hidden' : ''}`}
          >
            Tallyloft
          </span>
        </Link>
        {member !== null && (
          <>
            <nav aria-label="Main" className="hidden items-center gap-5 md:flex">
              {placesFor(member.role).map(({ to, label }) => (
                <NavLink key={to} to={to} end={to === '/'} className={placeLook}>
                  {label}
                  {to === reviewDesk.to && <OpenFlagCount />}
                </NavLink>
              ))}
            </nav>
            <SearchField />
          </>
        )}
        <div
          className={`flex items-center gap-4 min-w-0 md:gap-6 xl:ml-auto xl:w-auto ${member ? 'w-full' : 'ml-auto'}`}
        >
          {member !== null && <MachineSelect machines={machines} />}
          <div className="ml-auto shrink-0">
            <UnitsSwitch />
          </div>
          <ThemeSwitch />
          {member !== null && <NoticesLink />}
          {member !== null && (
            <Link
              to="/account"
              aria-label={`Account of ${member.name}`}
              title={member.name}
              className="hidden size-9 shrink-0 place-items-center border border-ink text-sm font-bold hover:bg-ink hover:text-paper md:grid"
            >
              {initials(member.name)}
            </Link>
          )}
        </div>
      </div>
      <Ruler from="below" />
    </header>
  );
}
