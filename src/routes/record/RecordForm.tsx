import { useEffect, useState } from 'react';
import { FormProvider, useWatch } from 'react-hook-form';
import type { Bit } from '#shared/api/bench.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import { TextAreaField } from '../../components/TextAreaField.tsx';
import { TextField } from '../../components/TextField.tsx';
import { useUnits } from '../../units/units-context.tsx';
import { ConflictNote } from '../form/ConflictNote.tsx';
import { FieldGroup } from '../form/FieldGroup.tsx';
import { FormFrame } from '../form/FormFrame.tsx';
import { NumberInput } from '../form/NumberInput.tsx';
import { CutWith } from './CutWith.tsx';
import { MeasuredField } from './MeasuredField.tsx';
import { OutcomeField } from './OutcomeField.tsx';
import { PhotosField } from './PhotosField.tsx';
import { recordLabels } from './record-labels.ts';
import { givenOf, type RecordValues, valuesOf } from './record-values.ts';
import { sayRecordValue } from './say-record-value.ts';
import type { Photos } from './use-photos.ts';
import { type RecordTarget, useRecordForm } from './use-record-form.ts';
import { WentWrongField } from './WentWrongField.tsx';

interface RecordFormProps {
  readonly target: RecordTarget;
  readonly values: RecordValues;
  readonly idempotencyKey: string;
  readonly machines: readonly { readonly id: string; readonly name: string }[];
  readonly bits: readonly Bit[];
  readonly photos: Photos;
  readonly onChange: (values: RecordValues) => void;
  readonly onSaved: (record: CutRecord) => void;
  readonly onCancel: () => void;
}

/** What the member alone can tell comes first; what is known already stands folded below. */
export function RecordForm(props: RecordFormProps) {
  const { target, machines, bits, photos, onChange, onSaved, onCancel } = props;
  const { system } = useUnits();
  const { corrected } = target;
  const { saved, doubted, takeSizesAsTyped, settle } = useRecordForm({
    target,
    values: props.values,
    idempotencyKey: props.idempotencyKey,
    onSaved,
  });
  const { form, current, errorAt } = saved;
  const values = useWatch({ control: form.control }) as RecordValues;
  useEffect(() => onChange(values), [onChange, values]);
  // The folded part is laid out anew when another version comes in.
  const [edition, setEdition] = useState(0);

  const names = new Map([...machines, ...bits].map(({ id, name }) => [id, name]));
  const now = current === null ? null : valuesOf(current as unknown as CutRecord);
  return (
    <FormProvider {...form}>
      <FormFrame
        saved={saved}
        does={corrected === null ? 'Record the cut' : 'Save the correction'}
        onCancel={onCancel}
        conflict={
          current !== null &&
          now !== null && (
            <ConflictNote
              what="record"
              current={{ ...givenOf(now), version: current.version }}
              mine={givenOf(values)}
              labels={recordLabels}
              say={(path, value) => sayRecordValue(path, value, system, names)}
              onKeepMine={saved.keepMine}
              onTakeCurrent={() => {
                saved.takeCurrent(now);
                setEdition(edition + 1);
              }}
            />
          )
        }
      >
        <OutcomeField error={errorAt('outcome')} />
        <WentWrongField />
        <FieldGroup legend="The run" columns={4}>
          <NumberInput
            saved={saved}
            name="runTimeS"
            label="Run time"
            quantity="time"
            hint="Minutes, or 1:08 for 1 h 08"
          />
          <NumberInput
            saved={saved}
            name="overridePercent"
            label="Feed override"
            quantity={{ unit: '%' }}
            hint="Where you ended; 100 is as set"
            isOptional
          />
          <TextField
            label="Date of the cut"
            type="date"
            error={errorAt('cutOn')}
            {...form.register('cutOn')}
          />
        </FieldGroup>
        <CutWith key={edition} saved={saved} machines={machines} bits={bits} />
        <MeasuredField saved={saved} rowsInDoubt={doubted} onAsTyped={takeSizesAsTyped} onSettled={settle} />
        <PhotosField photos={photos} />
        <TextAreaField
          label="Notes"
          isOptional
          rows={3}
          hint="What you would tell the next member: what held, what tore, what to watch."
          error={errorAt('notes')}
          {...form.register('notes')}
        />
      </FormFrame>
    </FormProvider>
  );
}
