import type { ReactNode } from 'react';
import type { Geometry } from '#shared/api/drawings.ts';
import { formatLengthBare, formatSize } from '#shared/units/length.ts';
import { preferredScale } from '../drawing/preferred-scale.ts';
import { useUnits } from '../units/units-context.tsx';
import { DimensionLine } from './DimensionLine.tsx';
import { LineKey } from './LineKey.tsx';
import { ShapeLines } from './ShapeLines.tsx';
import { SheetFrame } from './SheetFrame.tsx';
import { useWidthPx } from './use-width-px.ts';

interface DrawingSheetProps {
  readonly geometry: Geometry;
  readonly title: string;
  /** Bottom right; it is told the scale that the sheet chose. */
  readonly titleBlock: (scale: string) => ReactNode;
  /** Bottom left, beside the title block. */
  readonly children?: ReactNode;
}

const roomAround = (widthPx: number) =>
  widthPx < 560 ? { left: 46, right: 14, top: 24, bottom: 60 } : { left: 92, right: 56, top: 48, bottom: 80 };

/** A drawing to scale with its overall dimensions, in the frame of a sheet. */
export function DrawingSheet({ geometry, title, titleBlock, children }: DrawingSheetProps) {
  const { system } = useUnits();
  const { ref, widthPx } = useWidthPx<HTMLDivElement>(640);
  const widthMm = geometry.boundsMm.maxX - geometry.boundsMm.minX;
  const heightMm = geometry.boundsMm.maxY - geometry.boundsMm.minY;
  const room = roomAround(widthPx);
  const mostHighPx = Math.max(280, Math.min(widthPx * 0.6, 640));
  const { pxPerMm, text: scale } = preferredScale(
    Math.min(
      Math.max(80, widthPx - room.left - room.right) / Math.max(widthMm, 0.1),
      mostHighPx / Math.max(heightMm, 0.1),
    ),
  );
  const [drawnWidthPx, drawnHeightPx] = [widthMm * pxPerMm, heightMm * pxPerMm];
  const x = room.left + Math.max(0, widthPx - room.left - room.right - drawnWidthPx) / 2;
  const y = room.top;
  const heightPx = drawnHeightPx + room.top + room.bottom;
  return (
    <SheetFrame>
      <div ref={ref}>
        <svg
          role="img"
          aria-label={`Drawing of ${title}, ${formatSize([widthMm, heightMm], system)}, scale ${scale}`}
          width={widthPx}
          height={heightPx}
          viewBox={`0 0 ${widthPx} ${heightPx}`}
          className="block max-w-full"
        >
          <g transform={`translate(${x} ${y})`}>
            <ShapeLines geometry={geometry} pxPerMm={pxPerMm} />
          </g>
          <g className="text-ink">
            <DimensionLine
              axis="x"
              from={x}
              to={x + drawnWidthPx}
              at={y + drawnHeightPx + 34}
              extendFrom={y + drawnHeightPx + 5}
              label={formatLengthBare(widthMm, system)}
              fontSize={13}
            />
            <DimensionLine
              axis="y"
              from={y}
              to={y + drawnHeightPx}
              at={x - 30}
              extendFrom={x - 5}
              label={formatLengthBare(heightMm, system)}
              fontSize={13}
            />
          </g>
        </svg>
      </div>
      <div className="grid items-end gap-y-4 lg:grid-cols-[1fr_minmax(24rem,28rem)]">
        <div className="self-end p-4 text-sm leading-5 text-ink-soft">
          {children}
          <div className="mt-3">
            <LineKey />
          </div>
          <p className="figures mt-2 text-xs leading-5">
            Dimensions in {system === 'mm' ? 'millimetres' : 'inches'}. Do not measure the screen.
          </p>
        </div>
        {titleBlock(scale)}
      </div>
    </SheetFrame>
  );
}
