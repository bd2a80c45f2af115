import type { BitUsed, CutRecord, MeasuredSize, Settings } from '#shared/api/cuts.ts';
import { SAME_DIAMETER_MM } from '#shared/evidence/same-settings.ts';

type Missing<Fields> = { [Field in keyof Fields]?: Fields[Field] | undefined };

/** What stands in the form: everything may still be missing. */
export interface RecordValues {
  machineId: string;
  /** The id of an own bit, or `described`. */
  bitFrom: string;
  bit: { diameterMm?: number | undefined; flutes?: number | undefined; kind: string };
  materialId: string;
  stockThicknessMm?: number | undefined;
  settings: Missing<Settings>;
  holdDown: string;
  outcome: string;
  runTimeS?: number | undefined;
  overridePercent?: number | null | undefined;
  wentWrong: string[];
  measured: Missing<MeasuredSize>[];
  /** The sizes look like another unit, and are millimetres all the same. */
  sizesAreMm?: boolean | undefined;
  cutOn: string;
  notes: string;
}

export const emptyRecord: RecordValues = {
  machineId: '',
  bitFrom: '',
  bit: { kind: '' },
  materialId: '',
  settings: {},
  holdDown: '',
  outcome: '',
  wentWrong: [],
  measured: [],
  cutOn: '',
  notes: '',
};

const isBlank = ({ drawnMm, measuredMm }: RecordValues['measured'][number]): boolean =>
  [drawnMm, measuredMm].every((sizeMm) => sizeMm === undefined || Number.isNaN(sizeMm));

/** Blank rows at the end are none; one in between stays, so that each problem is told at its own row. */
const typedRows = (rows: RecordValues['measured']): RecordValues['measured'] =>
  rows.slice(0, rows.findLastIndex((row) => !isBlank(row)) + 1);

/** The fields of the contract, as far as the form has them; the schema says what is wrong with them. */
export const givenOf = (values: RecordValues): Record<string, unknown> => {
  const { bitFrom, bit, overridePercent, measured, sizesAreMm, cutOn, outcome, ...rest } = values;
  const isOwnBit = bitFrom !== '' && bitFrom !== 'described';
  return {
    ...rest,
    outcome,
    ...(isOwnBit ? { bitId: bitFrom } : { bit }),
    ...(overridePercent === null || overridePercent === undefined ? {} : { overridePercent }),
    measured: typedRows(measured),
    ...(sizesAreMm === true ? { sizesAreMm } : {}),
    ...(cutOn === '' ? {} : { cutOn }),
  };
};

type OwnBit = BitUsed & { readonly id: string };

/**
 * The own bit that a bit that was used stands for: the same in all measures, else of the same size and kind.
 * Without one nothing is claimed: the member says which bit it was, and its measures wait to be described.
 */
export const bitOf = (used: BitUsed, bits: readonly OwnBit[]): Pick<RecordValues, 'bit' | 'bitFrom'> => {
  const { diameterMm, flutes, kind } = used;
  const alike = bits.filter(
    (each) => each.kind === kind && Math.abs(each.diameterMm - diameterMm) <= SAME_DIAMETER_MM,
  );
  const own = alike.find((each) => each.flutes === flutes) ?? alike[0];
  return { bitFrom: own?.id ?? '', bit: { diameterMm, flutes, kind } };
};

/** A record as it stands, to be corrected. Its bit stays described: the drawer may have changed since. */
export const valuesOf = (record: CutRecord): RecordValues => ({
  machineId: record.machine.id,
  bitFrom: 'described',
  bit: { ...record.bit },
  materialId: record.materialId,
  stockThicknessMm: record.stockThicknessMm,
  settings: { ...record.settings },
  holdDown: record.holdDown,
  outcome: record.outcome,
  runTimeS: record.runTimeS,
  overridePercent: record.overridePercent ?? null,
  wentWrong: [...record.wentWrong],
  measured: record.measured.map((size) => ({ ...size })),
  cutOn: record.cutOn,
  notes: record.notes,
});
