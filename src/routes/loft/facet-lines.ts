import type { MaterialFamily, StandingWord } from '#shared/api/vocabulary.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { familyLabels, standingLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import { bitSizeWords } from './chips.ts';
import { countOf, type Facets } from './drawers.ts';
import type { FacetLine } from './FacetLinks.tsx';
import type { Filters } from './filters.ts';

type HrefWith = (change: Partial<Filters>) => string;

const standingOrder: readonly StandingWord[] = [
  'well-proven',
  'proven',
  'cut-once',
  'uncut',
  'disputed',
  'withheld',
];

/** Every standing has its line; *withheld* only for moderators, or when there is such a design. */
export const standingLines = (
  facets: Facets,
  { standing }: Filters,
  hrefWith: HrefWith,
  isModerator: boolean,
): FacetLine[] => {
  const labels = new Map(optionsOf(standingLabels).map(({ value, label }) => [value, label]));
  return standingOrder
    .filter(
      (word) => word !== 'withheld' || isModerator || word === standing || countOf(facets.standing, word) > 0,
    )
    .map((word) => ({
      value: word,
      label: labels.get(word) ?? word,
      count: countOf(facets.standing, word),
      isChosen: word === standing,
      href: hrefWith({ standing: word === standing ? null : word }),
    }));
};

/** The materials that were cut, in the order of the glossary. */
export const materialLines = (facets: Facets, { material }: Filters, hrefWith: HrefWith): FacetLine[] =>
  optionsOf<MaterialFamily>(familyLabels)
    .filter(({ value }) => value === material || countOf(facets.material, value) > 0)
    .map(({ value, label }) => ({
      value,
      label,
      count: countOf(facets.material, value),
      isChosen: value === material,
      href: hrefWith({ material: value === material ? null : value }),
    }));

/** Within this, two diameters are one size (contract: `bitMm` within 0.02). */
const SAME_SIZE_MM = 0.02;
const isSame = (bitMm: number | null, other: number): boolean =>
  bitMm !== null && Math.abs(bitMm - other) <= SAME_SIZE_MM + 1e-9;

/** Bit sizes that were used, the smallest first. */
export const bitLines = (
  facets: Facets,
  { bitMm }: Filters,
  hrefWith: HrefWith,
  system: UnitSystem,
): FacetLine[] => {
  const sizes = facets.bitMm.map(({ value, count }) => ({ size: Number(value), count }));
  const isListed = bitMm === null || sizes.some(({ size }) => isSame(bitMm, size));
  return [...sizes, ...(isListed ? [] : [{ size: bitMm, count: 0 }])]
    .sort((left, right) => left.size - right.size)
    .map(({ size, count }) => ({
      value: String(size),
      label: bitSizeWords(size, system),
      count,
      isChosen: isSame(bitMm, size),
      href: hrefWith({ bitMm: isSame(bitMm, size) ? null : size }),
    }));
};
