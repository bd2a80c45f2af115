import type { RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { ProblemError } from './problem.ts';

function limit(options: {
  windowS: number;
  most: number;
  by: (request: Parameters<RequestHandler>[0]) => string;
  what: string;
}) {
  return rateLimit({
    windowMs: options.windowS * 1000,
    limit: options.most,
    keyGenerator: options.by,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (request, _response, next) => {
      const resetTime = (request as { rateLimit?: { resetTime?: Date } }).rateLimit?.resetTime;
      const waitS = Math.max(1, Math.ceil(((resetTime?.getTime() ?? 0) - Date.now()) / 1000));
      next(
        new ProblemError(429, 'rate.limited', `Too many ${options.what}. Try again in ${waitS} seconds.`, {
          retryAfterS: waitS,
        }),
      );
    },
  });
}

const address = (request: Parameters<RequestHandler>[0]) => ipKeyGenerator(request.ip ?? '');

/** New limits for each application, so that tests do not share them. */
export const rateLimits = () => ({
  signInByAddress: limit({ windowS: 60, most: 30, by: address, what: 'sign-ins from this address' }),
  signInByAccount: limit({
    windowS: 900,
    most: 10,
    by: (request) =>
      `account:${String((request.body as { email?: unknown } | undefined)?.email ?? '')
        .trim()
        .toLowerCase()}`,
    what: 'sign-ins to this account',
  }),
  invitations: limit({ windowS: 60, most: 30, by: address, what: 'invitation look-ups from this address' }),
  inspect: limit({ windowS: 60, most: 120, by: address, what: 'drawings read' }),
});
export type RateLimits = ReturnType<typeof rateLimits>;
