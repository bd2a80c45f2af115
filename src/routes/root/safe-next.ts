/** Where to go after signing in: a path of this site, else the loft. */
export const safeNext = (next: string | null): string => {
  // A base that no real page has: whatever leaves it was not a path of ours.
  const base = 'https://same.invalid';
  if (next === null || !next.startsWith('/') || !URL.canParse(next, base)) return '/';
  const { origin, pathname, search, hash } = new URL(next, base);
  if (origin !== base || pathname.startsWith('//') || pathname === '/sign-in') return '/';
  return pathname + search + hash;
};
