import { useQuery } from '@tanstack/react-query';
import type { Design } from '#shared/api/designs.ts';
import { geometryQuery } from '../../api/designs.ts';
import { DrawingSheet } from '../../components/DrawingSheet.tsx';
import { LoadProblem } from '../../components/LoadProblem.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { titleBlockOf } from './title-block.tsx';

interface RevisionSheetProps {
  readonly design: Design;
  readonly revision: number;
}

/** One revision on its sheet; every revision stays as it was published. */
export function RevisionSheet({ design, revision }: RevisionSheetProps) {
  const { data, error, refetch } = useQuery(geometryQuery(design.slug, revision));
  if (error !== null) return <LoadProblem error={error} onRetry={() => void refetch()} />;
  if (data === undefined) return <Skeleton shape="sheet" />;
  return (
    <DrawingSheet geometry={data} title={design.title} titleBlock={titleBlockOf(design, revision)}>
      {design.summary !== '' && (
        <p className="max-w-prose text-base leading-6 whitespace-pre-line text-ink">{design.summary}</p>
      )}
    </DrawingSheet>
  );
}
