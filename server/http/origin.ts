import type { RequestHandler } from 'express';
import { ProblemError } from './problem.ts';

/** A change made with a cookie must come from a page of ours: a foreign page can send the cookie along. */
export function requireTrustedOrigin(origins: readonly string[]): RequestHandler {
  return (request, _response, next) => {
    const changes = !['GET', 'HEAD', 'OPTIONS'].includes(request.method);
    const origin = request.get('Origin');
    if (changes && request.headers.cookie !== undefined && !origins.includes(origin ?? '')) {
      throw new ProblemError(
        403,
        'origin.untrusted',
        `Changes are taken only from ${origins.join(' or ')}. If people reach the server under another address, set APP_URL.`,
      );
    }
    next();
  };
}
