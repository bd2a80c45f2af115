import { useCallback, useRef, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Bit, Machine } from '#shared/api/bench.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import { useRefreshEvidence } from '../../api/cuts.ts';
import { Button } from '../../components/Button.tsx';
import { forgetRecordDraft, keepRecordDraft, readRecordDraft } from './draft.ts';
import { RecordForm } from './RecordForm.tsx';
import { type RecordValues, valuesOf } from './record-values.ts';
import { SendPhotos } from './SendPhotos.tsx';
import { usePhotos } from './use-photos.ts';
import type { RecordTarget } from './use-record-form.ts';

interface RecordPageProps {
  readonly memberId: string;
  readonly target: RecordTarget;
  /** What a new record begins with. */
  readonly start: RecordValues;
  readonly machines: readonly Machine[];
  readonly bits: readonly Bit[];
}

/** The machine of a record may have left the bench since; it can still be named. */
const machineChoices = (machines: readonly Machine[], corrected: CutRecord | null) =>
  corrected === null || machines.some(({ id }) => id === corrected.machine.id)
    ? machines
    : [...machines, { id: corrected.machine.id, name: `${corrected.machine.name}, as recorded` }];

/** One record: typed, saved, then its photos; back to the sheet with the new stroke. */
export function RecordPage({ memberId, target, start, machines, bits }: RecordPageProps) {
  const { slug, revision, corrected } = target;
  const navigate = useNavigate();
  const refreshEvidence = useRefreshEvidence();
  const photos = usePhotos();
  const [draftOf] = useState({ memberId, slug, revision });
  const [draft, setDraft] = useState(() => readRecordDraft(draftOf, start));
  const [recorded, setRecorded] = useState<CutRecord | null>(null);
  const isDone = useRef(false);

  const startText = JSON.stringify(start);
  const { idempotencyKey } = draft;
  const keepTyped = useCallback(
    (values: RecordValues) => {
      if (corrected !== null || isDone.current || JSON.stringify(values) === startText) return;
      keepRecordDraft(draftOf, { values, idempotencyKey });
    },
    [corrected, draftOf, idempotencyKey, startText],
  );
  const openSheet = (record: CutRecord) =>
    void navigate(`/designs/${slug}#record-${record.id}`, { state: { recorded: record.id } });
  const openSheetWithPhotos = async (record: CutRecord) => {
    await refreshEvidence();
    openSheet(record);
  };
  const sendPhotos = async (record: CutRecord) => {
    if (await photos.send(record.id)) await openSheetWithPhotos(record);
  };
  const onSaved = (record: CutRecord) => {
    isDone.current = true;
    if (corrected === null) forgetRecordDraft(draftOf);
    if (photos.photos.length === 0) openSheet(record);
    else {
      setRecorded(record);
      void sendPhotos(record);
    }
  };
  const startAfresh = () => {
    forgetRecordDraft(draftOf);
    setDraft(readRecordDraft(draftOf, start));
  };

  if (recorded !== null) {
    return (
      <SendPhotos
        photos={photos}
        onRetry={() => void sendPhotos(recorded)}
        onLeave={() => void openSheetWithPhotos(recorded)}
      />
    );
  }
  return (
    <>
      {corrected === null && draft.isKept && (
        <p className="flex flex-wrap items-center gap-x-4 gap-y-1 border-l-2 border-ink pl-3">
          What you typed before is here again.
          <Button look="quiet" onClick={startAfresh}>
            Start afresh
          </Button>
        </p>
      )}
      <RecordForm
        key={idempotencyKey}
        target={target}
        values={corrected === null ? draft.values : valuesOf(corrected)}
        idempotencyKey={idempotencyKey}
        machines={machineChoices(machines, corrected)}
        bits={bits}
        photos={photos}
        onChange={keepTyped}
        onSaved={onSaved}
        onCancel={() => void navigate(`/designs/${slug}`)}
      />
    </>
  );
}
