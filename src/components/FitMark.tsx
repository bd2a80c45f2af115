import type { FitResult } from '#shared/api/vocabulary.ts';

const looks: Readonly<Record<FitResult, { readonly colour: string; readonly path: string }>> = {
  fits: { colour: 'text-pine', path: 'M1 1h10v10H1z' },
  fitsIf: { colour: 'text-ochre', path: '' },
  doesNotFit: { colour: 'text-brick', path: 'M1 1l10 10M11 1L1 11' },
  notKnown: { colour: 'text-ink-soft', path: 'M3.5 6h5' },
};

/** A square that is filled, open, crossed or dashed: told apart without its colour. */
export function FitMark({ result }: { readonly result: FitResult }) {
  const { colour, path } = looks[result];
  return (
    <svg aria-hidden="true" viewBox="0 0 12 12" width="12" height="12" className={`shrink-0 ${colour}`}>
      <rect
        x="1"
        y="1"
        width="10"
        height="10"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
        strokeDasharray={result === 'notKnown' ? '2 2' : undefined}
      />
      <path
        d={path}
        stroke="currentColor"
        strokeWidth="2"
        fill={result === 'fits' ? 'currentColor' : 'none'}
      />
    </svg>
  );
}
