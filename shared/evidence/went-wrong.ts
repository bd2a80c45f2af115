// Everything a cut record may say went wrong, in one place. Codes are never renamed.

/** Danger to people or machine: one unsettled report disputes a design. */
export const hazards = ['part-came-loose', 'bit-broke', 'fire-or-smoke', 'unexpected-motion'] as const;
export type Hazard = (typeof hazards)[number];

/** The operator's own slips: they say nothing of the design. */
export const operatorSlips = ['not-zeroed', 'wrong-bit', 'clamp-forgotten'] as const;
export type OperatorSlip = (typeof operatorSlips)[number];

export const otherFaults = [
  'tear-out',
  'burning',
  'chatter',
  'size-off',
  'jammed',
  'melted',
  'other',
] as const;

export const wentWrongCodes = [...hazards, ...operatorSlips, ...otherFaults] as const;

const hazardCodes: ReadonlySet<string> = new Set(hazards);
const slipCodes: ReadonlySet<string> = new Set(operatorSlips);

export const isHazard = (code: string): code is Hazard => hazardCodes.has(code);
export const isOperatorSlip = (code: string): code is OperatorSlip => slipCodes.has(code);
export type WentWrong = (typeof wentWrongCodes)[number];
