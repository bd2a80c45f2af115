import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import type { CutRecordWithHistory } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { bitsQuery } from '../api/bits.ts';
import { cutQuery, lastCutsQuery } from '../api/cuts.ts';
import { designQuery } from '../api/designs.ts';
import { meQuery } from '../api/me.ts';
import { LoadProblem } from '../components/LoadProblem.tsx';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { useMyMachine } from '../machine/use-my-machine.ts';
import { dayOf, prefilled, recordToStartFrom } from './record/prefill.ts';
import { RecordPage } from './record/RecordPage.tsx';

const revisionAsked = ({ revision, revisions }: Design, text: string | null): number =>
  revisions.find(({ number }) => String(number) === text)?.number ?? revision.number;

function Head({
  design,
  revision,
  isCorrection,
}: {
  design: Design;
  revision: number;
  isCorrection: boolean;
}) {
  return (
    <div>
      <PageTitle tab={`Record a cut: ${design.title}`}>
        {isCorrection ? 'Correct your record' : 'Record a cut'}
      </PageTitle>
      <p className="mt-1 text-ink-soft">
        <Link to={`/designs/${design.slug}`} className="text-layout underline underline-offset-4">
          {design.title}
        </Link>
        , <span className="figures text-sm">{design.drawingNumber}</span>, revision {revision}.
        {isCorrection && ' What the record said before stays readable.'}
      </p>
    </div>
  );
}

export function Component() {
  const { slug = '' } = useParams();
  const [params] = useSearchParams();
  const correctId = params.get('correct');
  const me = useQuery(meQuery);
  const design = useQuery(designQuery(slug));
  const bits = useQuery(bitsQuery);
  const last = useQuery({ ...lastCutsQuery, enabled: correctId === null });
  // As it is now, not as it was when the sheet was opened: a correction is made to a version.
  const corrected = useQuery({
    ...cutQuery(correctId ?? ''),
    enabled: correctId !== null,
    staleTime: 0,
    refetchOnMount: 'always',
  });
  const { machine, machines, isPending: isBenchPending } = useMyMachine();
  const [today] = useState(() => dayOf(new Date()));
  // The version that the correction began with stays, however often the query answers.
  const [begun, setBegun] = useState<CutRecordWithHistory | null>(null);
  if (
    correctId !== null &&
    corrected.isFetchedAfterMount &&
    corrected.data !== undefined &&
    begun?.id !== correctId
  )
    setBegun(corrected.data);

  const failed = [me, design, bits, ...(correctId === null ? [] : [corrected])].find(
    ({ data, error }) => data === undefined && error !== null,
  );
  if (failed !== undefined) {
    return (
      <>
        <PageTitle>Record a cut</PageTitle>
        <LoadProblem error={failed.error} onRetry={() => void failed.refetch()} />
      </>
    );
  }
  const isReady = correctId === null ? !last.isPending : begun !== null;
  const memberId = me.data?.id;
  if (
    design.data === undefined ||
    bits.data === undefined ||
    memberId === undefined ||
    isBenchPending ||
    !isReady
  ) {
    return (
      <>
        <PageTitle hidden>Record a cut</PageTitle>
        <Skeleton />
      </>
    );
  }
  const target = correctId === null ? null : begun;
  const revision = target?.revision ?? revisionAsked(design.data, params.get('revision'));
  if (target !== null && target.member.id !== memberId) {
    return (
      <>
        <Head design={design.data} revision={revision} isCorrection />
        <p className="mt-4">
          This is {target.member.name}’s record: only {target.member.name} corrects it.
        </p>
      </>
    );
  }
  const record = recordToStartFrom(design.data, revision, params.get('record'));
  const start = prefilled({ record, machine, bits: bits.data.items, mine: last.data?.items ?? [], today });
  return (
    <div className="max-w-5xl space-y-6">
      <Head design={design.data} revision={revision} isCorrection={target !== null} />
      <RecordPage
        key={`${slug} ${revision} ${correctId ?? ''}`}
        memberId={memberId}
        target={{ slug, revision, corrected: target }}
        start={start}
        machines={machines}
        bits={bits.data.items}
      />
    </div>
  );
}
