import { formatDuration } from '#shared/units/duration.ts';
import { formatLength } from '#shared/units/length.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { kindLabels, materialLabels, standingLabels } from '../../words/labels.ts';
import type { Filters } from './filters.ts';

export interface Chip {
  readonly words: string;
  /** The filters without this one. */
  readonly without: Partial<Filters>;
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** Inches are told two decimals more than asked for: 0.236 in is enough to know a 6 mm bit by. */
export const bitSizeWords = (bitMm: number, system: UnitSystem): string =>
  formatLength(bitMm, system, { digits: system === 'mm' ? 3 : 1, trim: true });

/** Every filter that is set, in words. The order of the list leaves nothing out, so it is none. */
export const chipsOf = (filters: Filters, machineName: string | null, system: UnitSystem): Chip[] => {
  const { q, kind, material, bitMm, standing, fits, maxMinutes } = filters;
  return [
    ...(q === '' ? [] : [{ words: `“${q}”`, without: { q: '' } }]),
    ...(kind === null ? [] : [{ words: kindLabels[kind], without: { kind: null } }]),
    ...(fits && machineName !== null ? [{ words: `Fits ${machineName}`, without: { fits: false } }] : []),
    ...(standing === null ? [] : [{ words: capital(standingLabels[standing]), without: { standing: null } }]),
    ...(material === null ? [] : [{ words: capital(materialLabels[material]), without: { material: null } }]),
    ...(bitMm === null ? [] : [{ words: `${bitSizeWords(bitMm, system)} bit`, without: { bitMm: null } }]),
    ...(maxMinutes === null
      ? []
      : [{ words: `Under ${formatDuration(maxMinutes * 60)}`, without: { maxMinutes: null } }]),
  ];
};
