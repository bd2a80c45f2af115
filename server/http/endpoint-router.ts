import type { Request, Response, Router } from 'express';
import type { z } from 'zod';
import type { Deps } from '#server/deps.ts';
import type { Endpoint } from '#shared/api/endpoint.ts';
import { ProblemError } from './problem.ts';
import { requireMember, type SignedIn } from './session.ts';
import { uploadOf } from './upload.ts';
import { validate } from './validate.ts';

type Parsed<Schema> = Schema extends z.ZodType ? z.infer<Schema> : undefined;

/** A request that was let in and whose input was checked. */
export interface Call<E extends Endpoint> {
  member: E['who'] extends 'all' ? null : SignedIn;
  query: Parsed<E['query']>;
  body: Parsed<E['body']>;
  param(name: string): string;
  request: Request;
  response: Response;
}

/** Answers with a JSON body, or null when the handler has written the answer itself (downloads). */
export type Handler<E extends Endpoint> = (
  call: Call<E>,
) => Promise<E['answer'] extends z.ZodType ? z.input<E['answer']> : null | undefined>;

/** Mounts an endpoint of the contract: session and role, validation, answer. */
export function mount<const E extends Endpoint>(
  router: Router,
  deps: Deps,
  endpoint: E,
  handler: Handler<E>,
): void {
  router[endpoint.method](endpoint.path, async (request, response) => {
    const member = endpoint.who === 'all' ? null : await requireMember(deps.auth, request, endpoint.who);
    // After the session check: a stranger's ten megabytes are not taken in.
    if (endpoint.multipart !== undefined) await readUpload(endpoint.multipart.file, request, response);
    const call = {
      member,
      query: endpoint.query === undefined ? undefined : validate(endpoint.query, request.query, 400),
      body: endpoint.body === undefined ? undefined : validate(endpoint.body, jsonBody(request) ?? {}, 422),
      param: (name: string) => String(request.params[name]),
      request,
      response,
    } as Call<E>;
    const answer = await handler(call);
    if (response.headersSent) return;
    response.status(endpoint.status).set('Cache-Control', 'no-store');
    if (endpoint.status === 204) response.end();
    else response.json(answer);
  });
}

function readUpload(
  kind: NonNullable<Endpoint['multipart']>['file'],
  request: Request,
  response: Response,
): Promise<void> {
  return new Promise((resolve, reject) => {
    uploadOf(kind)(request, response, (error: unknown) => (error ? reject(error) : resolve()));
  });
}

function jsonBody(request: Request): unknown {
  if (!request.is('application/json')) {
    throw new ProblemError(415, 'body.not-json', 'Send the body as application/json.');
  }
  return request.body;
}
