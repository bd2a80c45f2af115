import { createContext, type ReactNode, useCallback, useContext, useMemo, useState } from 'react';
import type { Machine } from '#shared/api/bench.ts';
import { keep, readKept } from '../kept/kept.ts';

interface MachineInUse {
  readonly machineId: string | null;
  readonly setMachineId: (id: string | null) => void;
}

const MachineContext = createContext<MachineInUse>({ machineId: null, setMachineId: () => undefined });

export function MachineProvider({ children }: { readonly children: ReactNode }) {
  const [machineId, setState] = useState<string | null>(() => readKept('machine'));
  const setMachineId = useCallback((id: string | null) => {
    keep('machine', id);
    setState(id);
  }, []);
  const inUse = useMemo(() => ({ machineId, setMachineId }), [machineId, setMachineId]);
  return <MachineContext value={inUse}>{children}</MachineContext>;
}

/** The id the member chose on this device; it may name a machine that is gone since. */
export const useMachineInUse = (): MachineInUse => useContext(MachineContext);

/** The chosen machine among the member's own, else the first of them, else null. */
export const machineInUse = <Item extends Pick<Machine, 'id'>>(
  machines: readonly Item[],
  machineId: string | null,
): Item | null => machines.find((machine) => machine.id === machineId) ?? machines[0] ?? null;
