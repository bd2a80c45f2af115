interface TallyStrokesProps {
  readonly count: number;
  /** Votes against: each stroke crossed out, never bundled, so that none is lost in a five. */
  readonly crossedOut?: boolean;
}

/** More than this is written, since nobody counts forty fives. */
const MOST_STROKES = 30;
const STEP_PX = 5;

const fives = (count: number): readonly number[] => [
  ...Array.from({ length: Math.floor(count / 5) }, () => 5),
  ...(count % 5 > 0 ? [count % 5] : []),
];

/** Upright strokes, and across the four the fifth. */
const pathOf = (size: number): string => {
  const uprights = Array.from({ length: Math.min(size, 4) }, (_, index) => `M${4 + index * STEP_PX} 2v14`);
  return uprights.join('') + (size === 5 ? 'M0.5 14.5 22.5 4' : '');
};

const crossesOf = (size: number): string =>
  Array.from({ length: size }, (_, index) => {
    const x = 5 + index * 9;
    return `M${x} 2v14M${x - 3.5} 5.5l7 7m-7 0l7-7`;
  }).join('');

/** Strokes in fives; the picture only, its words stand with whoever uses it. */
export function TallyStrokes({ count, crossedOut = false }: TallyStrokesProps) {
  const drawn = Math.min(count, MOST_STROKES);
  return (
    <>
      {fives(drawn).map((size, index) => {
        const widthPx = crossedOut ? size * 9 + 1 : size === 5 ? 23 : size * STEP_PX + 3;
        return (
          <svg
            // biome-ignore lint/suspicious/noArrayIndexKey: groups have no name but their place
            key={index}
            data-strokes={size}
            aria-hidden="true"
            viewBox={`0 0 ${widthPx} 18`}
            width={widthPx}
            height="18"
            fill="none"
            strokeWidth="1.75"
            className={crossedOut ? 'stroke-brick' : 'stroke-pine'}
          >
            <path d={crossedOut ? crossesOf(size) : pathOf(size)} />
          </svg>
        );
      })}
      {count > drawn && <span className="figures text-xs">+{count - drawn}</span>}
    </>
  );
}
