import { useFormContext } from 'react-hook-form';
import { RadioCards } from '../../components/RadioCards.tsx';
import { licenceLabels } from '../../words/labels.ts';
import { licenceSentences } from '../../words/licence-sentences.ts';
import { optionsOf } from '../../words/options.ts';
import type { LicenceChoice } from './share-mode.ts';
import type { ShareValues } from './share-values.ts';

interface LicenceFieldProps {
  readonly choice: LicenceChoice;
  readonly error: string | undefined;
}

/** The licence is part of the revision and stays: each choice says what it lets others do. */
export function LicenceField({ choice, error }: LicenceFieldProps) {
  const { register } = useFormContext<ShareValues>();
  return (
    <div className="space-y-3">
      {choice.why !== null && <p className="max-w-prose border-l-2 border-ink pl-3">{choice.why}</p>}
      <RadioCards
        legend="Licence: what others may do with it"
        error={error}
        cards={optionsOf(licenceLabels)
          .filter(({ value }) => choice.licences.includes(value))
          .map(({ value, label }) => ({ value, label, detail: licenceSentences[value] }))}
        {...register('licence')}
      />
    </div>
  );
}
