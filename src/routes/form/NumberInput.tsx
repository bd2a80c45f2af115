import type { ReactNode } from 'react';
import { type Control, Controller, type FieldPath, type FieldValues } from 'react-hook-form';
import { NumberField } from '../../components/NumberField.tsx';
import type { Quantity } from '../../units/quantities.ts';
import type { SavedForm } from './use-saved-form.ts';

interface NumberInputProps<Given extends FieldValues> {
  readonly saved: Pick<SavedForm<Given>, 'errorAt'> & {
    readonly form: { readonly control: Control<Given, unknown, Given> };
  };
  readonly name: FieldPath<Given>;
  readonly label: string;
  readonly quantity: Quantity | { readonly unit: string };
  readonly hint?: ReactNode;
  readonly isOptional?: boolean;
  readonly placeholder?: string;
}

/** A number of a form, in either unit system. */
export function NumberInput<Given extends FieldValues>(props: NumberInputProps<Given>) {
  const { saved, name, label, quantity, hint, isOptional = false, placeholder } = props;
  // Undefined would bring the default back into the field. Null is dropped before the schema sees it.
  const cleared = isOptional ? null : Number.NaN;
  return (
    <Controller
      control={saved.form.control}
      name={name}
      render={({ field }) => (
        <NumberField
          label={label}
          quantity={quantity}
          hint={hint}
          isOptional={isOptional}
          error={saved.errorAt(name)}
          name={name}
          ref={field.ref}
          value={field.value ?? undefined}
          onChange={(value) => field.onChange(value ?? cleared)}
          onBlur={field.onBlur}
          {...(placeholder === undefined ? {} : { placeholder })}
        />
      )}
    />
  );
}
