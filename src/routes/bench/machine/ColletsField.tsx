import { Controller } from 'react-hook-form';
import { CheckField } from '../../../components/CheckField.tsx';
import { FieldError } from '../../../components/FieldFrame.tsx';
import { NumberListField } from '../../form/NumberListField.tsx';
import type { SavedMachine } from './use-machine-form.ts';

/** Sizes that are sold everywhere. 1/4 in is not 6 mm, so each stands under its own name. */
const commonCollets = [
  { mm: 3.175, label: '1/8 in' },
  { mm: 6.35, label: '1/4 in' },
  { mm: 12.7, label: '1/2 in' },
  { mm: 3, label: '3 mm' },
  { mm: 4, label: '4 mm' },
  { mm: 6, label: '6 mm' },
  { mm: 8, label: '8 mm' },
  { mm: 12, label: '12 mm' },
] as const;

const isSame = (left: number | undefined, right: number) => Math.abs((left ?? Number.NaN) - right) < 0.001;
const isCommon = (mm: number | undefined) => commonCollets.some((collet) => isSame(mm, collet.mm));

export function ColletsField({ saved, hint }: { readonly saved: SavedMachine; readonly hint?: string }) {
  const error = saved.errorAt('colletsMm');
  return (
    <Controller
      control={saved.form.control}
      name="colletsMm"
      render={({ field }) => {
        const collets: readonly (number | undefined)[] = field.value;
        const common = collets.filter(isCommon);
        const others = collets.filter((mm) => !isCommon(mm));
        // The list is laid with the common ones first, so that a field's place is its place in the list.
        const change = (next: readonly (number | undefined)[]) => field.onChange([...next]);
        return (
          <fieldset className="min-w-0 space-y-3 sm:col-span-full">
            <legend className="mb-1 text-sm leading-5 font-semibold">Collets</legend>
            <p className="text-sm text-ink-soft">{hint ?? 'Every one you own: shanks must match them.'}</p>
            <div className="grid grid-cols-2 gap-2 sm:grid-cols-4">
              {commonCollets.map(({ mm, label }) => (
                <CheckField
                  key={mm}
                  label={label}
                  name="colletsMm"
                  checked={collets.some((own) => isSame(own, mm))}
                  onChange={(event) =>
                    change(
                      event.target.checked
                        ? [...common, mm, ...others]
                        : collets.filter((own) => !isSame(own, mm)),
                    )
                  }
                />
              ))}
            </div>
            <NumberListField
              path="otherColletsMm"
              what="Other collet"
              quantity="length"
              value={others}
              onChange={(next) => change([...common, ...next])}
              errorAt={(path) => {
                const place = /\d+$/.exec(path)?.[0];
                return place === undefined
                  ? undefined
                  : saved.errorAt(`colletsMm.${common.length + Number(place)}`);
              }}
              most={12}
            />
            <FieldError id="collets" message={error} />
          </fieldset>
        );
      }}
    />
  );
}
