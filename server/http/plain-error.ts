import type { ErrorRequestHandler } from 'express';

/** Errors outside the API: a sentence, and nothing of the inside. */
export const plainErrorHandler: ErrorRequestHandler = (error, _request, response, next) => {
  if (response.headersSent) {
    next(error);
    return;
  }
  const status = Number((error as { status?: unknown }).status);
  const isTheirs = status >= 400 && status < 500;
  response
    .status(isTheirs ? status : 500)
    .type('text/plain')
    .send(
      isTheirs ? 'There is nothing at this address.\n' : 'Something went wrong on our side. Try again.\n',
    );
};
