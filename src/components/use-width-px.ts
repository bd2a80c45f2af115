import { type RefObject, useLayoutEffect, useRef, useState } from 'react';

/** The width of an element as it is laid out; the fallback until it is known. */
export const useWidthPx = <Kind extends HTMLElement>(
  fallbackPx: number,
): { readonly ref: RefObject<Kind | null>; readonly widthPx: number } => {
  const ref = useRef<Kind>(null);
  const [widthPx, setWidthPx] = useState(fallbackPx);
  useLayoutEffect(() => {
    const element = ref.current;
    if (element === null || typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(([entry]) => {
      if (entry !== undefined && entry.contentRect.width > 0) setWidthPx(entry.contentRect.width);
    });
    if (element.clientWidth > 0) setWidthPx(element.clientWidth);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return { ref, widthPx };
};
