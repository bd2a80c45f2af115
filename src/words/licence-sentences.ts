import type { Licence } from '#shared/api/vocabulary.ts';

/** What each licence lets others do, in one plain sentence; the licence's own text is what counts. */
export const licenceSentences: Readonly<Record<Licence, string>> = {
  'CC0-1.0': 'Anyone may do anything with it, and need not name you.',
  'CC-BY-4.0': 'Anyone may use, change and sell it, as long as they name you.',
  'CC-BY-SA-4.0': 'As long as they name you, and share what they change under the same licence.',
  'CC-BY-NC-4.0': 'Anyone may use and change it, naming you, but not to earn money.',
  'CC-BY-NC-SA-4.0': 'Not to earn money; changes are shared under the same licence, naming you.',
  'CC-BY-ND-4.0': 'Anyone may cut and sell it as it is, naming you, but not share a changed one.',
  'CC-BY-NC-ND-4.0': 'Anyone may cut it as it is, naming you: no selling, and no sharing of a changed one.',
  'CERN-OHL-P-2.0': 'For hardware: anyone may make, change and sell it, as long as they keep your notices.',
  'CERN-OHL-W-2.0':
    'For hardware: changes to this part are shared under the same licence; what it is built into need not be.',
  'CERN-OHL-S-2.0':
    'For hardware: changes, and what is made with it, are shared under the same licence with their sources.',
};
