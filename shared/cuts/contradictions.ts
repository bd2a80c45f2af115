import type { MeasuredSize } from '#shared/api/cuts.ts';
import { questionOfUnit } from './another-unit.ts';

/** A field that cannot stay as it is, with the sentence that says what to change. */
export interface Contradiction {
  readonly path: string;
  readonly message: string;
}

interface Bed {
  readonly name: string;
  readonly bedXMm: number;
  readonly bedYMm: number;
}

/** A bit wider than the shorter side of the bed it was used on: most often another unit. Sizes in mm. */
export function bitOverBed(diameterMm: number, { name, bedXMm, bedYMm }: Bed, path: string): Contradiction[] {
  const shorterSideMm = Math.min(bedXMm, bedYMm);
  if (diameterMm <= shorterSideMm) return [];
  return [
    {
      path,
      message: `A bit of ${diameterMm} mm is wider than the bed of ${name} (${shorterSideMm} mm). Check the unit`,
    },
  ];
}

export interface ToldCut {
  readonly settings: { readonly stepoverMm: number };
  readonly wentWrong?: readonly string[] | undefined;
  readonly measured?: readonly MeasuredSize[] | undefined;
  readonly sizesAreMm?: true | undefined;
  /** Local date, as 2026-11-30; absent: today. */
  readonly cutOn?: string | undefined;
}

/** What a record was told against. */
export interface CutCircumstances {
  readonly machine: Bed;
  readonly bit: { readonly diameterMm: number };
  /** Which field of the record says the bit. */
  readonly bitPath: string;
  /** Today's date in the club's time zone. */
  readonly today: string;
}

/** Long before any record: an older date is a slip of the keyboard. */
const EARLIEST = '2000-01-01';

function wrongDate(cutOn: string | undefined, today: string): Contradiction[] {
  if (cutOn === undefined || (cutOn >= EARLIEST && cutOn <= today)) return [];
  const message =
    cutOn > today
      ? `A cut cannot be later than today, ${today}`
      : 'A cut before the year 2000 is not recorded here. Check the year';
  return [{ path: 'cutOn', message }];
}

function saidTwice(wentWrong: readonly string[]): Contradiction[] {
  return wentWrong.flatMap((code, place) =>
    wentWrong.indexOf(code) === place
      ? []
      : [{ path: `wentWrong.${place}`, message: `Name each thing once: ${code} is there twice` }],
  );
}

/** What the fields of a record say against each other, its machine, its bit and the calendar: all of it at once. */
export function contradictionsOfCut(cut: ToldCut, told: CutCircumstances): Contradiction[] {
  const questions = (cut.measured ?? []).flatMap((size, place) => {
    const message = cut.sizesAreMm ? null : questionOfUnit(size);
    return message === null ? [] : [{ path: `measured.${place}.measuredMm`, message }];
  });
  const ridges =
    cut.settings.stepoverMm <= told.bit.diameterMm
      ? []
      : [
          {
            path: 'settings.stepoverMm',
            message: `Stepover must not be more than the bit diameter (${told.bit.diameterMm} mm): it would leave ridges uncut`,
          },
        ];
  return [
    ...bitOverBed(told.bit.diameterMm, told.machine, told.bitPath),
    ...ridges,
    ...saidTwice(cut.wentWrong ?? []),
    ...questions,
    ...wrongDate(cut.cutOn, told.today),
  ];
}
