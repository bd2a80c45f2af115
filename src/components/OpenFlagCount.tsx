import { useInfiniteQuery } from '@tanstack/react-query';
import { flagListQuery } from '../api/flags.ts';

/** How many flags wait for a decision, beside the way to the review desk. */
export function OpenFlagCount() {
  const { data } = useInfiniteQuery(flagListQuery('open'));
  const count = data?.pages[0]?.total ?? 0;
  if (count === 0) return null;
  return (
    <span className="figures text-sm font-bold text-brick">
      {' '}
      {count}
      <span className="sr-only"> open</span>
    </span>
  );
}
