import { type FieldPath, type UseFormReturn, useForm } from 'react-hook-form';
import type { Problem } from '#shared/api/problem.ts';
import type { FieldProblem } from '../../components/ErrorSummary.tsx';
import { fieldProblems } from '../form/field-problems.ts';
import type { ShareDetails } from './share-details.ts';
import { shareLabels } from './share-labels.ts';
import type { ShareMode } from './share-mode.ts';
import { shareResolver } from './share-resolver.ts';
import type { ShareValues } from './share-values.ts';

export interface ShareForm {
  readonly form: UseFormReturn<ShareValues, unknown, ShareDetails>;
  readonly problems: readonly FieldProblem[];
  readonly errorAt: (path: string) => string | undefined;
  /** Puts what the server found wrong on the fields it speaks of. */
  readonly showErrors: (errors: NonNullable<Problem['errors']>) => void;
}

const order = (path: string): number => Object.keys(shareLabels).indexOf(path.replace(/\.\d+$/, '.0'));

export const useShareForm = (values: ShareValues, mode: ShareMode): ShareForm => {
  const form = useForm<ShareValues, unknown, ShareDetails>({
    defaultValues: values,
    resolver: shareResolver(mode),
    shouldFocusError: false,
  });
  // As the fields stand on the page: the form adds its own questions after those of the schema.
  const problems = [...fieldProblems(form.formState.errors, shareLabels)].sort(
    (left, right) => order(left.path) - order(right.path),
  );
  return {
    form,
    problems,
    errorAt: (path) => problems.find((problem) => problem.path === path)?.message,
    showErrors: (errors) => {
      const isOwnBit = form.getValues('bitFrom') !== 'described';
      for (const { path, message } of errors) {
        // The measures of an own bit have no fields here.
        const field = isOwnBit && path.startsWith('cut.bit.') ? 'bitFrom' : path;
        form.setError(field as FieldPath<ShareValues>, { type: 'server', message });
      }
    },
  };
};
