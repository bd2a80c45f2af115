import type { UnitSystem } from '#shared/units/system.ts';
import { useUnits } from '../units/units-context.tsx';

const systems: readonly { readonly system: UnitSystem; readonly name: string }[] = [
  { system: 'mm', name: 'Millimetres' },
  { system: 'in', name: 'Inches' },
];

export function UnitsSwitch() {
  const { system: inUse, setSystem } = useUnits();
  return (
    <fieldset>
      <legend className="label-narrow text-ink-soft">Units</legend>
      <div className="flex divide-x divide-rule text-sm leading-6">
        {systems.map(({ system, name }) => (
          <button
            key={system}
            type="button"
            aria-pressed={inUse === system}
            title={name}
            onClick={() => setSystem(system)}
            className="min-w-8 px-1.5 text-ink-soft first:pl-0 aria-pressed:font-bold aria-pressed:text-ink aria-pressed:underline aria-pressed:decoration-layout aria-pressed:decoration-2 aria-pressed:underline-offset-4"
          >
            {system}
          </button>
        ))}
      </div>
    </fieldset>
  );
}
