import { useQuery } from '@tanstack/react-query';
import { bitsQuery } from '../api/bits.ts';
import { machinesQuery } from '../api/machines.ts';
import { Skeleton } from '../components/Skeleton.tsx';
import { FirstBits } from './welcome/FirstBits.tsx';
import { FirstMachine } from './welcome/FirstMachine.tsx';

export function Component() {
  const machines = useQuery(machinesQuery);
  const bits = useQuery(bitsQuery);
  if (machines.data === undefined) return <Skeleton />;
  return machines.data.items.length === 0 ? <FirstMachine /> : <FirstBits owned={bits.data?.items ?? []} />;
}
