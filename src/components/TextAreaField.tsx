import { type ComponentProps, useId } from 'react';
import { describedBy, FieldFrame, type FieldWords, inputLook } from './FieldFrame.tsx';

type TextAreaFieldProps = FieldWords & Omit<ComponentProps<'textarea'>, 'id'>;

export function TextAreaField({ label, hint, error, isOptional, rows = 4, ...area }: TextAreaFieldProps) {
  const id = useId();
  const words: FieldWords = { label, hint, error, ...(isOptional === undefined ? {} : { isOptional }) };
  return (
    <FieldFrame id={id} {...words}>
      <textarea
        id={id}
        rows={rows}
        aria-invalid={error !== undefined}
        aria-describedby={describedBy(id, words)}
        className={`${inputLook} block resize-y`}
        {...area}
      />
    </FieldFrame>
  );
}
