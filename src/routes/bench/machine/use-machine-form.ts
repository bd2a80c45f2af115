import { zodResolver } from '@hookform/resolvers/zod';
import type { DefaultValues } from 'react-hook-form';
import { type Machine, type MachineCreate, machineCreate } from '#shared/api/bench.ts';
import { useAddMachine, useChangeMachine } from '../../../api/machines.ts';
import { useSavedForm } from '../../form/use-saved-form.ts';
import { machineLabels } from './machine-labels.ts';
import { machineValues, newMachineValues } from './machine-values.ts';

/** The form of one machine: of a new one, or of one on the bench. */
export const useMachineForm = (machine: Machine | null, onSaved: () => void) => {
  const add = useAddMachine();
  const change = useChangeMachine();
  const values: DefaultValues<MachineCreate> =
    machine === null ? newMachineValues('small-desktop') : machineValues(machine);
  return useSavedForm<MachineCreate>({
    resolver: zodResolver(machineCreate),
    values,
    labels: machineLabels,
    version: machine?.version,
    save: (given, version) =>
      machine === null || version === undefined
        ? add.mutateAsync(given)
        : change.mutateAsync({ id: machine.id, version, given }),
    onSaved,
  });
};

export type SavedMachine = ReturnType<typeof useMachineForm>;
