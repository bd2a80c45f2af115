import { useFormContext } from 'react-hook-form';
import { RadioCards } from '../../components/RadioCards.tsx';
import { licenceLabels } from '../../words/labels.ts';
import { licenceSentences } from '../../words/licence-sentences.ts';
import { optionsOf } from '../../words/options.ts';
import type { ShareValues } from './share-values.ts';

/** The licence is part of the revision and stays: each choice says what it lets others do. */
export function LicenceField({ error }: { readonly error: string | undefined }) {
  const { register } = useFormContext<ShareValues>();
  return (
    <RadioCards
      legend="Licence: what others may do with it"
      error={error}
      cards={optionsOf(licenceLabels).map(({ value, label }) => ({
        value,
        label,
        detail: licenceSentences[value],
      }))}
      {...register('licence')}
    />
  );
}
