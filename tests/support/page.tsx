import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { configure, render } from '@testing-library/react';
import type { ComponentType } from 'react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { vi } from 'vitest';

// A page does much at once, and the machine may be busy with other tests.
configure({ asyncUtilTimeout: 5000 });
vi.setConfig({ testTimeout: 30_000 });

type Answer = (url: URL) => unknown;

/** Answers the calls of a page by path; a call that is not expected fails the test by its 404. */
export const answerCalls = (answers: Readonly<Record<string, Answer>>): URL[] => {
  const calls: URL[] = [];
  vi.stubGlobal('fetch', async (path: string) => {
    const url = new URL(path, 'http://localhost');
    calls.push(url);
    const answer = answers[url.pathname];
    const body = await answer?.(url);
    return new Response(JSON.stringify(body ?? { type: 'x', detail: `no ${url.pathname}`, title: 'x' }), {
      status: answer === undefined ? 404 : 200,
    });
  });
  return calls;
};

/** A page at its address, as the router shows it. */
export const openPage = (path: string, Page: ComponentType, at: string) => {
  const router = createMemoryRouter(
    [
      { path, Component: Page },
      { path: '*', element: <p>elsewhere</p> },
    ],
    { initialEntries: [at] },
  );
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  const view = render(
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return { router, ...view };
};

export const listOf = (items: readonly unknown[]) => ({ items, total: items.length, nextCursor: null });
