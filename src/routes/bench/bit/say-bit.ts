import type { BitCreate } from '#shared/api/bench.ts';
import { trimmed } from '#shared/units/figures.ts';
import { formatLength } from '#shared/units/length.ts';
import { formatRpm } from '#shared/units/spindle-speed.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { bitKindLabels } from '../../../words/labels.ts';

/** The measures of a bit in the order a member looks for them. */
export const sayBit = (bit: BitCreate, system: UnitSystem): string => {
  const say = (mm: number) => formatLength(mm, system, { digits: 3, trim: true });
  return (
    [
      bitKindLabels[bit.kind],
      `${say(bit.diameterMm)}${bit.angleDeg === undefined ? '' : `, ${trimmed(bit.angleDeg, 1)}°`}`,
      `${bit.flutes} ${bit.flutes === 1 ? 'flute' : 'flutes'}`,
      `cuts ${say(bit.cuttingLengthMm)}`,
      `shank ${say(bit.shankMm)}`,
      ...(bit.maxRpm === undefined ? [] : [`at most ${formatRpm(bit.maxRpm)}`]),
      ...(bit.canPlunge ? [] : ['does not plunge']),
    ]
      // A number stays with its unit; lines break between the measures.
      .map((part) => part.replaceAll(' ', '\u00a0'))
      .join(' · ')
  );
};
