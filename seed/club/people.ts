import type { SeedMember } from './types.ts';

/** The Millrace Makers: invented for the demo. The first four sign-ins are printed at start. */
export const members: readonly SeedMember[] = [
  { key: 'ada', name: 'Ada', email: 'ada@millrace.example', role: 'administrator' },
  { key: 'moss', name: 'Moss', email: 'moss@millrace.example', role: 'moderator' },
  { key: 'wren', name: 'Wren', email: 'wren@millrace.example', role: 'member' },
  { key: 'tarn', name: 'Tarn', email: 'tarn@millrace.example', role: 'member' },
  { key: 'fern', name: 'Fern', email: 'fern@millrace.example', role: 'member' },
  { key: 'heron', name: 'Heron', email: 'heron@millrace.example', role: 'member' },
  { key: 'sorrel', name: 'Sorrel', email: 'sorrel@millrace.example', role: 'member' },
];

/** The same for every demo member; printed at start, never used outside the demo. */
export const demoPassword = 'cut-once-measure-twice';

export const clubName = 'Millrace Makers';
