import type { z } from 'zod';
import { ProblemError } from './problem.ts';

/** Checks input against its schema; every issue is named at once, with its path. */
export function validate<Schema extends z.ZodType>(
  schema: Schema,
  input: unknown,
  status: 400 | 422,
): z.infer<Schema> {
  const result = schema.safeParse(input);
  if (result.success) return result.data;
  throw invalidInput(fieldErrors(result.error), status);
}

export interface FieldError {
  path: string;
  message: string;
}

export function fieldErrors(error: z.ZodError): FieldError[] {
  return error.issues.flatMap((issue) => {
    if (issue.code !== 'unrecognized_keys') return [{ path: issue.path.join('.'), message: issue.message }];
    return issue.keys.map((key) => ({
      path: [...issue.path, key].join('.'),
      message: 'is not known here; leave it out',
    }));
  });
}

/** One problem for all fields: every one is named, in the sentence and in the list. */
export function invalidInput(errors: FieldError[], status: 400 | 422): ProblemError {
  const detail =
    errors.length === 1
      ? sentence(errors[0])
      : `${errors.length} fields need to be changed. ${errors.map(sentence).join(' ')}`;
  return new ProblemError(status, 'input.invalid', detail, { errors });
}

function sentence(error: FieldError | undefined): string {
  if (error === undefined) return '';
  return error.path === '' ? `${error.message}.` : `${error.path}: ${error.message}.`;
}
