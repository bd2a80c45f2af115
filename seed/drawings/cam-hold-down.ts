import { arcTo, close, lineTo, move } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

const lobe = { xMm: 22, yMm: 22, radiusMm: 22 };
const lever = { topMm: 16, bottomMm: 32, endMm: 108 };
const neckMm = 6;

/** Where a neck of `neckMm` touches the lobe and a level edge of the lever. */
function neck(edgeYMm: number): { onLobe: [number, number]; onEdge: [number, number] } {
  const away = edgeYMm < lobe.yMm ? -1 : 1;
  const centreY = edgeYMm + away * neckMm;
  const reachMm = lobe.radiusMm + neckMm;
  const centreX = lobe.xMm + Math.sqrt(reachMm ** 2 - (centreY - lobe.yMm) ** 2);
  const share = lobe.radiusMm / reachMm;
  return {
    onLobe: [lobe.xMm + (centreX - lobe.xMm) * share, lobe.yMm + (centreY - lobe.yMm) * share],
    onEdge: [centreX, edgeYMm],
  };
}

const upper = neck(lever.topMm);
const lower = neck(lever.bottomMm);
const endRadiusMm = (lever.bottomMm - lever.topMm) / 2;

/** The pivot stands 3 mm off the middle of the round, so that a quarter turn of the lever presses. */
export const camHoldDown: Sheet = {
  key: 'cam-hold-down',
  widthMm: 108,
  heightMm: 44,
  layers: [
    { name: 'counterbore 18.5, 7 deep', shapes: [circle(25, 22, 18.5)] },
    { name: 'pivot hole 8.2 through', shapes: [circle(25, 22, 8.2)] },
    {
      name: 'outside',
      shapes: [
        path([
          move(22, 0),
          arcTo(lobe.radiusMm, true, ...upper.onLobe),
          arcTo(neckMm, false, ...upper.onEdge),
          lineTo(lever.endMm - endRadiusMm, lever.topMm),
          arcTo(endRadiusMm, true, lever.endMm - endRadiusMm, lever.bottomMm),
          lineTo(...lower.onEdge),
          arcTo(neckMm, false, ...lower.onLobe),
          arcTo(lobe.radiusMm, true, 22, 44),
          arcTo(lobe.radiusMm, true, 22, 0),
          close,
        ]),
      ],
    },
  ],
};
