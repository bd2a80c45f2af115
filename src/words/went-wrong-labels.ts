import type { Hazard, OperatorSlip, WentWrong } from '#shared/evidence/went-wrong.ts';

/** Danger to people or machine. */
export const hazardLabels: Readonly<Record<Hazard, string>> = {
  'part-came-loose': 'Part came loose',
  'bit-broke': 'Bit broke',
  'fire-or-smoke': 'Fire or smoke',
  'unexpected-motion': 'Unexpected motion',
};

/** Says nothing of the design. */
export const slipLabels: Readonly<Record<OperatorSlip, string>> = {
  'not-zeroed': 'Not zeroed',
  'wrong-bit': 'Wrong bit fitted',
  'clamp-forgotten': 'Clamp forgotten',
};

export const otherFaultLabels: Readonly<Record<Exclude<WentWrong, Hazard | OperatorSlip>, string>> = {
  'tear-out': 'Tear-out',
  burning: 'Burning',
  chatter: 'Chatter',
  'size-off': 'Size off',
  jammed: 'Jammed',
  melted: 'Melted',
  other: 'Something else',
};

export const wentWrongLabels: Readonly<Record<WentWrong, string>> = {
  ...hazardLabels,
  ...slipLabels,
  ...otherFaultLabels,
};
