import type { BitCreate } from '#shared/api/bench.ts';

const eighth = { diameterMm: 3.175, shankMm: 3.175, canPlunge: true } as const;
const quarter = { diameterMm: 6.35, shankMm: 6.35, canPlunge: true } as const;

/**
 * Bits found in most drawers. Diameters and shanks are the sizes they are sold in (1/8 in 3.175, 1/4 in
 * 6.35 mm); cutting lengths and flutes are P, common practice, and can be changed on the bench.
 */
export const commonBits: readonly BitCreate[] = [
  { name: '1/8 in up-cut, two flutes', kind: 'up-cut', flutes: 2, cuttingLengthMm: 17, ...eighth },
  { name: '1/8 in down-cut, two flutes', kind: 'down-cut', flutes: 2, cuttingLengthMm: 17, ...eighth },
  { name: '1/8 in up-cut, one flute', kind: 'up-cut', flutes: 1, cuttingLengthMm: 15, ...eighth },
  {
    name: '1/16 in up-cut, two flutes, 1/8 in shank',
    kind: 'up-cut',
    flutes: 2,
    cuttingLengthMm: 6,
    ...eighth,
    diameterMm: 1.5875,
  },
  { name: '1/4 in up-cut, two flutes', kind: 'up-cut', flutes: 2, cuttingLengthMm: 25.4, ...quarter },
  { name: '1/4 in down-cut, two flutes', kind: 'down-cut', flutes: 2, cuttingLengthMm: 25.4, ...quarter },
  { name: '1/4 in compression, two flutes', kind: 'compression', flutes: 2, cuttingLengthMm: 22, ...quarter },
  {
    name: '1/4 in straight, two flutes, does not plunge',
    kind: 'straight',
    flutes: 2,
    cuttingLengthMm: 25.4,
    ...quarter,
    canPlunge: false,
  },
  {
    name: '1/4 in ball nose, two flutes',
    kind: 'ball-nose',
    flutes: 2,
    cuttingLengthMm: 25.4,
    ...quarter,
  },
  {
    name: '60° V-bit, 1/2 in, 1/4 in shank',
    kind: 'v-bit',
    flutes: 2,
    cuttingLengthMm: 11,
    angleDeg: 60,
    ...quarter,
    diameterMm: 12.7,
  },
  {
    name: '3 mm up-cut, two flutes',
    kind: 'up-cut',
    flutes: 2,
    cuttingLengthMm: 12,
    diameterMm: 3,
    shankMm: 3,
    canPlunge: true,
  },
  {
    name: '6 mm up-cut, two flutes',
    kind: 'up-cut',
    flutes: 2,
    cuttingLengthMm: 22,
    diameterMm: 6,
    shankMm: 6,
    canPlunge: true,
  },
];
