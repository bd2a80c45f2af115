import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { isSlug } from '#shared/api/slug.ts';
import { meQuery } from '../api/me.ts';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { ShareFrom } from './share/ShareFrom.tsx';
import { SharePage } from './share/SharePage.tsx';
import { newMode } from './share/share-mode.ts';

/** A new design, or by the address the next revision of one (`revisionOf`) or a remix of one (`remixOf`). */
export function Component() {
  const me = useQuery(meQuery).data ?? null;
  const [params] = useSearchParams();
  const revisionOf = params.get('revisionOf');
  const remixOf = params.get('remixOf');
  const from = revisionOf ?? remixOf;
  if (me !== null && from !== null && isSlug(from)) {
    return (
      <ShareFrom
        key={params.toString()}
        memberId={me.id}
        slug={from}
        as={revisionOf === null ? 'remix' : 'revision'}
        revision={Number(params.get('revision'))}
      />
    );
  }
  return (
    <div className="space-y-8">
      <div>
        <PageTitle tab="Share">Share a design</PageTitle>
        <p className="mt-1 max-w-prose text-ink-soft">
          A drawing, the words to find it by, and the settings you tried. What you type here is kept on this
          device until you publish.
        </p>
      </div>
      {me === null ? <Skeleton /> : <SharePage memberId={me.id} mode={newMode} />}
    </div>
  );
}
