import { useQuery } from '@tanstack/react-query';
import { meQuery } from '../api/me.ts';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { SharePage } from './share/SharePage.tsx';

export function Component() {
  const me = useQuery(meQuery).data ?? null;
  return (
    <div className="space-y-8">
      <div>
        <PageTitle tab="Share">Share a design</PageTitle>
        <p className="mt-1 max-w-prose text-ink-soft">
          A drawing, the words to find it by, and the settings you tried. What you type here is kept on this
          device until you publish.
        </p>
      </div>
      {me === null ? <Skeleton /> : <SharePage memberId={me.id} />}
    </div>
  );
}
