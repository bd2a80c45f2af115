/** What stands at the start of a panel's edge, and into how many equal parts the edge is divided. */
export interface FingerEdge {
  readonly startsOut: boolean;
  readonly parts: number;
}

interface FingerPanel {
  readonly xMm: number;
  readonly yMm: number;
  readonly widthMm: number;
  readonly heightMm: number;
  readonly sheetMm: number;
  readonly top: FingerEdge;
  readonly right: FingerEdge;
  readonly bottom: FingerEdge;
  readonly left: FingerEdge;
}

type XY = readonly [number, number];

/** The outline of a panel with finger joints on its four edges, clockwise from its top left corner. */
export function fingerPanel(panel: FingerPanel): XY[] {
  const { xMm: x, yMm: y, widthMm: w, heightMm: h, sheetMm } = panel;
  const edges = [
    { at: [x, y] as XY, along: [1, 0] as XY, inward: [0, 1] as XY, lengthMm: w, edge: panel.top },
    { at: [x + w, y] as XY, along: [0, 1] as XY, inward: [-1, 0] as XY, lengthMm: h, edge: panel.right },
    {
      at: [x + w, y + h] as XY,
      along: [-1, 0] as XY,
      inward: [0, -1] as XY,
      lengthMm: w,
      edge: panel.bottom,
    },
    { at: [x, y + h] as XY, along: [0, -1] as XY, inward: [1, 0] as XY, lengthMm: h, edge: panel.left },
  ];
  const points: XY[] = [];
  edges.forEach(({ at, along, inward, lengthMm, edge }, index) => {
    const before = edges[(index + 3) % 4]?.edge ?? edge;
    // Edges have an odd number of parts, so each ends as it starts.
    const startMm = before.startsOut ? 0 : sheetMm;
    const point = (alongMm: number, out: boolean): XY => {
      const inMm = out ? 0 : sheetMm;
      return [at[0] + along[0] * alongMm + inward[0] * inMm, at[1] + along[1] * alongMm + inward[1] * inMm];
    };
    let out = edge.startsOut;
    points.push(point(startMm, out));
    for (let part = 1; part < edge.parts; part += 1) {
      const alongMm = (lengthMm * part) / edge.parts;
      points.push(point(alongMm, out), point(alongMm, !out));
      out = !out;
    }
  });
  return points;
}

/** Corners that point into the panel: a round bit leaves them full, so they get a relief hole. */
export function insideCorners(points: readonly XY[]): XY[] {
  return points.filter((point, index) => {
    const before = points[(index + points.length - 1) % points.length] ?? point;
    const after = points[(index + 1) % points.length] ?? point;
    const turn =
      (point[0] - before[0]) * (after[1] - point[1]) - (point[1] - before[1]) * (after[0] - point[0]);
    return turn < 0;
  });
}
