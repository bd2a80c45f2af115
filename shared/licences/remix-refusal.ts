import type { Licence } from '../api/vocabulary.ts';
import { allowedLicences } from './remix-table.ts';

/** What a licence asks of whoever passes on a changed work; shown where another licence was chosen. */
const asks: Readonly<Record<Licence, string>> = {
  'CC0-1.0': 'asks nothing',
  'CC-BY-4.0': 'asks that its maker stays named',
  'CC-BY-SA-4.0': 'asks that what is made from it is passed on under the same licence',
  'CC-BY-NC-4.0': 'asks that what is made from it is not sold either',
  'CC-BY-NC-SA-4.0': 'asks that what is made from it is not sold, and is passed on under the same licence',
  'CC-BY-ND-4.0': 'forbids sharing it changed',
  'CC-BY-NC-ND-4.0': 'forbids sharing it changed',
  'CERN-OHL-P-2.0': 'asks that its notices stay with it, under a licence of its family',
  'CERN-OHL-W-2.0': 'asks that changes to it are passed on under it or the strongly reciprocal licence',
  'CERN-OHL-S-2.0': 'asks that what is made from it is passed on under the same licence',
};

const either = (parts: readonly string[]): string =>
  parts.length < 2 ? parts.join('') : `${parts.slice(0, -1).join(', ')} or ${parts.at(-1) ?? ''}`;

/** Why a remix of a work named `title` under `parent` may not be shared under `chosen`; null when it may. */
export function remixRefusal(title: string, parent: Licence, chosen: Licence): string | null {
  const allowed = allowedLicences(parent);
  if (allowed.length === 0) {
    return `“${title}” is under ${parent}: it may be cut as it is, but not changed and shared. Ask its maker for another licence.`;
  }
  if (allowed.includes(chosen)) return null;
  return `“${title}” is under ${parent}, which ${asks[parent]}: share this under ${either(allowed)}, not under ${chosen}.`;
}
