import { useSyncExternalStore } from 'react';

const query = '(min-width: 60rem)';

const subscribe = (onChange: () => void) => {
  if (typeof window.matchMedia !== 'function') return () => undefined;
  const media = window.matchMedia(query);
  media.addEventListener('change', onChange);
  return () => media.removeEventListener('change', onChange);
};

/** Whether eight columns have room side by side. */
export const useIsWide = (): boolean =>
  useSyncExternalStore(
    subscribe,
    () => typeof window.matchMedia !== 'function' || window.matchMedia(query).matches,
  );
