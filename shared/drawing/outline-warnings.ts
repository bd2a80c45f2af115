import type { LineColumn } from './refusals.ts';
import type { Outline, Segment } from './types.ts';
import { SMALL_GAP_MM, type WarningCollector } from './warnings.ts';

/** Tells of open outlines, of ends that nearly meet, and of segments without length. */
export function warnOfOutlines(
  outlines: readonly Outline[],
  warnings: WarningCollector,
  at: () => LineColumn,
  shapeKey: string,
): void {
  for (const { closed, segments } of outlines) {
    for (const segment of segments) if (isPoint(segment)) warnings.count('zero-length', at, shapeKey);
    const first = segments[0];
    const last = segments.at(-1);
    if (closed || !first || !last) continue;
    const gapMm = Math.hypot(last.to.x - first.from.x, last.to.y - first.from.y);
    const nearlyMeets = gapMm < SMALL_GAP_MM && segments.length > 1;
    warnings.count(nearlyMeets ? 'small-gap' : 'open-outline', at, shapeKey);
  }
}

function isPoint(segment: Segment): boolean {
  const { from, to } = segment;
  if (from.x !== to.x || from.y !== to.y || segment.kind === 'arc') return false;
  if (segment.kind === 'line') return true;
  const controls = segment.kind === 'cubic' ? [segment.control1, segment.control2] : [segment.control];
  return controls.every((control) => control.x === from.x && control.y === from.y);
}
