import type { MemberKey, SeedBit } from './types.ts';

type BitShape = Omit<SeedBit, 'owner'>;

const eighthUpCut: BitShape = {
  name: '1/8 in up-cut, two flutes',
  kind: 'up-cut',
  diameterMm: 3.175,
  shankMm: 3.175,
  flutes: 2,
  cuttingLengthMm: 22,
  canPlunge: true,
};
const eighthOneFlute: BitShape = {
  name: '1/8 in up-cut, one flute, for plastics',
  kind: 'up-cut',
  diameterMm: 3.175,
  shankMm: 3.175,
  flutes: 1,
  cuttingLengthMm: 15,
  canPlunge: true,
};
const quarterUpCut: BitShape = {
  name: '1/4 in up-cut, two flutes',
  kind: 'up-cut',
  diameterMm: 6.35,
  shankMm: 6.35,
  flutes: 2,
  cuttingLengthMm: 25.4,
  canPlunge: true,
  maxRpm: 27000,
};
const sixDownCut: BitShape = {
  name: '6 mm down-cut, two flutes',
  kind: 'down-cut',
  diameterMm: 6,
  shankMm: 6,
  flutes: 2,
  cuttingLengthMm: 22,
  canPlunge: true,
  maxRpm: 24000,
};
const sixUpCut: BitShape = {
  name: '6 mm up-cut, two flutes',
  kind: 'up-cut',
  diameterMm: 6,
  shankMm: 6,
  flutes: 2,
  cuttingLengthMm: 38,
  canPlunge: true,
  maxRpm: 24000,
};
const threeLong: BitShape = {
  name: '3 mm up-cut, long reach',
  kind: 'up-cut',
  diameterMm: 3,
  shankMm: 3,
  flutes: 2,
  cuttingLengthMm: 20,
  canPlunge: true,
};
const twoOneFlute: BitShape = {
  name: '2 mm up-cut, one flute',
  kind: 'up-cut',
  diameterMm: 2,
  shankMm: 3.175,
  flutes: 1,
  cuttingLengthMm: 8,
  canPlunge: true,
};
const twoTwoFlutes: BitShape = { ...twoOneFlute, name: '2 mm up-cut, two flutes', flutes: 2 };
const sixtyV: BitShape = {
  name: '60° V-bit',
  kind: 'v-bit',
  diameterMm: 12.7,
  shankMm: 6.35,
  flutes: 2,
  cuttingLengthMm: 11,
  canPlunge: true,
  maxRpm: 22000,
  angleDeg: 60,
};
const surfacing: BitShape = {
  name: '25.4 mm surfacing bit, three wings',
  kind: 'surfacing',
  diameterMm: 25.4,
  shankMm: 6.35,
  flutes: 3,
  cuttingLengthMm: 6,
  canPlunge: false,
  maxRpm: 18000,
};
const eightCompression: BitShape = {
  name: '8 mm compression',
  kind: 'compression',
  diameterMm: 8,
  shankMm: 8,
  flutes: 2,
  cuttingLengthMm: 32,
  canPlunge: true,
  maxRpm: 24000,
};
const quarterStraight: BitShape = {
  name: '1/4 in straight, two flutes',
  kind: 'straight',
  diameterMm: 6.35,
  shankMm: 6.35,
  flutes: 2,
  cuttingLengthMm: 25,
  canPlunge: false,
  maxRpm: 27000,
};
const sixBall: BitShape = {
  name: '6 mm ball-nose',
  kind: 'ball-nose',
  diameterMm: 6,
  shankMm: 6,
  flutes: 2,
  cuttingLengthMm: 25,
  canPlunge: true,
  maxRpm: 24000,
};

/** What lies in each member's drawer. */
const drawers: Readonly<Record<MemberKey, readonly BitShape[]>> = {
  wren: [eighthUpCut, quarterUpCut, sixtyV],
  tarn: [threeLong, eighthUpCut, sixUpCut, sixDownCut, quarterUpCut, eightCompression, surfacing],
  moss: [eighthUpCut, sixDownCut, quarterUpCut, quarterStraight, sixtyV],
  ada: [twoTwoFlutes, eighthUpCut, sixUpCut, quarterUpCut, eightCompression, sixBall, surfacing],
  fern: [twoOneFlute, eighthOneFlute, eighthUpCut],
  heron: [eighthOneFlute, eighthUpCut, sixDownCut, quarterUpCut],
  sorrel: [twoTwoFlutes, eighthUpCut, eighthOneFlute, sixDownCut, sixUpCut, quarterUpCut, sixtyV],
};

export const bits: readonly SeedBit[] = (Object.keys(drawers) as MemberKey[]).flatMap((owner) =>
  drawers[owner].map((bit) => ({ owner, ...bit })),
);
