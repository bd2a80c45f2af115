import { describe, expect, it } from 'vitest';
import { type Licence, licences } from '#shared/api/vocabulary.ts';
import { remixRefusal } from './remix-refusal.ts';
import { allowedLicences } from './remix-table.ts';

/** What a licence is made of, read off its identifier: another way to the same table. */
const partsOf = (licence: Licence) => ({
  isPublicDomain: licence.startsWith('CC0'),
  isHardware: licence.startsWith('CERN'),
  noDerivatives: /-ND-/.test(licence),
  nonCommercial: /-NC-/.test(licence),
  shareAlike: /-SA-/.test(licence),
  reciprocity: ['P', 'W', 'S'].indexOf(/OHL-([PWS])/.exec(licence)?.[1] ?? ''),
});

/** By what each condition means: a condition of the parent must stand in the remix's licence too. */
function mayBecome(parent: Licence, chosen: Licence): boolean {
  const from = partsOf(parent);
  const to = partsOf(chosen);
  if (from.isPublicDomain) return true;
  if (from.noDerivatives || to.isPublicDomain || from.isHardware !== to.isHardware) return false;
  if (from.isHardware) return to.reciprocity >= from.reciprocity;
  if (from.shareAlike) return parent === chosen;
  return !from.nonCommercial || to.nonCommercial;
}

const pairs = licences.flatMap((parent) => licences.map((chosen) => [parent, chosen] as const));

describe.each(pairs)('%s remixed into %s', (parent, chosen) => {
  const refusal = remixRefusal('Corner stop', parent, chosen);
  it(mayBecome(parent, chosen) ? 'may be' : 'is refused with the reason and what is allowed', () => {
    expect(allowedLicences(parent).includes(chosen)).toBe(mayBecome(parent, chosen));
    if (mayBecome(parent, chosen)) {
      expect(refusal).toBeNull();
      return;
    }
    expect(refusal).toContain(`“Corner stop” is under ${parent}`);
    if (partsOf(parent).noDerivatives) {
      expect(refusal).toContain('may be cut as it is, but not changed and shared');
      return;
    }
    for (const licence of licences.filter((other) => mayBecome(parent, other)))
      expect(refusal).toContain(licence);
    expect(refusal).toContain(`not under ${chosen}`);
  });
});

it('what one licence allows never allows more than it does itself, so that the nearest original binds for all', () => {
  for (const parent of licences)
    for (const middle of allowedLicences(parent))
      for (const last of allowedLicences(middle)) expect(allowedLicences(parent)).toContain(last);
});
