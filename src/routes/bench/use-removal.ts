import { useCallback, useEffect, useRef, useState } from 'react';
import { isProblem } from '../../api/problem-error.ts';

export interface Removal {
  readonly id: string;
  readonly name: string;
  readonly send: (id: string) => Promise<unknown>;
}

/**
 * Removals that can be taken back: a thing leaves the page at once, and the server only when the undo bar is
 * closed, something else is removed, or the page is left.
 */
export const useRemoval = () => {
  const [pending, setPending] = useState<Removal | null>(null);
  const [sentIds, setSentIds] = useState<readonly string[]>([]);
  const [failure, setFailure] = useState<unknown>(null);
  // What an event outside React's rendering (the page is left) has to find.
  const held = useRef<Removal | null>(null);
  const hold = (next: Removal | null) => {
    held.current = next;
    setPending(next);
  };
  const sendHeld = useCallback(() => {
    const removal = held.current;
    if (removal === null) return;
    held.current = null;
    setSentIds((ids) => [...ids, removal.id]);
    removal.send(removal.id).catch((error: unknown) => {
      if (isProblem(error, 404)) return;
      setSentIds((ids) => ids.filter((id) => id !== removal.id));
      setFailure(error);
    });
  }, []);
  useEffect(() => {
    window.addEventListener('pagehide', sendHeld);
    return () => {
      window.removeEventListener('pagehide', sendHeld);
      sendHeld();
    };
  }, [sendHeld]);
  return {
    pending,
    failure,
    isHidden: (id: string) => pending?.id === id || sentIds.includes(id),
    remove: (next: Removal) => {
      sendHeld();
      setFailure(null);
      hold(next);
    },
    undo: () => hold(null),
    close: () => {
      sendHeld();
      setPending(null);
    },
  };
};
