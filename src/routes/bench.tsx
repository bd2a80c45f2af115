import { useQueries } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { bitsQuery } from '../api/bits.ts';
import { machinesQuery } from '../api/machines.ts';
import { isProblem, sentenceOf } from '../api/problem-error.ts';
import { stockQuery } from '../api/stock.ts';
import { PageTitle } from '../components/PageTitle.tsx';
import { ProblemNote } from '../components/ProblemNote.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { BenchLists } from './bench/BenchLists.tsx';
import { openForm } from './bench/bench-address.ts';
import { OpenBenchForm } from './bench/OpenBenchForm.tsx';

export function Component() {
  const [search] = useSearchParams();
  const parts = useQueries({ queries: [machinesQuery, bitsQuery, stockQuery] });
  const error = parts.find((part) => part.isError && part.data === undefined)?.error;
  const form = openForm(search);
  if (error != null) {
    return (
      <div className="max-w-2xl space-y-6">
        <PageTitle>Bench</PageTitle>
        <ProblemNote
          problem={
            isProblem(error) ? error.problem : { title: 'The bench is not there', detail: sentenceOf(error) }
          }
        />
      </div>
    );
  }
  if (parts.some((part) => part.isPending)) {
    return (
      <div className="space-y-6">
        <PageTitle>Bench</PageTitle>
        <Skeleton />
      </div>
    );
  }
  return form === null ? (
    <BenchLists />
  ) : (
    <OpenBenchForm key={`${form.thing} ${form.id}`} thing={form.thing} id={form.id} />
  );
}
