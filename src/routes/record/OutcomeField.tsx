import { useFormContext } from 'react-hook-form';
import { RadioCards } from '../../components/RadioCards.tsx';
import type { RecordValues } from './record-values.ts';

const cards = [
  { value: 'clean', label: 'Clean', detail: 'As it should be, straight from the machine.' },
  { value: 'usable', label: 'Usable', detail: 'It works, after sanding or with a flaw.' },
  { value: 'failed', label: 'Failed', detail: 'Not usable. This helps the next member too.' },
];

export function OutcomeField({ error }: { readonly error: string | undefined }) {
  const { register } = useFormContext<RecordValues>();
  return <RadioCards legend="How did it come out?" cards={cards} error={error} {...register('outcome')} />;
}
