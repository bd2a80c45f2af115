import type { BitUsed } from '#shared/api/cuts.ts';
import { formatLength } from '#shared/units/length.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { bitKindLabels } from './labels.ts';

/** The bit of a cut: `6.35 mm up-cut, 2 flutes`. */
export const sayBitUsed = ({ diameterMm, flutes, kind }: BitUsed, system: UnitSystem): string =>
  `${formatLength(diameterMm, system, { digits: 3, trim: true })} ${bitKindLabels[kind].toLowerCase()}, ${flutes === 1 ? '1 flute' : `${flutes} flutes`}`;
