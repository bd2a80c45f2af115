import { useEffect, useRef, useState } from 'react';
import type { CutRecord } from '#shared/api/cuts.ts';
import { voteOf } from '#shared/evidence/votes.ts';
import { isHazard } from '#shared/evidence/went-wrong.ts';
import { Button } from '../../../components/Button.tsx';
import { Findings } from '../../../components/Findings.tsx';
import { LinkButton } from '../../../components/LinkButton.tsx';
import { OutcomeMark } from '../../../components/OutcomeMark.tsx';
import { WentWrongList } from '../../../components/WentWrongList.tsx';
import { sayCutDay } from '../../../words/say-cut-day.ts';
import { sayDay } from '../../../words/say-day.ts';
import { EarlierVersions } from './EarlierVersions.tsx';
import { evidenceRecordOf } from './evidence-record.ts';
import { findingsShown } from './findings-shown.ts';
import { InServiceDialog } from './InServiceDialog.tsx';
import { MeasuredTable } from './MeasuredTable.tsx';
import { PhotoStrip } from './PhotoStrip.tsx';
import { RecordFacts } from './RecordFacts.tsx';

interface RecordItemProps {
  readonly record: CutRecord;
  readonly isMine: boolean;
  /** Just made or corrected by this member. */
  readonly isNew: boolean;
  /** Puts its settings forward; absent for records of other drawings. */
  readonly onChoose?: () => void;
}

function Hazards({ record }: { readonly record: CutRecord }) {
  if (!record.wentWrong.some(isHazard)) return null;
  return (
    <p className="text-sm leading-5">
      {record.hazardsSettled
        ? 'A moderator has looked at the hazard and settled it.'
        : 'No moderator has settled this hazard yet: it disputes the design, however clean other cuts came out.'}
    </p>
  );
}

/** One cut, as its member told it. */
export function RecordItem({ record, isMine, isNew, onChoose }: RecordItemProps) {
  const [isNoting, setIsNoting] = useState(false);
  const article = useRef<HTMLElement>(null);
  const { id, member, cutOn, inService, photos, measured, notes, wentWrong, design } = record;
  const withheld = record.settingsWithheld;
  const whose = `${member.name}’s cut of ${sayCutDay(cutOn)}`;
  useEffect(() => {
    if (!isNew) return;
    article.current?.scrollIntoView?.({ block: 'center' });
    article.current?.focus({ preventScroll: true });
  }, [isNew]);
  return (
    <article
      id={`record-${id}`}
      ref={article}
      tabIndex={isNew ? -1 : undefined}
      aria-label={whose}
      className={`scroll-mt-24 space-y-3 border bg-paper p-4 ${isNew ? 'border-2 border-layout' : 'border-rule'}`}
    >
      <div>
        <div className="flex items-baseline justify-between gap-3">
          <h3 className="min-w-0 text-base leading-6">
            {member.name}
            <span className="font-normal text-ink-soft">
              , {sayCutDay(cutOn)}, revision {record.revision}
            </span>
          </h3>
          <OutcomeMark outcome={record.outcome} />
        </div>
        {wentWrong.length > 0 && (
          <p className="text-sm leading-5">
            <WentWrongList codes={wentWrong} />
          </p>
        )}
        <Hazards record={record} />
        {voteOf(evidenceRecordOf(record)) === 'set-aside' && (
          <p className="text-sm leading-5 text-ink-soft">
            Shown, and not counted: only the member’s own slip went wrong.
          </p>
        )}
      </div>
      {record.findings.length > 0 && (
        <Findings label={`Findings on ${whose}`} findings={findingsShown(record.findings)} columns={1} />
      )}
      <RecordFacts told={record} withSettings={withheld === undefined} />
      {withheld !== undefined && (
        <p className="border-l-2 border-brick pl-3 text-sm leading-5">
          <strong className="text-brick">Settings withheld.</strong> {withheld.reason}
        </p>
      )}
      {measured.length > 0 && <MeasuredTable measured={measured} />}
      {notes !== '' && (
        <p className="border-l-2 border-ink pl-3 text-sm leading-5 whitespace-pre-line">{notes}</p>
      )}
      {photos.length > 0 && <PhotoStrip photos={photos} of={whose} />}
      {inService !== undefined && (
        <p className="text-sm leading-5">
          <strong className={inService.result === 'broke' ? 'text-brick' : 'text-pine'}>
            {inService.result === 'broke' ? '✕ Broke in use' : '■ Holds in use'}
          </strong>
          , noted {sayDay(inService.notedAt)}.{inService.notes === '' ? '' : ` ${inService.notes}`}
        </p>
      )}
      <EarlierVersions record={record} />
      {(isMine || onChoose !== undefined) && (
        <div className="flex flex-wrap gap-2">
          {onChoose !== undefined && withheld === undefined && (
            <Button look="quiet" className="-ml-4" onClick={onChoose}>
              Show these settings
            </Button>
          )}
          {isMine && (
            <>
              <Button onClick={() => setIsNoting(true)}>How does it hold?</Button>
              <LinkButton look="line" to={`/designs/${design.slug}/record?correct=${id}`}>
                Correct
              </LinkButton>
            </>
          )}
        </div>
      )}
      {isNoting && <InServiceDialog record={record} onClose={() => setIsNoting(false)} />}
    </article>
  );
}
