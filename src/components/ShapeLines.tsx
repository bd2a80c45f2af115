import { memo, useMemo } from 'react';
import type { Geometry } from '#shared/api/drawings.ts';
import { circleOf } from '../drawing/circle.ts';

interface ShapeLinesProps {
  readonly geometry: Geometry;
  readonly pxPerMm: number;
}

type Box = Geometry['boundsMm'];
const holds = (outer: Box, inner: Box): boolean =>
  outer.minX <= inner.minX &&
  outer.minY <= inner.minY &&
  outer.maxX >= inner.maxX &&
  outer.maxY >= inner.maxY;
const areaMm2 = (box: Box): number => (box.maxX - box.minX) * (box.maxY - box.minY);

/** Above this many shapes the search for outside lines is not worth its time; all are then thin. */
const MOST_COMPARED = 2000;
/** Larger circles are bays and wheels; their centre is no drilling mark. */
const MOST_MARKED_RADIUS_MM = 20;

const parts = (geometry: Geometry) => {
  const outsideBoxes: Box[] = [];
  const outside: string[] = [];
  const inside: string[] = [];
  const bySize = [...geometry.shapes].sort((left, right) => areaMm2(right.boundsMm) - areaMm2(left.boundsMm));
  for (const { boundsMm, pathData, closed } of bySize) {
    const isInside =
      !closed || bySize.length > MOST_COMPARED || outsideBoxes.some((outer) => holds(outer, boundsMm));
    (isInside ? inside : outside).push(pathData);
    if (!isInside) outsideBoxes.push(boundsMm);
  }
  return { outside: outside.join(''), inside: inside.join('') };
};

const centreMarks = (geometry: Geometry): string =>
  geometry.shapes
    .map(circleOf)
    .filter((circle) => circle !== null && circle.radiusMm <= MOST_MARKED_RADIUS_MM)
    .map((circle) => {
      if (circle === null) return '';
      const reach = circle.radiusMm + Math.max(1.5, circle.radiusMm * 0.4);
      return `M${circle.xMm - reach} ${circle.yMm}h${2 * reach}M${circle.xMm} ${circle.yMm - reach}v${2 * reach}`;
    })
    .join('');

/** The lines of a drawing: outside continuous thick, inside continuous thin, circles with centre marks. */
export const ShapeLines = memo(function ShapeLines({ geometry, pxPerMm }: ShapeLinesProps) {
  const { outside, inside } = useMemo(() => parts(geometry), [geometry]);
  const marks = useMemo(() => centreMarks(geometry), [geometry]);
  const { minX, minY } = geometry.boundsMm;
  return (
    <g transform={`scale(${pxPerMm}) translate(${-minX} ${-minY})`} fill="none">
      <path d={inside} strokeWidth="1" className="hairline stroke-ink" />
      <path d={outside} strokeWidth="2" className="hairline stroke-ink" />
      <path d={marks} strokeWidth="0.8" strokeDasharray="7 2 1.5 2" className="hairline stroke-layout" />
    </g>
  );
});
