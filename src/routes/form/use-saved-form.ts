import { useState } from 'react';
import {
  type DefaultValues,
  type FieldPath,
  type FieldValues,
  type Resolver,
  type UseFormReturn,
  useForm,
} from 'react-hook-form';
import type { Problem } from '#shared/api/problem.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import type { FieldProblem } from '../../components/ErrorSummary.tsx';
import { type FieldLabels, fieldProblems } from './field-problems.ts';

interface SavedFormOptions<Given extends FieldValues> {
  readonly resolver: Resolver<Given, unknown, Given>;
  readonly values: DefaultValues<Given>;
  readonly labels: FieldLabels;
  /** The version that the values were read at; undefined for something new. */
  readonly version?: number | undefined;
  readonly save: (given: Given, version: number | undefined) => Promise<unknown>;
  readonly onSaved: () => void;
}

/** The object as the server has it now, after a 409. */
export interface Current {
  readonly version: number;
  readonly [field: string]: unknown;
}

export interface SavedForm<Given extends FieldValues> {
  readonly form: UseFormReturn<Given, unknown, Given>;
  readonly problems: readonly FieldProblem[];
  readonly errorAt: (path: string) => string | undefined;
  /** A refusal that is about no field. */
  readonly refusal: Problem | null;
  readonly current: Current | null;
  readonly isSaving: boolean;
  readonly submit: () => void;
  readonly keepMine: () => void;
  readonly takeCurrent: (values: DefaultValues<Given>) => void;
}

const isCurrent = (value: unknown): value is Current =>
  typeof value === 'object' && value !== null && 'version' in value && typeof value.version === 'number';

const lostConnection = (error: unknown): Problem => ({
  type: 'not-saved',
  title: 'Not saved',
  status: 0,
  detail: sentenceOf(error),
  requestId: '',
});

/** An optional field that was emptied holds null (see NumberInput); the contract leaves it out. */
const withoutNulls = <Given extends FieldValues>(typed: Given): Given =>
  Object.fromEntries(Object.entries(typed).filter(([, value]) => value !== null)) as Given;

/** A form over a schema of the contract, saved through the API: every refusal ends up where it can be mended. */
export function useSavedForm<Given extends FieldValues>(options: SavedFormOptions<Given>): SavedForm<Given> {
  const { resolver, values, labels, save, onSaved } = options;
  const form = useForm<Given, unknown, Given>({
    resolver: (typed, context, how) => resolver(withoutNulls(typed), context, how),
    defaultValues: values,
    shouldFocusError: false,
  });
  const [version, setVersion] = useState(options.version);
  const [refusal, setRefusal] = useState<Problem | null>(null);
  const [current, setCurrent] = useState<Current | null>(null);

  const refuse = (error: unknown) => {
    if (!isProblem(error)) setRefusal(lostConnection(error));
    else if (isCurrent(error.problem.current)) setCurrent(error.problem.current);
    else if (error.problem.errors === undefined) setRefusal(error.problem);
    else {
      for (const { path, message } of error.problem.errors)
        form.setError(path as FieldPath<Given>, { message });
    }
  };
  const saveAt = (at: number | undefined) =>
    form.handleSubmit(async (given) => {
      setRefusal(null);
      setCurrent(null);
      try {
        await save(given, at);
      } catch (error) {
        refuse(error);
        return;
      }
      onSaved();
    })();

  const problems = fieldProblems(form.formState.errors, labels);
  return {
    form,
    problems,
    errorAt: (path) => problems.find((problem) => problem.path === path)?.message,
    refusal,
    current,
    isSaving: form.formState.isSubmitting,
    submit: () => void saveAt(version),
    keepMine: () => {
      if (current === null) return;
      setVersion(current.version);
      void saveAt(current.version);
    },
    takeCurrent: (now) => {
      if (current !== null) setVersion(current.version);
      setCurrent(null);
      form.reset(now);
    },
  };
}
