import { ChevronDown } from 'lucide-react';
import { type ComponentProps, useId } from 'react';
import { describedBy, FieldFrame, type FieldWords, inputLook } from './FieldFrame.tsx';

interface Option {
  readonly value: string;
  readonly label: string;
}

interface SelectFieldProps extends FieldWords, Omit<ComponentProps<'select'>, 'id' | 'children'> {
  readonly options: readonly Option[];
  /** Stands for "nothing chosen yet". */
  readonly placeholder?: string;
}

/** A native select: it opens as the device's own list, which is best under a thumb. */
export function SelectField({
  label,
  hint,
  error,
  isOptional,
  options,
  placeholder,
  ...select
}: SelectFieldProps) {
  const id = useId();
  const words: FieldWords = { label, hint, error, ...(isOptional === undefined ? {} : { isOptional }) };
  return (
    <FieldFrame id={id} {...words}>
      <div className="relative">
        <select
          id={id}
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, words)}
          className={`${inputLook} appearance-none truncate pr-9`}
          {...select}
        >
          {placeholder !== undefined && <option value="">{placeholder}</option>}
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
        <ChevronDown
          size={18}
          strokeWidth={1.5}
          aria-hidden="true"
          className="pointer-events-none absolute top-2.75 right-3"
        />
      </div>
    </FieldFrame>
  );
}
