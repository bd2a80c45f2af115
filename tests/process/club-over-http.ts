import type { ServerProcess } from '../../scripts/server-process.ts';
import { password } from '../support/test-club.ts';

/** A signed-in administrator of a running server, over real HTTP. */
export interface OverHttp {
  get(path: string): Promise<Response>;
  post(path: string, body: unknown): Promise<Response>;
  share(svg: string, details: unknown, key: string): Promise<Response>;
}

const email = 'first@club.example';

/** Uses the one-time link that an empty club prints. */
export async function joinAsFirst(server: ServerProcess): Promise<void> {
  const line = server.output.find((text) => text.includes('/join/'));
  const code = line?.split('/join/')[1];
  if (code === undefined) throw new Error('the server printed no first-administrator link');
  const answer = await fetch(`${server.url}/api/invitations/${code}/acceptance`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify({ name: 'First', email, password }),
  });
  if (answer.status !== 201) throw new Error(`joining answered ${answer.status}`);
}

export async function signInOverHttp(server: ServerProcess): Promise<OverHttp> {
  const origin = server.url;
  const signIn = await fetch(`${origin}/api/auth/sign-in/email`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', Origin: origin },
    body: JSON.stringify({ email, password }),
  });
  if (signIn.status !== 200) throw new Error(`signing in answered ${signIn.status}`);
  const Cookie = signIn.headers.getSetCookie()[0]?.split(';')[0] ?? '';
  const headers = { Cookie, Origin: origin };
  return {
    get: (path) => fetch(origin + path, { headers }),
    post: (path, body) =>
      fetch(origin + path, {
        method: 'POST',
        headers: { ...headers, 'Content-Type': 'application/json' },
        body: JSON.stringify(body),
      }),
    share: (svg, details, key) => {
      const form = new FormData();
      form.set('details', JSON.stringify(details));
      form.set('file', new Blob([svg], { type: 'image/svg+xml' }), 'drawing.svg');
      return fetch(`${origin}/api/designs`, {
        method: 'POST',
        headers: { ...headers, 'Idempotency-Key': key },
        body: form,
      });
    },
  };
}
