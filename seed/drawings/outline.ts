/** One step of an outline in mm, y down; `clockwise` as seen on the page. */
export type Step =
  | { readonly kind: 'move' | 'line'; readonly xMm: number; readonly yMm: number }
  | {
      readonly kind: 'arc';
      readonly radiusMm: number;
      readonly large: boolean;
      readonly clockwise: boolean;
      readonly xMm: number;
      readonly yMm: number;
    }
  | {
      readonly kind: 'curve';
      readonly controls: readonly [number, number, number, number];
      readonly xMm: number;
      readonly yMm: number;
    }
  | { readonly kind: 'close' };

export const move = (xMm: number, yMm: number): Step => ({ kind: 'move', xMm, yMm });
export const lineTo = (xMm: number, yMm: number): Step => ({ kind: 'line', xMm, yMm });
export const close: Step = { kind: 'close' };

export const arcTo = (
  radiusMm: number,
  clockwise: boolean,
  xMm: number,
  yMm: number,
  large = false,
): Step => ({ kind: 'arc', radiusMm, large, clockwise, xMm, yMm });

export const curveTo = (x1: number, y1: number, x2: number, y2: number, xMm: number, yMm: number): Step => ({
  kind: 'curve',
  controls: [x1, y1, x2, y2],
  xMm,
  yMm,
});

/** A corner of a polygon: x, y and the radius it is rounded to (none when left out). */
export type Corner = readonly [xMm: number, yMm: number, filletMm?: number];

/** A closed polygon whose corners are rounded by tangent arcs. */
export function filleted(corners: readonly Corner[]): Step[] {
  const steps: Step[] = [];
  corners.forEach((corner, index) => {
    const before = corners[(index + corners.length - 1) % corners.length] ?? corner;
    const after = corners[(index + 1) % corners.length] ?? corner;
    const [x, y, radiusMm = 0] = corner;
    const first = index === 0 ? move : lineTo;
    if (radiusMm === 0) {
      steps.push(first(x, y));
      return;
    }
    const toBefore = Math.atan2(before[1] - y, before[0] - x);
    const toAfter = Math.atan2(after[1] - y, after[0] - x);
    const between = Math.acos(Math.cos(toBefore - toAfter));
    const setbackMm = radiusMm / Math.tan(between / 2);
    const turn = (x - before[0]) * (after[1] - y) - (y - before[1]) * (after[0] - x);
    steps.push(first(x + setbackMm * Math.cos(toBefore), y + setbackMm * Math.sin(toBefore)));
    steps.push(
      arcTo(radiusMm, turn > 0, x + setbackMm * Math.cos(toAfter), y + setbackMm * Math.sin(toAfter)),
    );
  });
  return [...steps, close];
}

/** A round with its centre and radius, for outlines that wrap round two of them. */
export interface Round {
  readonly xMm: number;
  readonly yMm: number;
  readonly radiusMm: number;
}

/** Two rounds joined by their outer tangents: a slot when the radii are equal, a lever when not. */
export function wrapped(first: Round, second: Round): Step[] {
  const along = Math.atan2(second.yMm - first.yMm, second.xMm - first.xMm);
  const apartMm = Math.hypot(second.xMm - first.xMm, second.yMm - first.yMm);
  const spread = Math.acos((first.radiusMm - second.radiusMm) / apartMm);
  const on = (round: Round, angle: number): [number, number] => [
    round.xMm + round.radiusMm * Math.cos(angle),
    round.yMm + round.radiusMm * Math.sin(angle),
  ];
  return [
    move(...on(first, along + spread)),
    arcTo(first.radiusMm, true, ...on(first, along - spread), first.radiusMm > second.radiusMm),
    lineTo(...on(second, along - spread)),
    arcTo(second.radiusMm, true, ...on(second, along + spread), second.radiusMm > first.radiusMm),
    close,
  ];
}

/** A slot with round ends; the two points are the centres of its ends. */
export function slot(x1Mm: number, y1Mm: number, x2Mm: number, y2Mm: number, widthMm: number): Step[] {
  const radiusMm = widthMm / 2;
  return wrapped({ xMm: x1Mm, yMm: y1Mm, radiusMm }, { xMm: x2Mm, yMm: y2Mm, radiusMm });
}

/** Half the angle, in radians, that one scallop takes out of a wheel's rim. */
export function scallopHalfAngleRad(rimMm: number, scallopMm: number, awayMm: number): number {
  return Math.acos((rimMm ** 2 + awayMm ** 2 - scallopMm ** 2) / (2 * rimMm * awayMm));
}

/** A wheel whose rim has `count` round scallops between its lobes; the first lobe points right. */
export function scalloped(
  centre: Round,
  count: number,
  scallop: { readonly radiusMm: number; readonly awayMm: number },
): Step[] {
  const half = scallopHalfAngleRad(centre.radiusMm, scallop.radiusMm, scallop.awayMm);
  const steps: Step[] = [];
  for (let index = 0; index < count; index += 1) {
    const lobe = (index * 2 * Math.PI) / count;
    const gap = lobe + Math.PI / count;
    const at = (angle: number): [number, number] => [
      centre.xMm + centre.radiusMm * Math.cos(angle),
      centre.yMm + centre.radiusMm * Math.sin(angle),
    ];
    if (index === 0) steps.push(move(...at(-Math.PI / count + half)));
    steps.push(arcTo(centre.radiusMm, true, ...at(gap - half)));
    steps.push(arcTo(scallop.radiusMm, false, ...at(gap + half)));
  }
  return [...steps, close];
}
