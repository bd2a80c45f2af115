import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type TestClub, testClub } from '../support/test-club.ts';

/** The sign-in library's paths that are open by decision; a new one has to be written down here. */
const openAuthPaths = [
  'get /api/auth/get-session',
  'post /api/auth/sign-in/email',
  'post /api/auth/sign-out',
];

interface Layer {
  route?: { path: string; methods: Record<string, boolean> };
  handle: { stack?: Layer[] };
}

/** Every route of an Express application, however deep its routers lie. */
const routesIn = (stack: Layer[]): string[] =>
  stack.flatMap(({ route, handle }) =>
    route === undefined
      ? routesIn(handle.stack ?? [])
      : Object.keys(route.methods).map((method) => `${method} ${route.path}`),
  );

let club: TestClub;
beforeAll(async () => {
  club = await testClub();
});
afterAll(() => club.close());

describe('what the application answers', () => {
  it('is what the document lists, both ways, and the open sign-in paths', async () => {
    const { body } = await club.stranger.call('get', '/api/openapi.json').expect(200);
    const documented = Object.entries(body.paths as Record<string, object>).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method} ${path.replace(/\{(\w+)\}/g, ':$1')}`),
    );
    const mounted = new Set(routesIn((club.app.router as unknown as { stack: Layer[] }).stack));
    expect([...mounted].sort()).toEqual([...documented, ...openAuthPaths].sort());
  });

  it('closes every other path of the sign-in library', async () => {
    const owner = await club.person('Wren');
    const library = Object.values(club.deps.auth.api as Record<string, { path?: string; options: unknown }>)
      .filter((endpoint) => typeof endpoint.path === 'string')
      .flatMap(({ path, options }) =>
        [(options as { method: string | string[] }).method]
          .flat()
          .map((method) => `${method.toLowerCase()} /api/auth${path}`),
      );
    const named = [
      'post /api/auth/sign-up/email',
      'post /api/auth/update-user',
      'get /api/auth/list-sessions',
      'post /api/auth/forget-password',
      'post /api/auth/change-password',
      'post /api/auth/delete-user',
    ];
    const closed = [...new Set([...library, ...named])].filter((path) => !openAuthPaths.includes(path));
    expect(library.length).toBeGreaterThan(15);
    const answers: Record<string, number> = {};
    for (const line of closed) {
      const [method, path] = line.split(' ') as ['get' | 'post', string];
      answers[line] = (await owner.call(method, path)).status;
    }
    expect(answers).toEqual(
      Object.fromEntries(closed.map((line) => [line, openAuthPaths.includes(line) ? 200 : 404])),
    );
  });

  it('names an unknown call in a problem document', async () => {
    const answer = await club.stranger.call('get', '/api/nothing-here').expect(404);
    expect(answer.body).toMatchObject({ type: 'call.unknown', detail: expect.stringContaining('/api/') });
  });
});
