import { useId, useMemo } from 'react';
import { formatLengthBare } from '#shared/units/length.ts';
import { type Bed, bedView, cardBoxPx, placeOnBed } from '../drawing/bed-view.ts';
import { outsideLines } from '../drawing/outside-lines.ts';
import { type BoundsMm, type PointMm, turnedBounds } from '../drawing/turned.ts';
import { useUnits } from '../units/units-context.tsx';
import { DimensionLine } from './DimensionLine.tsx';
import { HatchPattern } from './HatchPattern.tsx';

interface BedDrawingProps {
  /** Path data in page millimetres, y down. */
  readonly pathData: string;
  readonly boundsMm: BoundsMm;
  readonly hullMm: readonly PointMm[];
  /** Null while the member has no machine: the part then stands alone, with its own dimensions. */
  readonly bed: Bed | null;
  /** How the part lies, anticlockwise. */
  readonly turnDeg?: number;
  /** What the drawing shows, in words. */
  readonly label: string;
}

const noMargins = { left: 0, right: 0, front: 0, back: 0 };
const aloneOnBed = ({ minX, minY, maxX, maxY }: BoundsMm): Bed => ({
  bedXMm: maxX - minX,
  bedYMm: maxY - minY,
  marginMm: noMargins,
  clampStripMm: 0,
});

/** A part to scale inside the outline of a bed; what hangs over is hatched. */
export function BedDrawing({ pathData, boundsMm, hullMm, bed, turnDeg = 0, label }: BedDrawingProps) {
  const id = useId();
  const { system } = useUnits();
  const lines = useMemo(() => outsideLines(pathData), [pathData]);
  const turned = turnedBounds(hullMm, boundsMm, turnDeg);
  const drawnBed = bed ?? aloneOnBed(turned);
  const view = bedView(drawnBed);
  const { box, overhangs } = placeOnBed(view, turned);
  const part = `translate(${box.x} ${box.y}) scale(${view.scalePxPerMm}) translate(${-turned.minX} ${-turned.minY}) rotate(${-turnDeg})`;
  const { bed: outline, usable } = view;
  const hasMargins = usable.width < outline.width || usable.height < outline.height;
  const right = outline.x + outline.width;
  const hangsRight = box.x + box.width > right;
  const bottom = outline.y + outline.height;
  return (
    <svg
      viewBox={`0 0 ${cardBoxPx.width} ${cardBoxPx.height}`}
      role="img"
      aria-label={overhangs && bed !== null ? `${label}; it hangs over the bed` : label}
      data-overhang={overhangs && bed !== null}
      className="block w-full"
    >
      {hasMargins && (
        <rect {...usable} fill="none" className="stroke-rule" strokeWidth="1" strokeDasharray="2 2" />
      )}
      <g className="text-layout" strokeWidth="0.8">
        <DimensionLine
          axis="x"
          from={outline.x}
          to={right}
          at={bottom + 16}
          extendFrom={bottom + 3}
          label={formatLengthBare(drawnBed.bedXMm, system, { trim: true })}
          fontSize={11}
        />
        <DimensionLine
          axis="y"
          from={outline.y}
          to={bottom}
          // A part that hangs over to the right would lie on its figure.
          at={hangsRight ? outline.x - 15 : right + 16}
          extendFrom={hangsRight ? outline.x - 3 : right + 3}
          label={formatLengthBare(drawnBed.bedYMm, system, { trim: true })}
          fontSize={11}
        />
      </g>
      <g transform={part}>
        <path d={lines.outside} className="fill-paper" />
        <path
          d={lines.inside}
          fillRule="evenodd"
          strokeWidth="0.9"
          className="hairline fill-film stroke-ink"
        />
        <path d={lines.outside} fill="none" strokeWidth="1.75" className="hairline stroke-ink" />
      </g>
      {overhangs && bed !== null && (
        <g className="text-brick">
          <defs>
            <HatchPattern id={`${id}hatch`} spacing={4} />
            <clipPath id={`${id}part`}>
              <path d={lines.outside} transform={part} />
            </clipPath>
          </defs>
          <path
            d={`M0 0H${cardBoxPx.width}V${cardBoxPx.height}H0ZM${usable.x} ${usable.y}h${usable.width}v${usable.height}h${-usable.width}Z`}
            fillRule="evenodd"
            fill={`url(#${id}hatch)`}
            clipPath={`url(#${id}part)`}
          />
        </g>
      )}
      {bed !== null && (
        <rect
          {...outline}
          fill="none"
          strokeWidth="0.8"
          strokeDasharray="9 2.5 2 2.5"
          className="stroke-layout"
        />
      )}
    </svg>
  );
}
