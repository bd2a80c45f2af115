/** Which units a member reads and types; everything inside the program is in millimetres. */
export type UnitSystem = 'mm' | 'in';

/** Exact by definition: 1 in = 25.4 mm (CSS Values and Units, absolute lengths). */
export const MM_PER_INCH = 25.4;
