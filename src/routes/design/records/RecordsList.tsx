import { useState } from 'react';
import { useLocation } from 'react-router-dom';
import type { CutRecord } from '#shared/api/cuts.ts';
import { hasUnsettledHazard } from '#shared/evidence/votes.ts';
import { Button } from '../../../components/Button.tsx';
import { LinkButton } from '../../../components/LinkButton.tsx';
import type { Evidence } from '../evidence.ts';
import { evidenceRecordOf } from './evidence-record.ts';
import { RecordItem } from './RecordItem.tsx';

interface RecordsListProps {
  readonly evidence: Evidence;
  readonly recordHref: string;
  readonly memberId: string | null;
  /** The record whose settings stand above. */
  readonly chosenId: string | null;
  readonly onChoose: (recordId: string) => void;
}

const SHOWN_AT_FIRST = 6;

/** What must be seen however long the list is. */
const isGrave = (record: CutRecord): boolean =>
  record.findings.some(({ level }) => level === 'do-not-cut') || hasUnsettledHazard(evidenceRecordOf(record));

const justRecorded = (state: unknown): string | null =>
  typeof state === 'object' && state !== null && 'recorded' in state && typeof state.recorded === 'string'
    ? state.recorded
    : null;

/** Everything that was recorded, newest first; records of another drawing stand apart. */
export function RecordsList({ evidence, recordHref, memberId, chosenId, onChoose }: RecordsListProps) {
  const { ofThis, ofOthers } = evidence;
  const newId = justRecorded(useLocation().state);
  const [showsAll, setShowsAll] = useState(false);
  const shown = showsAll
    ? ofThis
    : ofThis.filter((record, place) => place < SHOWN_AT_FIRST || record.id === newId || isGrave(record));
  const item = (record: CutRecord, isOfThis: boolean) => (
    <li key={record.id} className="min-w-0">
      <RecordItem
        record={record}
        isMine={record.member.id === memberId}
        isNew={record.id === newId}
        {...(isOfThis && record.id !== chosenId ? { onChoose: () => onChoose(record.id) } : {})}
      />
    </li>
  );
  const grid = 'grid items-start gap-4 xl:grid-cols-2';
  return (
    <section id="records" aria-labelledby="records-head" className="scroll-mt-24 space-y-4">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h2 id="records-head" className="text-xl leading-7">
          {ofThis.length === 0 && 'No cut records yet'}
          {ofThis.length === 1 && '1 cut record'}
          {ofThis.length > 1 && `${ofThis.length} cut records`}
        </h2>
        <LinkButton to={recordHref} look="line">
          Record a cut
        </LinkButton>
      </div>
      {newId !== null && (
        <p role="status" className="border-l-2 border-layout pl-3">
          Your record is in. The tally and the standing have been counted with it.
        </p>
      )}
      {ofThis.length === 0 && (
        <p className="text-ink-soft">
          Whoever cuts it first makes it easier for everyone after. It takes less than a minute.
        </p>
      )}
      {shown.length > 0 && <ul className={grid}>{shown.map((record) => item(record, true))}</ul>}
      {shown.length < ofThis.length && (
        <Button onClick={() => setShowsAll(true)}>Show all {ofThis.length} records</Button>
      )}
      {ofOthers.length > 0 && (
        <div className="space-y-3">
          <h3 className="label-narrow text-ink-soft">
            Of revisions drawn otherwise: no evidence for this one
          </h3>
          <ul className={grid}>{ofOthers.map((record) => item(record, false))}</ul>
        </div>
      )}
    </section>
  );
}
