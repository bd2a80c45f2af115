import { ProblemError } from '#server/http/problem.ts';

/** A record is asked for that is not one of this revision's geometry. */
export const recordNotFound = () =>
  new ProblemError(404, 'record.not-found', 'There is no such cut record of this revision.');
