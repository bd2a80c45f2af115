import { useFormState } from 'react-hook-form';
import { TextField } from '../../../components/TextField.tsx';
import { FieldGroup } from '../../form/FieldGroup.tsx';
import { NumberInput } from '../../form/NumberInput.tsx';
import { ClassField } from './ClassField.tsx';
import { ColletsField } from './ColletsField.tsx';
import type { classFields } from './machine-values.ts';
import { SpindleField } from './SpindleField.tsx';
import type { SavedMachine } from './use-machine-form.ts';

interface MachineFieldsProps {
  readonly saved: SavedMachine;
  readonly isNew: boolean;
}

/** Everything the program knows of a machine, the measures that a ruler tells first. */
export function MachineFields({ saved, isNew }: MachineFieldsProps) {
  const { dirtyFields } = useFormState({ control: saved.form.control });
  const fromClass = (field: (typeof classFields)[number]) =>
    isNew && dirtyFields[field] === undefined ? { hint: 'Class default (P)' } : {};
  return (
    <>
      <TextField
        label="Name"
        hint="As it is called in your shop"
        error={saved.errorAt('name')}
        {...saved.form.register('name')}
      />
      <ClassField saved={saved} isNew={isNew} />
      <FieldGroup
        legend="Bed"
        columns={4}
        hint="Measure what the bit can reach. Every drawing is shown and judged on it."
      >
        <NumberInput saved={saved} name="bedXMm" label="Bed length (X)" quantity="length" />
        <NumberInput saved={saved} name="bedYMm" label="Bed width (Y)" quantity="length" />
        <NumberInput
          saved={saved}
          name="zTravelMm"
          label="Z travel"
          quantity="length"
          {...fromClass('zTravelMm')}
        />
        <NumberInput
          saved={saved}
          name="openingMm"
          label="Opening under the collet"
          quantity="length"
          {...fromClass('openingMm')}
        />
      </FieldGroup>
      <FieldGroup legend="Kept clear" columns={4} hint="What a part may not use. 0 where nothing is lost.">
        <NumberInput saved={saved} name="marginMm.left" label="Left margin" quantity="length" />
        <NumberInput saved={saved} name="marginMm.right" label="Right margin" quantity="length" />
        <NumberInput saved={saved} name="marginMm.front" label="Front margin" quantity="length" />
        <NumberInput saved={saved} name="marginMm.back" label="Back margin" quantity="length" />
        <NumberInput
          saved={saved}
          name="clampStripMm"
          label="Clamp strip"
          quantity="length"
          hint="Lost to clamps along the front edge"
        />
      </FieldGroup>
      <FieldGroup legend="Motion" columns={4}>
        <NumberInput
          saved={saved}
          name="maxFeedMmPerMin"
          label="Greatest feed"
          quantity="feed"
          {...fromClass('maxFeedMmPerMin')}
        />
        <NumberInput
          saved={saved}
          name="maxPlungeMmPerMin"
          label="Greatest plunge rate"
          quantity="feed"
          {...fromClass('maxPlungeMmPerMin')}
        />
        <NumberInput
          saved={saved}
          name="rapidMmPerMin"
          label="Rapid speed"
          quantity="feed"
          {...fromClass('rapidMmPerMin')}
        />
        <NumberInput
          saved={saved}
          name="accelerationMmPerS2"
          label="Acceleration"
          quantity={{ unit: 'mm/s²' }}
          isOptional
          hint="Empty: the class default (P) stands in"
        />
      </FieldGroup>
      <FieldGroup legend="Spindle and collets">
        <SpindleField saved={saved} {...fromClass('spindle')} />
        <NumberInput
          saved={saved}
          name="spindlePowerW"
          label="Spindle power"
          quantity={{ unit: 'W' }}
          {...fromClass('spindlePowerW')}
        />
        <ColletsField saved={saved} {...fromClass('colletsMm')} />
      </FieldGroup>
      {isNew && (
        <p className="max-w-prose text-sm text-ink-soft">
          (P): common practice of the trade, without a published source. Put your own figures in their place
          where you know them.
        </p>
      )}
    </>
  );
}
