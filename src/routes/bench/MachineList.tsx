import { useQuery } from '@tanstack/react-query';
import { machinesQuery, useRemoveMachine } from '../../api/machines.ts';
import { machineInUse, useMachineInUse } from '../../machine/machine-in-use.tsx';
import { BenchSection } from './BenchSection.tsx';
import { addHref } from './bench-address.ts';
import { MachineSheet } from './machine/MachineSheet.tsx';
import type { useRemoval } from './use-removal.ts';

export function MachineList({ removal }: { readonly removal: ReturnType<typeof useRemoval> }) {
  const { data } = useQuery(machinesQuery);
  const { mutateAsync } = useRemoveMachine();
  const { machineId, setMachineId } = useMachineInUse();
  const machines = (data?.items ?? []).filter(({ id }) => !removal.isHidden(id));
  const inUse = machineInUse(machines, machineId);
  return (
    <BenchSection
      title="Machines"
      count={machines.length}
      addHref={addHref('machine')}
      does="Add a machine"
      empty="No machine yet. Add one first: every drawing in the loft is then shown to scale on its bed."
    >
      <ul className="mt-4 grid gap-4">
        {machines.map((machine) => (
          <MachineSheet
            key={machine.id}
            machine={machine}
            isInUse={machine.id === inUse?.id}
            onUse={() => setMachineId(machine.id)}
            onRemove={() => removal.remove({ id: machine.id, name: machine.name, send: mutateAsync })}
          />
        ))}
      </ul>
    </BenchSection>
  );
}
