import { useQuery } from '@tanstack/react-query';
import type { Machine } from '#shared/api/bench.ts';
import { fitQuery } from '../../api/fit.ts';
import { FitList } from '../../components/FitList.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';
import { LoadProblem } from '../../components/LoadProblem.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { useUnits } from '../../units/units-context.tsx';

interface FitPanelProps {
  readonly slug: string;
  readonly revision: number;
  readonly machine: Machine;
  readonly recordId: string | null;
}

/** Does it fit my bench? Asked anew when the machine in use changes. */
export function FitPanel({ slug, revision, machine, recordId }: FitPanelProps) {
  const { system } = useUnits();
  const asked = fitQuery({ slug, revision, machineId: machine.id, recordId, units: system });
  const { data, error, refetch } = useQuery(asked);
  if (error !== null) return <LoadProblem error={error} onRetry={() => void refetch()} />;
  if (data === undefined) return <Skeleton />;
  return <FitList report={data} forWhom={machine.name} />;
}

export function NoMachine() {
  return (
    <section aria-label="Fit report" className="space-y-3">
      <p className="label-narrow text-ink-soft">Fit report</p>
      <h2 className="text-xl leading-7">Whether it fits cannot be told: your bench has no machine yet.</h2>
      <LinkButton to="/bench" look="line">
        Add your machine
      </LinkButton>
    </section>
  );
}
