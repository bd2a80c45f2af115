const lines = [
  { word: 'outside of the part', look: 'stroke-ink', width: 2, dashes: undefined },
  { word: 'lines within it', look: 'stroke-ink', width: 1, dashes: undefined },
  { word: 'centres of small circles', look: 'stroke-layout', width: 1, dashes: '9 2.5 2 2.5' },
] as const;

/** What the weights of line on a sheet mean (ISO 128). */
export function LineKey() {
  return (
    <ul aria-label="Lines" className="flex flex-wrap gap-x-5 gap-y-1 text-xs leading-5">
      {lines.map(({ word, look, width, dashes }) => (
        <li key={word} className="flex items-center gap-2">
          <svg aria-hidden="true" width="32" height="4" className={look}>
            <path d="M0 2H32" strokeWidth={width} strokeDasharray={dashes} />
          </svg>
          {word}
        </li>
      ))}
    </ul>
  );
}
