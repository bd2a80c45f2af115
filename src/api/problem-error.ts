import type { Problem } from '#shared/api/problem.ts';

/** A refusal by the server, with its reason. */
export class ProblemError extends Error {
  readonly problem: Problem;
  constructor(problem: Problem) {
    super(problem.detail);
    this.name = 'ProblemError';
    this.problem = problem;
  }
}

/** The server was not reached. A TypeError, as fetch throws it, so that reading is tried again. */
export class ConnectionError extends TypeError {
  constructor() {
    super('The club’s server does not answer. Check the network, then try again.');
    this.name = 'ConnectionError';
  }
}

export const isProblem = (error: unknown, status?: number): error is ProblemError =>
  error instanceof ProblemError && (status === undefined || error.problem.status === status);

/** What to tell the member about anything that was thrown by a call. */
export const sentenceOf = (error: unknown): string =>
  error instanceof ProblemError || error instanceof ConnectionError
    ? error.message
    : 'Something went wrong on this page. Load it again.';

/** The problem document of an answer that is not a success; one in its place when a proxy answered instead. */
export const problemFrom = (status: number, text: string): Problem => {
  try {
    const body: unknown = JSON.parse(text);
    if (typeof body === 'object' && body !== null && 'detail' in body && 'type' in body) {
      return body as Problem;
    }
  } catch {
    // Not JSON: said below.
  }
  return {
    type: 'answer.not-ours',
    title: 'Unexpected answer',
    status,
    detail: `The server answered ${status} without a reason. Try again; if it stays, tell your administrator.`,
    requestId: '',
  };
};
