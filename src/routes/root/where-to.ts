interface Standing {
  readonly pathname: string;
  readonly search: string;
  readonly isSignedIn: boolean;
  /** Undefined until the bench was read. */
  readonly machineCount: number | undefined;
}

const isOpen = (pathname: string): boolean => pathname === '/sign-in' || pathname.startsWith('/join/');

/** Pages that make sense to a member without a machine. */
const needNoMachine = new Set(['/welcome', '/bench', '/account', '/members']);

/** The page to go to instead of this one, or null to stay. */
export const whereTo = ({ pathname, search, isSignedIn, machineCount }: Standing): string | null => {
  if (isOpen(pathname)) return null;
  if (!isSignedIn) {
    const here = pathname + search;
    return here === '/' ? '/sign-in' : `/sign-in?next=${encodeURIComponent(here)}`;
  }
  return machineCount === 0 && !needNoMachine.has(pathname) ? '/welcome' : null;
};
