import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import type { ReactNode } from 'react';
import { MemoryRouter, Route, Routes, useLocation } from 'react-router-dom';
import { vi } from 'vitest';

interface Answer {
  readonly status: number;
  readonly body: unknown;
}

/** Answers the calls of a page (`GET /api/me`); a call without an answer is a mistake of the test. Returns what was sent. */
export function answerCalls(answers: Readonly<Record<string, Answer | (() => Answer)>>) {
  const sent: { call: string; body: unknown }[] = [];
  vi.stubGlobal('fetch', async (path: string, init: RequestInit) => {
    const call = `${init.method} ${path}`;
    const given = answers[call];
    if (given === undefined) throw new Error(`No answer to ${call}`);
    sent.push({ call, body: typeof init.body === 'string' ? JSON.parse(init.body) : undefined });
    const { status, body } = typeof given === 'function' ? given() : given;
    return new Response(JSON.stringify(body), { status });
  });
  return sent;
}

/** Where a page led to, in words. */
function Elsewhere() {
  const { pathname, search } = useLocation();
  return <p>now at {pathname + search}</p>;
}

/** Shows a page at an address; every other address says where it is. */
export function showPage(address: string, page: ReactNode) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  render(
    <QueryClientProvider client={client}>
      <MemoryRouter initialEntries={[address]}>
        <Routes>
          <Route path={address.split('?')[0] ?? '/'} element={page} />
          <Route path="*" element={<Elsewhere />} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
}
