import { useId } from 'react';
import { useUnits } from '../units/units-context.tsx';

interface Graduation {
  readonly stepPx: number;
  readonly count: number;
  /** How long each tick is, 0 to 1, by its place in the pattern. */
  readonly reach: (index: number) => number;
}

// CSS fixes 96 px to the inch, so these are millimetres and sixteenths as the style sheet knows them.
const graduations: Readonly<Record<'mm' | 'in', Graduation>> = {
  mm: { stepPx: 96 / 25.4, count: 10, reach: (index) => (index === 0 ? 1 : index === 5 ? 0.7 : 0.4) },
  in: {
    stepPx: 6,
    count: 16,
    reach: (index) =>
      index === 0 ? 1 : index === 8 ? 0.8 : index % 4 === 0 ? 0.62 : index % 2 === 0 ? 0.45 : 0.28,
  },
};

interface RulerProps {
  /** Which way the ticks stand: up from a lower edge, or down from an upper one. */
  readonly from: 'below' | 'above';
}

/** The edge of a rule, in the units in use. */
export function Ruler({ from }: RulerProps) {
  const id = useId();
  const { system } = useUnits();
  const { stepPx, count, reach } = graduations[system];
  const ticks = Array.from({ length: count }, (_, index) => {
    const lengthPx = 8 * reach(index);
    return `M${index * stepPx + 0.5} ${from === 'below' ? 8 - lengthPx : 0}v${lengthPx}`;
  }).join('');
  return (
    <svg aria-hidden="true" className="block h-2 w-full text-ink print:hidden">
      <pattern id={id} width={stepPx * count} height="8" patternUnits="userSpaceOnUse">
        <path d={ticks} stroke="currentColor" />
      </pattern>
      <rect width="100%" height="8" fill={`url(#${id})`} />
    </svg>
  );
}
