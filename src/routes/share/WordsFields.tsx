import { Controller, useFormContext } from 'react-hook-form';
import { SelectField } from '../../components/SelectField.tsx';
import { TextAreaField } from '../../components/TextAreaField.tsx';
import { TextField } from '../../components/TextField.tsx';
import { kindLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import { TagsField } from './TagsField.tsx';

/** The words of a design, in a share and when they are edited later. */
export interface WordsValues {
  title: string;
  kind: string;
  summary: string;
  tags: string[];
}

export function WordsFields({ errorAt }: { readonly errorAt: (path: string) => string | undefined }) {
  const { register, control } = useFormContext<WordsValues>();
  return (
    <div className="space-y-5">
      <div className="grid items-start gap-5 sm:grid-cols-[2fr_1fr]">
        <TextField
          label="Title"
          hint="What it is, as you would ask for it: Wedge hold-down, slotted"
          autoComplete="off"
          error={errorAt('title')}
          {...register('title')}
        />
        <SelectField
          label="Kind"
          placeholder="Choose a kind"
          options={optionsOf(kindLabels)}
          error={errorAt('kind')}
          {...register('kind')}
        />
      </div>
      <TextAreaField
        label="Summary"
        isOptional
        hint="What it is for, and what to mind: at most 1000 characters."
        error={errorAt('summary')}
        {...register('summary')}
      />
      <Controller
        control={control}
        name="tags"
        render={({ field }) => (
          <TagsField
            name={field.name}
            value={field.value}
            onChange={field.onChange}
            onBlur={field.onBlur}
            ref={field.ref}
            error={errorAt('tags') ?? field.value.map((_, place) => errorAt(`tags.${place}`)).find(Boolean)}
          />
        )}
      />
    </div>
  );
}
