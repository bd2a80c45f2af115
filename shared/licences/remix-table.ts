import type { Licence } from '../api/vocabulary.ts';
import { licences } from '../api/vocabulary.ts';

/**
 * Under which licences a remix of a work may be shared, by the licence of the work. Among Creative Commons
 * licences as in the adapter's table of creativecommons.org (M); the hardware licences by their own terms: what is
 * reciprocal stays so, and what is permissive may become reciprocal (CERN-OHL 2, section 3; M). From one family to
 * the other nothing is allowed but out of the public domain: what the texts leave open is refused.
 */
const allowed: Readonly<Record<Licence, readonly Licence[]>> = {
  'CC0-1.0': licences,
  'CC-BY-4.0': [
    'CC-BY-4.0',
    'CC-BY-SA-4.0',
    'CC-BY-NC-4.0',
    'CC-BY-NC-SA-4.0',
    'CC-BY-ND-4.0',
    'CC-BY-NC-ND-4.0',
  ],
  'CC-BY-SA-4.0': ['CC-BY-SA-4.0'],
  'CC-BY-NC-4.0': ['CC-BY-NC-4.0', 'CC-BY-NC-SA-4.0', 'CC-BY-NC-ND-4.0'],
  'CC-BY-NC-SA-4.0': ['CC-BY-NC-SA-4.0'],
  'CC-BY-ND-4.0': [],
  'CC-BY-NC-ND-4.0': [],
  'CERN-OHL-P-2.0': ['CERN-OHL-P-2.0', 'CERN-OHL-W-2.0', 'CERN-OHL-S-2.0'],
  'CERN-OHL-W-2.0': ['CERN-OHL-W-2.0', 'CERN-OHL-S-2.0'],
  'CERN-OHL-S-2.0': ['CERN-OHL-S-2.0'],
};

/** The licences that a remix of a work under `parent` may carry; none when the work may not be changed and shared. */
export const allowedLicences = (parent: Licence): readonly Licence[] => allowed[parent];
