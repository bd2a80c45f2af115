import type { z } from 'zod';

/** Who may call: 'all' needs no session; the others need at least that role. */
export type Caller = 'all' | 'member' | 'moderator' | 'administrator';

/** One call of the contract. The server mounts it and the OpenAPI document describes it from the same value. */
export interface Endpoint {
  readonly method: 'get' | 'post' | 'patch' | 'delete';
  /** Express style: `/api/designs/:slug`. */
  readonly path: string;
  readonly who: Caller;
  readonly summary: string;
  readonly query?: z.ZodType;
  readonly body?: z.ZodType;
  /** A multipart body: one drawing or photo in `file`, and JSON text parts. */
  readonly multipart?: {
    readonly file: 'drawing' | 'photo';
    readonly parts: Readonly<Record<string, z.ZodType>>;
    readonly required: readonly string[];
  };
  readonly status: 200 | 201 | 204;
  /** JSON answer, or the content type of a download. */
  readonly answer?: z.ZodType;
  readonly download?: string;
  /** Takes an Idempotency-Key. */
  readonly creates?: boolean;
  /** Statuses of problems beyond 400, 401, 403 and 500. */
  readonly problems?: readonly number[];
}
