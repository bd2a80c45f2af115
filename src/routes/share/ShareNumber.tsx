import type { ReactNode } from 'react';
import { Controller, type FieldPathByValue, useFormContext } from 'react-hook-form';
import { NumberField } from '../../components/NumberField.tsx';
import type { Quantity } from '../../units/quantities.ts';
import type { ShareValues } from './share-values.ts';
import type { ShareForm } from './use-share-form.ts';

interface ShareNumberProps {
  readonly share: ShareForm;
  readonly name: FieldPathByValue<ShareValues, number | undefined>;
  readonly label: string;
  readonly quantity: Quantity | { readonly unit: string };
  readonly hint?: ReactNode;
}

/** A number of the share, in either unit system. */
export function ShareNumber({ share, name, label, quantity, hint }: ShareNumberProps) {
  const { control } = useFormContext<ShareValues>();
  return (
    <Controller
      control={control}
      name={name}
      render={({ field }) => (
        <NumberField
          label={label}
          quantity={quantity}
          hint={hint}
          error={share.errorAt(name)}
          name={name}
          ref={field.ref}
          value={field.value}
          onChange={(value) => field.onChange(value)}
          onBlur={field.onBlur}
        />
      )}
    />
  );
}
