import type { Licence } from '#shared/api/vocabulary.ts';

/** What each licence lets others do, in one plain sentence; the licence's own text is what counts. */
export const licenceSentences: Readonly<Record<Licence, string>> = {
  'CC0-1.0': 'Anyone may do anything with it, and need not name its maker.',
  'CC-BY-4.0': 'Anyone may use, change and sell it, as long as they name its maker.',
  'CC-BY-SA-4.0':
    'Anyone may use, change and sell it, naming its maker; changes are shared under the same licence.',
  'CC-BY-NC-4.0': 'Anyone may use and change it, naming its maker, but not to earn money.',
  'CC-BY-NC-SA-4.0': 'Not to earn money; changes are shared under the same licence, naming its maker.',
  'CC-BY-ND-4.0': 'Anyone may cut and sell it as it is, naming its maker, but not share a changed one.',
  'CC-BY-NC-ND-4.0': 'Anyone may cut it as it is, naming its maker: no selling, no sharing of a changed one.',
  'CERN-OHL-P-2.0': 'For hardware: anyone may make, change and sell it, as long as the notices are kept.',
  'CERN-OHL-W-2.0':
    'For hardware: changes to this part are shared under the same licence; what it is built into need not be.',
  'CERN-OHL-S-2.0':
    'For hardware: changes, and what it is built into, are shared under the same licence with their sources.',
};
