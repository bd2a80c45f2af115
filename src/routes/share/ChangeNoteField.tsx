import { useFormContext } from 'react-hook-form';
import { TextAreaField } from '../../components/TextAreaField.tsx';
import type { ShareValues } from './share-values.ts';

interface ChangeNoteFieldProps {
  readonly hint: string;
  readonly error: string | undefined;
}

/** One line of the revision table. */
export function ChangeNoteField({ hint, error }: ChangeNoteFieldProps) {
  const { register } = useFormContext<ShareValues>();
  return <TextAreaField label="Change note" rows={2} hint={hint} error={error} {...register('changeNote')} />;
}
