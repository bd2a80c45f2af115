import type { Step } from './outline.ts';

/** Outline steps as the text of a path's `d`, in the file's own unit, absolute or relative. */
export function pathData(steps: readonly Step[], inUnits: (mm: number) => number, relative: boolean): string {
  // Relative steps are taken from where the rounded text has got to, so that rounding never adds up.
  let pen = { x: 0, y: 0 };
  let start = pen;
  const words: string[] = [];
  const letter = (absolute: string) => (relative ? absolute.toLowerCase() : absolute);
  const pair = (xMm: number, yMm: number): [number, number] =>
    relative ? [tidy(inUnits(xMm) - pen.x), tidy(inUnits(yMm) - pen.y)] : [inUnits(xMm), inUnits(yMm)];
  const advance = (xMm: number, yMm: number) => {
    pen = { x: inUnits(xMm), y: inUnits(yMm) };
  };
  for (const step of steps) {
    if (step.kind === 'close') {
      words.push(letter('Z'));
      pen = start;
      continue;
    }
    const end = pair(step.xMm, step.yMm);
    if (step.kind === 'arc') {
      const radius = inUnits(step.radiusMm);
      const flags = `${step.large ? 1 : 0} ${step.clockwise ? 1 : 0}`;
      words.push(`${letter('A')}${radius} ${radius} 0 ${flags} ${end.join(' ')}`);
    } else if (step.kind === 'curve') {
      const [x1, y1, x2, y2] = step.controls;
      words.push(`${letter('C')}${[...pair(x1, y1), ...pair(x2, y2), ...end].join(' ')}`);
    } else {
      words.push(`${letter(step.kind === 'move' ? 'M' : 'L')}${end.join(' ')}`);
    }
    advance(step.xMm, step.yMm);
    if (step.kind === 'move') start = pen;
  }
  return words.join(' ');
}

/** Takes the binary dust off a difference of two rounded numbers. */
function tidy(value: number): number {
  return Number(value.toFixed(6)) + 0;
}
