import { useQuery } from '@tanstack/react-query';
import type { Design } from '#shared/api/designs.ts';
import { takeHref } from '../../api/designs.ts';
import { meQuery } from '../../api/me.ts';
import { buttonLook } from '../../components/button-look.ts';
import { LinkButton } from '../../components/LinkButton.tsx';
import { PageTitle } from '../../components/PageTitle.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { useMyMachine } from '../../machine/use-my-machine.ts';
import { sayDay } from '../../words/say-day.ts';
import { About } from './About.tsx';
import { Cautions } from './Cautions.tsx';
import { DrawingNotes } from './DrawingNotes.tsx';
import { chosenRecord, evidenceOf } from './evidence.ts';
import { FitPanel, NoMachine } from './FitPanel.tsx';
import { FlagThis } from './FlagThis.tsx';
import { LayerTable } from './LayerTable.tsx';
import { Lineage } from './Lineage.tsx';
import { MakeFrom } from './MakeFrom.tsx';
import { OlderRevision } from './OlderRevision.tsx';
import { OwnerActions } from './OwnerActions.tsx';
import { RevisionSheet } from './RevisionSheet.tsx';
import { RecordsList } from './records/RecordsList.tsx';
import { SettingsPanel } from './SettingsPanel.tsx';
import { TakePanel, whyNotTaken } from './TakePanel.tsx';
import { WithheldBand } from './WithheldBand.tsx';

interface DesignPageProps {
  readonly design: Design;
  readonly recordId: string | null;
  /** An older revision whose drawing is looked at; null for the newest. */
  readonly olderRevision: number | null;
  readonly onChooseRecord: (recordId: string | null) => void;
}

/** A design on its sheet, with what the member must know before taking it. */
export function DesignPage({ design, recordId, olderRevision, onChooseRecord }: DesignPageProps) {
  const me = useQuery(meQuery).data ?? null;
  const { machine, isPending: isBenchPending } = useMyMachine();
  const evidence = evidenceOf(design);
  const record = chosenRecord(evidence.ofThis, recordId);
  const mayEdit = me !== null && (me.id === design.owner.id || me.role !== 'member');
  const { slug, revision, withdrawnAt } = design;
  const taken = { machineId: machine?.id ?? null, recordId: record?.id ?? null };
  const cutOf = new URLSearchParams({ revision: String(olderRevision ?? revision.number) });
  if (record !== null) cutOf.set('record', record.id);
  const recordHref = `/designs/${slug}/record?${cutOf}`;
  return (
    <>
      {/* The title stands in the title block; on a phone that is far down. */}
      <div className="mb-4 space-y-3 lg:sr-only">
        <PageTitle>{design.title}</PageTitle>
        <p className="flex flex-wrap items-center gap-x-3 gap-y-2 lg:hidden">
          {whyNotTaken(design) === null && record?.settingsWithheld === undefined && (
            <>
              <a
                href={takeHref(slug, revision.number, 'package.zip', taken)}
                download
                className={buttonLook('main')}
              >
                Take package
              </a>
              <a
                href="#before-you-cut"
                className="order-last text-sm text-layout underline underline-offset-4"
              >
                Read the safety notes first
              </a>
            </>
          )}
          <LinkButton to={recordHref} look="line">
            Record a cut
          </LinkButton>
        </p>
      </div>
      {withdrawnAt !== undefined && (
        <p className="mb-4 border-2 border-brick bg-paper p-4 font-semibold">
          <span className="text-brick">Withdrawn on {sayDay(withdrawnAt)}.</span> It is not handed out any
          more.
        </p>
      )}
      {design.withheld !== undefined && <WithheldBand what={design.title} reason={design.withheld.reason} />}
      <Cautions cautions={design.cautions} />
      {olderRevision !== null && <OlderRevision design={design} revision={olderRevision} />}
      <div className="grid gap-8 lg:grid-cols-[minmax(0,1fr)_22rem] lg:grid-rows-[auto_1fr] xl:grid-cols-[minmax(0,1fr)_25rem]">
        <div className="min-w-0 space-y-6">
          <RevisionSheet design={design} revision={olderRevision ?? revision.number} />
          {olderRevision === null && <DrawingNotes warnings={revision.drawing.warnings} />}
        </div>
        <div className="min-w-0 lg:col-start-2 lg:row-span-2">
          {machine !== null && (
            <FitPanel
              slug={slug}
              revision={revision.number}
              machine={machine}
              recordId={record?.id ?? null}
            />
          )}
          {machine === null && (isBenchPending ? <Skeleton /> : <NoMachine />)}
        </div>
        <div className="min-w-0 space-y-10 lg:col-start-1">
          <div className="grid items-start gap-8 md:grid-cols-2">
            <SettingsPanel
              evidence={evidence}
              record={record}
              settingsStanding={design.settingsStanding}
              onChoose={onChooseRecord}
            />
            <TakePanel design={design} machineId={machine?.id ?? null} record={record} />
          </div>
          <div className="grid gap-8 border-t border-ink pt-6 md:grid-cols-2">
            <About design={design} />
            <div className="min-w-0 space-y-6">
              <Lineage design={design} />
              <MakeFrom design={design} isOwner={me?.id === design.owner.id} />
              <LayerTable layers={revision.drawing.layers} />
            </div>
          </div>
          <div className="border-t border-ink pt-6">
            <RecordsList
              evidence={evidence}
              recordHref={recordHref}
              memberId={me?.id ?? null}
              chosenId={record?.id ?? null}
              onChoose={(id) => {
                onChooseRecord(id);
                document.getElementById('settings-head')?.scrollIntoView?.({ block: 'center' });
              }}
            />
          </div>
          <div className="flex flex-wrap gap-3 border-t border-ink pt-6">
            {me !== null && <FlagThis design={design} me={me} recordId={recordId} />}
            {mayEdit && <OwnerActions design={design} />}
          </div>
        </div>
      </div>
    </>
  );
}
