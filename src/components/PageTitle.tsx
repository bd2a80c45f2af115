import { useEffect } from 'react';

interface PageTitleProps {
  readonly children: string;
  /** What the browser's tab says, when it differs from the heading. */
  readonly tab?: string;
  /** Some pages carry their title in the drawing; the heading is then for screen readers. */
  readonly hidden?: boolean;
}

export function PageTitle({ children, tab = children, hidden = false }: PageTitleProps) {
  useEffect(() => {
    document.title = `${tab} · Tallyloft`;
  }, [tab]);
  return <h1 className={hidden ? 'sr-only' : 'text-2xl leading-8 md:text-3xl md:leading-10'}>{children}</h1>;
}
