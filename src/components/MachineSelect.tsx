import { ChevronDown } from 'lucide-react';
import { useId } from 'react';
import type { Machine } from '#shared/api/bench.ts';
import { formatSize } from '#shared/units/length.ts';
import { machineInUse, useMachineInUse } from '../machine/machine-in-use.tsx';
import { useUnits } from '../units/units-context.tsx';

export type MachineChoice = Pick<Machine, 'id' | 'name' | 'bedXMm' | 'bedYMm'>;

/** The machine that every card and fit answer is for. */
export function MachineSelect({ machines }: { readonly machines: readonly MachineChoice[] }) {
  const id = useId();
  const { system } = useUnits();
  const { machineId, setMachineId } = useMachineInUse();
  const inUse = machineInUse(machines, machineId);
  if (inUse === null) return null;
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="label-narrow block text-ink-soft">
        Machine in use
      </label>
      <div className="relative w-fit max-w-full">
        <select
          id={id}
          value={inUse.id}
          onChange={(event) => setMachineId(event.target.value)}
          className="field-sizing-content h-6 max-w-full appearance-none truncate bg-paper pr-5 text-sm leading-6 font-semibold lg:max-w-80"
        >
          {machines.map((machine) => (
            <option key={machine.id} value={machine.id}>
              {machine.name}, {formatSize([machine.bedXMm, machine.bedYMm], system, { trim: true })}
            </option>
          ))}
        </select>
        <ChevronDown
          size={16}
          strokeWidth={1.5}
          aria-hidden="true"
          className="pointer-events-none absolute right-0 bottom-1"
        />
      </div>
    </div>
  );
}
