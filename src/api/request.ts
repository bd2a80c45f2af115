import { ConnectionError, ProblemError, problemFrom } from './problem-error.ts';

interface RequestOptions {
  readonly body?: unknown;
  readonly signal?: AbortSignal;
  readonly idempotencyKey?: string;
}

type Method = 'GET' | 'POST' | 'PATCH' | 'DELETE';

const isAbort = (error: unknown): boolean => error instanceof DOMException && error.name === 'AbortError';

/** Calls the API. Throws ProblemError on a refusal and ConnectionError when nothing answered. */
export async function request<Answer>(
  method: Method,
  path: string,
  { body, signal, idempotencyKey }: RequestOptions = {},
): Promise<Answer> {
  const headers: Record<string, string> = { Accept: 'application/json' };
  if (body !== undefined) headers['Content-Type'] = 'application/json';
  if (idempotencyKey !== undefined) headers['Idempotency-Key'] = idempotencyKey;
  let response: Response;
  let text: string;
  try {
    response = await fetch(path, {
      method,
      headers,
      credentials: 'same-origin',
      // A removal may be sent while its page is being left.
      keepalive: method === 'DELETE',
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal === undefined ? {} : { signal }),
    });
    text = await response.text();
  } catch (error) {
    throw isAbort(error) ? error : new ConnectionError();
  }
  if (!response.ok) throw new ProblemError(problemFrom(response.status, text));
  return (text === '' ? undefined : JSON.parse(text)) as Answer;
}

/** A key that makes a repeated creation harmless. Not `randomUUID`, which plain http pages do not have. */
export const newIdempotencyKey = (): string =>
  Array.from(crypto.getRandomValues(new Uint8Array(16)), (byte) => byte.toString(16).padStart(2, '0')).join(
    '',
  );

/** Creates something; asks once more when the connection broke, and the key keeps it from being made twice. */
export async function create<Answer>(path: string, body: unknown): Promise<Answer> {
  const idempotencyKey = newIdempotencyKey();
  try {
    return await request<Answer>('POST', path, { body, idempotencyKey });
  } catch (error) {
    if (!(error instanceof ConnectionError)) throw error;
    return request<Answer>('POST', path, { body, idempotencyKey });
  }
}
