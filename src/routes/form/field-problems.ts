import type { FieldErrors, FieldValues } from 'react-hook-form';
import type { FieldProblem } from '../../components/ErrorSummary.tsx';

/** Labels by path; a number in a path stands for any place of a list and is written `0`. */
export type FieldLabels = Readonly<Record<string, string>>;

const placePattern = /\.\d+(?=\.|$)/g;

/** The label of a field as the member reads it; in a list with its place. */
export const labelOf = (labels: FieldLabels, path: string): string => {
  const label = labels[path.replace(placePattern, '.0')] ?? path;
  const place = /\.(\d+)$/.exec(path)?.[1];
  return place === undefined ? label : `${label} ${Number(place) + 1}`;
};

/** The schemas speak of types where nothing was typed; the member is told what to do. */
const sentences: Readonly<Record<string, string>> = {
  invalid_type: 'Type a number',
  invalid_value: 'Choose one',
};

const isLeaf = (error: object): error is { message: string; type?: unknown } =>
  'message' in error && typeof error.message === 'string';

/** Every wrong field of a form, flat and in the order of the schema. */
export const fieldProblems = (
  errors: FieldErrors<FieldValues>,
  labels: FieldLabels,
): readonly FieldProblem[] => {
  const found: FieldProblem[] = [];
  const walk = (error: unknown, path: string) => {
    if (typeof error !== 'object' || error === null || error instanceof Element) return;
    if (isLeaf(error)) {
      const message = sentences[String(error.type)] ?? error.message;
      found.push({ path, label: labelOf(labels, path), message });
      return;
    }
    for (const [key, inner] of Object.entries(error)) {
      if (key !== 'ref') walk(inner, key === 'root' ? path : path === '' ? key : `${path}.${key}`);
    }
  };
  walk(errors, '');
  return found;
};

/** Puts the cursor into a field, by its path; a list without a place is entered at its first field. */
export const goToField = (path: string): void => {
  const fields = [...document.querySelectorAll<HTMLElement>('form [name]')];
  const nameOf = (field: HTMLElement) => field.getAttribute('name') ?? '';
  const field =
    fields.find((each) => nameOf(each) === path) ??
    fields.find((each) => nameOf(each).startsWith(`${path}.`));
  // A closed part of the form is opened first.
  field?.closest('details')?.setAttribute('open', '');
  field?.focus();
};
