import { useId } from 'react';
import { formatLengthBare } from '#shared/units/length.ts';
import { DimensionLine } from '../../../components/DimensionLine.tsx';
import { HatchPattern } from '../../../components/HatchPattern.tsx';
import { type Bed, bedView, cardBoxPx } from '../../../drawing/bed-view.ts';
import { useUnits } from '../../../units/units-context.tsx';

/** A bed from above, front at the bottom: what is kept clear of parts is hatched. */
export function BedOutline({ bed, label }: { readonly bed: Bed; readonly label: string }) {
  const id = useId();
  const { system } = useUnits();
  const { bed: outline, usable } = bedView(bed);
  const say = (mm: number) => formatLengthBare(mm, system, { trim: true, fractions: false });
  const right = outline.x + outline.width;
  const foot = outline.y + outline.height;
  return (
    <svg viewBox={`0 0 ${cardBoxPx.width} ${cardBoxPx.height}`} role="img" aria-label={label}>
      <defs>
        <HatchPattern id={id} spacing={6} />
      </defs>
      <g className="text-rule">
        <rect {...outline} fill={`url(#${id})`} className="stroke-ink" strokeWidth="2" />
      </g>
      <rect {...usable} className="fill-paper stroke-layout" strokeDasharray="12 3 2 3" />
      <g className="text-layout">
        <DimensionLine
          axis="x"
          from={outline.x}
          to={right}
          at={foot + 22}
          extendFrom={foot + 4}
          label={say(bed.bedXMm)}
        />
        <DimensionLine
          axis="y"
          from={outline.y}
          to={foot}
          at={right + 22}
          extendFrom={right + 4}
          label={say(bed.bedYMm)}
        />
      </g>
    </svg>
  );
}
