import { useRef, useState } from 'react';
import type { CutCorrection, CutCreate, CutRecord } from '#shared/api/cuts.ts';
import { useCorrectCut, useRecordCut } from '../../api/cuts.ts';
import { type SavedForm, useSavedForm } from '../form/use-saved-form.ts';
import { placeOf, recordLabels } from './record-labels.ts';
import { recordResolver } from './record-resolver.ts';
import { givenOf, type RecordValues } from './record-values.ts';
import { inWordsOfThePage, rowsInDoubt } from './unit-doubt.ts';

export interface RecordTarget {
  readonly slug: string;
  readonly revision: number;
  /** The record that is corrected; null for a new one. */
  readonly corrected: CutRecord | null;
}

interface RecordFormOptions {
  readonly target: RecordTarget;
  readonly values: RecordValues;
  readonly idempotencyKey: string;
  readonly onSaved: (record: CutRecord) => void;
}

const noRows: ReadonlySet<number> = new Set();

/** The form of a record, new or corrected, with the server's question about units. */
export const useRecordForm = ({ target, values, idempotencyKey, onSaved }: RecordFormOptions) => {
  const { slug, revision, corrected } = target;
  const record = useRecordCut();
  const correct = useCorrectCut();
  const [doubted, setDoubted] = useState(noRows);
  const made = useRef<CutRecord | null>(null);

  const send = (given: Record<string, unknown>, version: number | undefined): Promise<CutRecord> =>
    // The resolver has held the fields against the schema of the contract.
    corrected === null
      ? record.mutateAsync({ slug, given: { revision, ...given } as CutCreate, idempotencyKey })
      : correct.mutateAsync({ id: corrected.id, given: { ...given, version } as CutCorrection });

  const saved: SavedForm<RecordValues> = useSavedForm<RecordValues>({
    resolver: recordResolver,
    values,
    labels: recordLabels,
    version: corrected?.version,
    save: async (typed, version) => {
      setDoubted(noRows);
      try {
        made.current = await send(givenOf(typed), version);
      } catch (error) {
        setDoubted(rowsInDoubt(error));
        // Said of the sizes as they were sent; they may change before the next try.
        saved.form.setValue('sizesAreMm', undefined);
        throw inWordsOfThePage(error);
      }
    },
    onSaved: () => {
      if (made.current !== null) onSaved(made.current);
    },
  });
  const inOrder = [...saved.problems].sort((left, right) => placeOf(left.path) - placeOf(right.path));
  return {
    saved: { ...saved, problems: inOrder },
    doubted,
    /** They are as typed: said with the record, which is then sent. */
    takeSizesAsTyped: () => {
      saved.form.setValue('sizesAreMm', true);
      saved.submit();
    },
    settle: (row: number) => setDoubted((rows) => new Set([...rows].filter((each) => each !== row))),
  };
};
