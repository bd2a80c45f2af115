import type { Machine } from '#shared/api/bench.ts';
import { useUnits } from '../../../units/units-context.tsx';
import { ConflictNote } from '../../form/ConflictNote.tsx';
import { FormFrame } from '../../form/FormFrame.tsx';
import { sayValue } from '../../form/say-value.ts';
import { MachineFields } from './MachineFields.tsx';
import { machineLabels } from './machine-labels.ts';
import { machineValues } from './machine-values.ts';
import { TypedBed } from './TypedBed.tsx';
import { useMachineForm } from './use-machine-form.ts';

interface MachineFormProps {
  /** Null for a new one. */
  readonly machine: Machine | null;
  readonly onSaved: () => void;
  readonly onCancel?: () => void;
}

export function MachineForm({ machine, onSaved, onCancel }: MachineFormProps) {
  const { system } = useUnits();
  const saved = useMachineForm(machine, onSaved);
  const { current } = saved;
  return (
    <div className="grid items-start gap-8 xl:grid-cols-[minmax(0,1fr)_24rem]">
      <FormFrame
        saved={saved}
        does={machine === null ? 'Add machine' : 'Save machine'}
        {...(onCancel === undefined ? {} : { onCancel })}
        conflict={
          current !== null && (
            <ConflictNote
              what="machine"
              current={current}
              mine={saved.form.getValues()}
              labels={machineLabels}
              say={(path, value) => sayValue(path, value, system)}
              onKeepMine={saved.keepMine}
              onTakeCurrent={() => saved.takeCurrent(machineValues(current as unknown as Machine))}
            />
          )
        }
      >
        <MachineFields saved={saved} isNew={machine === null} />
      </FormFrame>
      <aside aria-label="The bed as typed" className="sticky top-24 hidden xl:block">
        <TypedBed saved={saved} />
      </aside>
    </div>
  );
}
