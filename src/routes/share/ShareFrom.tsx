import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Design } from '#shared/api/designs.ts';
import { designQuery } from '../../api/designs.ts';
import { EmptyState } from '../../components/EmptyState.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';
import { LoadProblem } from '../../components/LoadProblem.tsx';
import { PageTitle } from '../../components/PageTitle.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { modeFrom } from './mode-from.ts';
import { SharePage } from './SharePage.tsx';

interface ShareFromProps {
  readonly memberId: string;
  readonly slug: string;
  readonly as: 'revision' | 'remix';
  /** The revision that is remixed; not a number for the newest. */
  readonly revision: number;
}

/** A share that starts from a design: its next revision, or a remix of it. */
export function ShareFrom({ memberId, slug, as, revision }: ShareFromProps) {
  const { data: design, error, refetch } = useQuery(designQuery(slug));
  const parentSlug = as === 'revision' ? design?.parent?.slug : undefined;
  const parent = useQuery({ ...designQuery(parentSlug ?? ''), enabled: parentSlug !== undefined });
  const failed = error ?? parent.error;
  if (failed !== null) {
    return (
      <>
        <PageTitle>The design could not be read</PageTitle>
        <LoadProblem error={failed} onRetry={() => void (error === null ? parent.refetch() : refetch())} />
      </>
    );
  }
  if (design === undefined || (parentSlug !== undefined && parent.data === undefined)) {
    return (
      <>
        <PageTitle hidden>Share</PageTitle>
        <Skeleton />
      </>
    );
  }
  return <Begun design={design} original={parent.data ?? null} {...{ memberId, as, revision }} />;
}

interface BegunProps extends Pick<ShareFromProps, 'memberId' | 'as' | 'revision'> {
  readonly design: Design;
  readonly original: Design | null;
}

function Begun({ design, original, memberId, as, revision }: BegunProps) {
  // What it starts from is fixed when the page opens: a form does not change under the hands.
  const [begun] = useState(() => modeFrom({ design, original, memberId, as, revision }));
  const href = `/designs/${design.slug}`;
  if ('refusal' in begun) {
    return (
      <>
        <PageTitle>{as === 'revision' ? 'No new revision' : 'No remix'}</PageTitle>
        <EmptyState title={design.title} action={<LinkButton to={href}>Back to its sheet</LinkButton>}>
          {begun.refusal}
        </EmptyState>
      </>
    );
  }
  const { mode } = begun;
  const what = mode.kind === 'revision' ? `Revision ${mode.number}` : 'Remix';
  return (
    <div className="space-y-8">
      <div>
        <PageTitle>{`${what} of ${design.title}`}</PageTitle>
        <p className="mt-1 max-w-prose text-ink-soft">
          From{' '}
          <Link to={href} className="figures text-sm text-layout underline underline-offset-4">
            {design.drawingNumber} / {mode.kind === 'remix' ? mode.revision : design.revision.number}
          </Link>{' '}
          by {design.owner.name}. What you type here is kept on this device until you publish.
        </p>
      </div>
      <SharePage memberId={memberId} mode={mode} />
    </div>
  );
}
