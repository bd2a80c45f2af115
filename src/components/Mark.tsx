/** The program's own mark: four strokes and the fifth across, in a frame. */
export function Mark({ sizePx = 28 }: { readonly sizePx?: number }) {
  return (
    <svg viewBox="0 0 32 32" width={sizePx} height={sizePx} aria-hidden="true" fill="none">
      <rect x="1" y="1" width="30" height="30" className="fill-paper stroke-ink" strokeWidth="2" />
      <path d="M8 8v16M13.33 8v16M18.67 8v16M24 8v16" className="stroke-ink" strokeWidth="2" />
      <path d="M4.5 22 27.5 10" className="stroke-layout" strokeWidth="2.75" />
    </svg>
  );
}
