// The first part of every key, so that a change can refresh all that rests on it.
export const queryKeys = {
  me: ['me'],
  machines: ['machines'],
  bits: ['bits'],
  stock: ['stock'],
  members: ['members'],
  invitations: ['invitations'],
  designs: ['designs'],
  geometry: ['geometry'],
  fit: ['fit'],
  flags: ['flags'],
  notices: ['notices'],
  audit: ['audit'],
  cuts: ['cuts'],
} as const;

/** Fit reports and the filter "fits" rest on the bench. */
export const restOnBench = [queryKeys.fit, queryKeys.designs] as const;

/** A decision changes what is handed out, and is written down. */
export const restOnDecisions = [
  queryKeys.flags,
  queryKeys.designs,
  queryKeys.notices,
  queryKeys.audit,
] as const;
