import { cableComb } from './cable-comb.ts';
import { camHoldDown } from './cam-hold-down.ts';
import { colletWheel, colletWheelMagnets, colletWheelTwelve, colletWheelWider } from './collet-wheel.ts';
import { dowelGauge } from './dowel-gauge.ts';
import { drawerOrganiser } from './drawer-organiser.ts';
import { drawerRack } from './drawer-rack.ts';
import { dustShoeRing } from './dust-shoe-ring.ts';
import { glueStand } from './glue-stand.ts';
import { hoseGate } from './hose-gate.ts';
import { houseNumber } from './house-number.ts';
import { knobDrillingJig } from './knob-drilling-jig.ts';
import { markingBatten } from './marking-batten.ts';
import { panelFoot } from './panel-foot.ts';
import { pencilBox } from './pencil-box.ts';
import { pushShoe } from './push-shoe.ts';
import { radiusGauge } from './radius-gauge.ts';
import { sandingBlock } from './sanding-block.ts';
import { screwBin } from './screw-bin.ts';
import { shankDrawer } from './shank-drawer.ts';
import type { Sheet } from './sheet.ts';
import { slotGauge } from './slot-gauge.ts';
import { spoilboardKnob } from './spoilboard-knob.ts';
import { squareCornerStop } from './square-corner-stop.ts';
import { writeSvg } from './svg.ts';
import { twentySpacers } from './twenty-spacers.ts';
import { wedgeHoldDown, wedgeHoldDownLong } from './wedge-hold-down.ts';

/** Every drawing of the demo club. */
export const sheets: readonly Sheet[] = [
  colletWheel,
  sandingBlock,
  knobDrillingJig,
  dowelGauge,
  panelFoot,
  cableComb,
  drawerOrganiser,
  screwBin,
  houseNumber,
  markingBatten,
  pushShoe,
  hoseGate,
  glueStand,
  twentySpacers,
  wedgeHoldDown,
  camHoldDown,
  squareCornerStop,
  slotGauge,
  shankDrawer,
  drawerRack,
  spoilboardKnob,
  dustShoeRing,
  radiusGauge,
  pencilBox,
  colletWheelWider,
  colletWheelTwelve,
  colletWheelMagnets,
  wedgeHoldDownLong,
];

/** The file of the demo drawing with this key, as its owner would upload it. */
export function sheetOf(key: string): string {
  const sheet = sheets.find((one) => one.key === key);
  if (!sheet) throw new Error(`The demo club has no drawing called ${key}.`);
  return writeSvg(sheet);
}
