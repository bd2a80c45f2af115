import type { ErrorRequestHandler, RequestHandler, Response } from 'express';
import type { Problem } from '#shared/api/problem.ts';

const titles: Record<number, string> = {
  400: 'The request is malformed',
  401: 'You are not signed in',
  403: 'This is not allowed',
  404: 'Not found',
  409: 'Something changed in the meantime',
  413: 'The file is too large',
  415: 'This type of file is not read here',
  416: 'That part of the file is not there',
  422: 'This cannot be used as it is',
  429: 'Too many tries',
  500: 'Something went wrong on our side',
  503: 'The server is busy',
};

/** An error with an answer: thrown where a request cannot go on, written at the edge. */
export class ProblemError extends Error {
  constructor(
    readonly status: number,
    readonly type: string,
    readonly detail: string,
    readonly more: {
      errors?: { path: string; message: string }[];
      current?: unknown;
      retryAfterS?: number;
    } = {},
  ) {
    super(detail);
  }
}

export function sendProblem(response: Response, error: ProblemError): void {
  const { errors, current, retryAfterS } = error.more;
  const body: Problem = {
    type: error.type,
    title: titles[error.status] ?? 'Error',
    status: error.status,
    detail: error.detail,
    requestId: String(response.req.id),
    ...(errors === undefined ? {} : { errors }),
    ...(current === undefined ? {} : { current }),
  };
  if (retryAfterS !== undefined) response.set('Retry-After', String(retryAfterS));
  response
    .status(error.status)
    .set('Cache-Control', 'no-store')
    .type('application/problem+json')
    .send(JSON.stringify(body));
}

export const noSuchCall: RequestHandler = (request) => {
  throw new ProblemError(
    404,
    'call.unknown',
    `There is no ${request.method} ${request.path}. The calls are listed in /api/openapi.json.`,
  );
};

/** Errors of the body readers, by what they say of themselves. */
function fromReader(error: { status?: number; type?: string; code?: string }): ProblemError | null {
  if (error.type === 'entity.too.large')
    return new ProblemError(413, 'body.too-large', 'The body is larger than 256 kB.');
  if (error.type === 'entity.parse.failed')
    return new ProblemError(400, 'body.not-json', 'The body is not valid JSON.');
  if (error.code?.startsWith('LIMIT_'))
    return new ProblemError(
      400,
      'body.parts',
      'Send one file in the part “file”, and only the parts that the call names.',
    );
  if (error.status === 415)
    return new ProblemError(415, 'body.encoding', 'Send the body as UTF-8, uncompressed or gzip.');
  if (error.status !== undefined && error.status >= 400 && error.status < 500)
    return new ProblemError(400, 'request.malformed', 'The request could not be read.');
  return null;
}

/** The last handler: known problems as they are, anything else as a 500 that carries no internals. */
export const problemHandler: ErrorRequestHandler = (error, request, response, next) => {
  if (response.headersSent) {
    next(error);
    return;
  }
  if (error instanceof ProblemError) {
    sendProblem(response, error);
    return;
  }
  const read = fromReader(error);
  if (read !== null) {
    sendProblem(response, read);
    return;
  }
  request.log.error({ err: error }, 'request failed');
  sendProblem(
    response,
    new ProblemError(
      500,
      'server.failed',
      'Nothing was changed. Try again; if it happens again, tell your administrator the request number.',
    ),
  );
};
