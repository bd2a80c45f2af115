import { Controller } from 'react-hook-form';
import { type MachineClass, machineClasses } from '#shared/api/vocabulary.ts';
import { machineClassDefaults } from '#shared/cutting/machine-classes.ts';
import { formatSize } from '#shared/units/length.ts';
import { RadioCards } from '../../../components/RadioCards.tsx';
import { useUnits } from '../../../units/units-context.tsx';
import { machineClassLabels } from '../../../words/labels.ts';
import { classFields, newMachineValues } from './machine-values.ts';
import type { SavedMachine } from './use-machine-form.ts';

interface ClassFieldProps {
  readonly saved: SavedMachine;
  /** A new machine takes the defaults of its class; one on the bench keeps its own figures. */
  readonly isNew: boolean;
}

export function ClassField({ saved, isNew }: ClassFieldProps) {
  const { system } = useUnits();
  const { control, resetField, getFieldState } = saved.form;
  const cards = machineClasses.map((machineClass) => {
    const { typicalBedXMm, typicalBedYMm } = machineClassDefaults[machineClass];
    const bed = formatSize([typicalBedXMm, typicalBedYMm], system, { trim: true, fractions: false });
    return { value: machineClass, label: machineClassLabels[machineClass], detail: `Bed about ${bed}` };
  });
  const takeDefaults = (machineClass: MachineClass) => {
    const defaults = newMachineValues(machineClass);
    for (const field of classFields) {
      const defaultValue = defaults[field];
      if (!getFieldState(field).isDirty && defaultValue !== undefined)
        resetField(field, { defaultValue: defaultValue as never });
    }
  };
  return (
    <Controller
      control={control}
      name="class"
      render={({ field }) => (
        <RadioCards
          legend="Class"
          name="class"
          cards={cards}
          value={field.value}
          error={saved.errorAt('class')}
          onChange={(event) => {
            const chosen = machineClasses.find((machineClass) => machineClass === event.target.value);
            if (chosen === undefined) return;
            field.onChange(chosen);
            if (isNew) takeDefaults(chosen);
          }}
        />
      )}
    />
  );
}
