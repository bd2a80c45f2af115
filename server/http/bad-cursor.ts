import { ProblemError } from './problem.ts';

/** A cursor that none of our answers gave. */
export const badCursor = () =>
  new ProblemError(400, 'cursor.bad', 'This cursor is not one of ours. Start again from the first page.');
