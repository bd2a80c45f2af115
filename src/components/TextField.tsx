import { type ComponentProps, useId } from 'react';
import { describedBy, FieldFrame, type FieldWords, inputLook } from './FieldFrame.tsx';

type TextFieldProps = FieldWords & Omit<ComponentProps<'input'>, 'id'>;

export function TextField({ label, hint, error, isOptional, className = '', ...input }: TextFieldProps) {
  const id = useId();
  const words: FieldWords = { label, hint, error, ...(isOptional === undefined ? {} : { isOptional }) };
  return (
    <FieldFrame id={id} {...words}>
      <input
        id={id}
        aria-invalid={error !== undefined}
        aria-describedby={describedBy(id, words)}
        className={`${inputLook} ${className}`}
        {...input}
      />
    </FieldFrame>
  );
}
