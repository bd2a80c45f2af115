import { useQuery } from '@tanstack/react-query';
import { useFormContext, useWatch } from 'react-hook-form';
import type { Machine } from '#shared/api/bench.ts';
import { bitsQuery } from '../../api/bits.ts';
import { RadioCards } from '../../components/RadioCards.tsx';
import { CutFields } from './CutFields.tsx';
import { Step } from './Step.tsx';
import type { ShareValues } from './share-values.ts';
import type { ShareForm } from './use-share-form.ts';

interface CutStepProps {
  readonly share: ShareForm;
  readonly machine: Machine | null;
  readonly machines: readonly Machine[];
}

/** Settings that were tried, or plainly that there are none. */
export function CutStep({ share, machine, machines }: CutStepProps) {
  const { register, control, getValues, setValue } = useFormContext<ShareValues>();
  const bits = useQuery(bitsQuery).data?.items ?? [];
  const isCut = useWatch({ control, name: 'isCut' });
  const beginWithMyMachine = () => {
    if (getValues('isCut') !== 'yes' || getValues('cut.machineId') !== '' || machine === null) return;
    setValue('cut.machineId', machine.id);
  };
  return (
    <Step
      id="settings"
      number={3}
      title="Tested settings"
      hint="Only what you ran yourself. The next member starts from these numbers."
      isDone={isCut === 'no'}
    >
      <div className="space-y-8">
        <RadioCards
          legend="Have you cut it?"
          error={share.errorAt('isCut')}
          cards={[
            { value: 'yes', label: 'Yes, with these settings', detail: 'They become its first cut record.' },
            {
              value: 'no',
              label: 'Not cut yet',
              detail: 'It is shown as uncut until a member records a cut.',
            },
          ]}
          {...register('isCut', { onChange: beginWithMyMachine })}
        />
        {isCut === 'yes' && <CutFields share={share} machines={machines} bits={bits} />}
      </div>
    </Step>
  );
}
