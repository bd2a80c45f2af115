import { useQuery } from '@tanstack/react-query';
import type { Machine } from '#shared/api/bench.ts';
import { machinesQuery } from '../api/machines.ts';
import { machineInUse, useMachineInUse } from './machine-in-use.tsx';

interface MyMachine {
  /** The machine in use; null while the bench has none, or is not read yet. */
  readonly machine: Machine | null;
  readonly machines: readonly Machine[];
  readonly isPending: boolean;
}

/** The member's machine in use, with all that is known of it. */
export const useMyMachine = (): MyMachine => {
  const { machineId } = useMachineInUse();
  const { data, isPending } = useQuery(machinesQuery);
  const machines = data?.items ?? [];
  return { machine: machineInUse(machines, machineId), machines, isPending };
};
