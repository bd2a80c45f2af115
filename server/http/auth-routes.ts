import { fromNodeHeaders } from 'better-auth/node';
import type { Request as Incoming, Response as Outgoing, Router } from 'express';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from './problem.ts';
import type { RateLimits } from './rate-limits.ts';

/** The sign-in library's paths that are open; all others answer 404. */
const open = {
  signIn: '/api/auth/sign-in/email',
  signOut: '/api/auth/sign-out',
  session: '/api/auth/get-session',
};

export function authRoutes(router: Router, deps: Deps, limits: RateLimits): void {
  const forward = (request: Incoming, response: Outgoing) => handOver(deps, request, response);
  router.post(open.signIn, limits.signInByAddress, limits.signInByAccount, forward);
  router.post(open.signOut, forward);
  router.get(open.session, forward);
}

/** Hands a request to the sign-in library and turns its errors into problem documents. */
async function handOver(deps: Deps, request: Incoming, response: Outgoing): Promise<void> {
  const headers = fromNodeHeaders(request.headers);
  headers.delete('content-length');
  // The body handed over is always JSON, also for a sign-out, which comes without one.
  if (request.method === 'POST') headers.set('content-type', 'application/json');
  // The library would believe any client's word about its address.
  headers.set('x-forwarded-for', request.ip ?? '');
  const init: RequestInit = { method: request.method, headers };
  if (request.method === 'POST') init.body = JSON.stringify(request.body ?? {});
  const answer = await deps.auth.handler(new Request(new URL(request.originalUrl, deps.origins[0]), init));
  if (answer.status >= 400) throw await asProblem(answer);
  for (const cookie of answer.headers.getSetCookie()) response.append('Set-Cookie', cookie);
  response
    .status(answer.status)
    .set('Cache-Control', 'no-store')
    .json(withoutToken(await answer.json()));
}

/** The session is in its cookie alone, where no script can read it. */
function withoutToken(body: unknown): unknown {
  if (typeof body !== 'object' || body === null) return body;
  const { token: _token, ...rest } = body as { token?: string; session?: { token?: string } };
  if (rest.session === undefined) return rest;
  const { token: _sessionToken, ...session } = rest.session;
  return { ...rest, session };
}

async function asProblem(answer: Response): Promise<ProblemError> {
  const { code, message } = (await answer.json().catch(() => ({}))) as { code?: string; message?: string };
  if (code === 'INVALID_EMAIL_OR_PASSWORD' || code === 'INVALID_EMAIL') {
    return new ProblemError(
      401,
      'sign-in.refused',
      'E-mail or password is not right. Check both; passwords have capital and small letters.',
    );
  }
  if (answer.status === 403 && message?.startsWith('Your membership'))
    return new ProblemError(403, 'member.suspended', message);
  if (answer.status === 403)
    return new ProblemError(403, 'origin.untrusted', 'Sign in from the club’s own page.');
  if (answer.status < 500)
    return new ProblemError(400, 'sign-in.malformed', 'Send e-mail and password as text.');
  return new ProblemError(500, 'server.failed', 'Signing in failed on our side. Try again.');
}
