import type { Drawing, Outline, Point, Segment } from './types.ts';

/** Steps in one millimetre: numbers are told apart to 1e-6 mm, or 1e-6 rad. */
const STEPS = 1e6;

const step = (value: number) => Math.round(value * STEPS) + 0;
const pair = ({ x, y }: Point) => `${step(x)},${step(y)}`;

/**
 * The geometry of a drawing as canonical text, for hashing: shapes in document order, outlines,
 * segments, numbers as whole steps of 1e-6. Names, layers, paint and places in the file do not count.
 */
export function geometryText(drawing: Pick<Drawing, 'shapes'>): string {
  return drawing.shapes.map((shape) => `shape\n${shape.outlines.map(outlineText).join('')}`).join('');
}

function outlineText({ closed, segments }: Outline): string {
  const start = segments[0] ? ` ${pair(segments[0].from)}` : '';
  return `${closed ? 'closed' : 'open'}${start}\n${segments.map(segmentText).join('')}`;
}

function segmentText(segment: Segment): string {
  switch (segment.kind) {
    case 'line':
      return `L ${pair(segment.to)}\n`;
    case 'quadratic':
      return `Q ${pair(segment.control)} ${pair(segment.to)}\n`;
    case 'cubic':
      return `C ${pair(segment.control1)} ${pair(segment.control2)} ${pair(segment.to)}\n`;
    case 'arc': {
      const angles = `${step(segment.startAngleRad)},${step(segment.sweepAngleRad)}`;
      return `A ${pair(segment.centre)} ${pair(segment.axisU)} ${pair(segment.axisV)} ${angles} ${pair(segment.to)}\n`;
    }
  }
}
