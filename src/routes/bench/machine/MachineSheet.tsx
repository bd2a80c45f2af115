import type { Machine } from '#shared/api/bench.ts';
import { formatSize } from '#shared/units/length.ts';
import { Button } from '../../../components/Button.tsx';
import { useUnits } from '../../../units/units-context.tsx';
import { machineClassLabels } from '../../../words/labels.ts';
import { changeHref } from '../bench-address.ts';
import { RowActions } from '../RowActions.tsx';
import { BedOutline } from './BedOutline.tsx';
import { machineFacts } from './machine-facts.ts';

interface MachineSheetProps {
  readonly machine: Machine;
  readonly isInUse: boolean;
  readonly onUse: () => void;
  readonly onRemove: () => void;
}

/** One machine: its bed as a drawing, its limits as a list. */
export function MachineSheet({ machine, isInUse, onUse, onRemove }: MachineSheetProps) {
  const { system } = useUnits();
  const size = formatSize([machine.bedXMm, machine.bedYMm], system, { trim: true });
  return (
    <li className="grid min-w-0 border border-ink bg-paper lg:grid-cols-[19rem_1fr]">
      <div className="border-b border-ink bg-film lg:border-r lg:border-b-0">
        <div className="mx-auto max-w-96">
          <BedOutline bed={machine} label={`Bed of ${machine.name}, ${size}`} />
        </div>
      </div>
      <div className="flex min-w-0 flex-col gap-2 p-4">
        <div>
          <h3 className="text-lg leading-7">{machine.name}</h3>
          <p className="text-ink-soft">
            {machineClassLabels[machine.class]}, {size}
          </p>
        </div>
        <dl className="grid gap-x-6 sm:grid-cols-2">
          {machineFacts(machine, system).map(([what, text]) => (
            <div
              key={what}
              className="flex min-w-0 flex-wrap justify-between gap-x-3 border-b border-rule py-1 sm:last:col-span-full"
            >
              <dt className="text-ink-soft">{what}</dt>
              <dd className="figures min-w-0 text-sm leading-6">{text}</dd>
            </div>
          ))}
        </dl>
        <div className="mt-auto flex flex-wrap items-center justify-between gap-x-4">
          <RowActions
            name={machine.name}
            changeHref={changeHref('machine', machine.id)}
            onRemove={onRemove}
          />
          {isInUse ? (
            <p className="font-semibold text-pine">Machine in use</p>
          ) : (
            <Button look="quiet" onClick={onUse} aria-label={`Use ${machine.name}`}>
              Use this machine
            </Button>
          )}
        </div>
      </div>
    </li>
  );
}
