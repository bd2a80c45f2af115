import type { Bit, Machine } from '#shared/api/bench.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { chosenRecord, evidenceOf } from '../design/evidence.ts';
import { bitOf, emptyRecord, type RecordValues } from './record-values.ts';

interface Known {
  /** The record whose settings the member took. */
  readonly record: CutRecord | null;
  readonly machine: Machine | null;
  readonly bits: readonly Bit[];
  /** My records of any design, newest first. */
  readonly mine: readonly CutRecord[];
  /** The calendar day of this device, as 2026-11-30. */
  readonly today: string;
}

/** The record that was asked for, else the one the sheet puts forward for this geometry, else none. */
export const recordToStartFrom = (
  design: Design,
  revisionNumber: number,
  recordId: string | null,
): CutRecord | null => {
  const { revision, revisions } = design;
  const { geometryHash } = revisions.find(({ number }) => number === revisionNumber) ?? revision;
  const evidence = evidenceOf({ ...design, revision: { ...revision, geometryHash } });
  const record = chosenRecord(evidence.ofThis, recordId);
  // What a moderator withheld is not put into anybody's hands again.
  return record?.settingsWithheld === undefined ? record : null;
};

/** Nothing is typed twice: what is known already stands in the form, what only this cut can tell does not. */
export const prefilled = ({ record, machine, bits, mine, today }: Known): RecordValues => {
  // My own stock and hold-down, as far as they are of the material that these settings are for.
  const stock = mine.find(({ materialId }) => record === null || materialId === record.materialId) ?? record;
  return {
    ...emptyRecord,
    machineId: machine?.id ?? '',
    ...(record === null ? {} : { ...bitOf(record.bit, bits), settings: { ...record.settings } }),
    ...(stock === null
      ? {}
      : {
          materialId: stock.materialId,
          stockThicknessMm: stock.stockThicknessMm,
          holdDown: stock.holdDown,
        }),
    cutOn: today,
  };
};

/** A day by this device's calendar, as 2026-11-30. */
export const dayOf = (date: Date): string => {
  const two = (part: number) => String(part).padStart(2, '0');
  return `${date.getFullYear()}-${two(date.getMonth() + 1)}-${two(date.getDate())}`;
};
