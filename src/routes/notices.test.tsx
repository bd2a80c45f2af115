import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Notice } from '#shared/api/notices.ts';
import { openPage } from '../../tests/support/page.tsx';
import { Component } from './notices.tsx';

afterEach(() => vi.unstubAllGlobals());

const withheld: Notice = {
  id: 'n1',
  kind: 'withheld',
  sentence: 'You took “Wedge”. A moderator withheld it: do not cut it.',
  designSlug: 'wedge',
  createdAt: '2026-10-01T10:00:00.000Z',
};
const seen: Notice = {
  ...withheld,
  id: 'n2',
  kind: 'remixed',
  sentence: 'Tarn remixed “Wedge”.',
  readAt: '2026-09-02T10:00:00.000Z',
};

/** The notices of a member, kept as the server keeps them. */
const open = (given: Notice[]) => {
  let notices = given;
  const read: string[] = [];
  vi.stubGlobal('fetch', async (path: string, init: RequestInit) => {
    const id = /^\/api\/notices\/(.+)\/read$/.exec(path)?.[1];
    if (init.method === 'POST' && id !== undefined) {
      read.push(id);
      notices = notices.map((each) => (each.id === id ? { ...each, readAt: each.createdAt } : each));
      return new Response(null, { status: 204 });
    }
    const unread = notices.filter(({ readAt }) => readAt === undefined).length;
    return new Response(JSON.stringify({ items: notices, total: notices.length, nextCursor: null, unread }));
  });
  return { read, ...openPage('/notices', Component, '/notices') };
};

describe('notices', () => {
  it('says in words which are not read, and what would come here when there are none', async () => {
    const { unmount } = open([withheld, seen]);
    const list = within(await screen.findByRole('list', { name: 'Notices' }));
    const [first, second] = list.getAllByRole('listitem');
    expect(first).toHaveTextContent('Not read: You took “Wedge”');
    expect(second).not.toHaveTextContent('Not read');
    expect(screen.getByText('1 not read yet.')).toBeInTheDocument();
    unmount();
    open([]);
    expect(await screen.findByRole('heading', { name: 'No notices yet' })).toBeInTheDocument();
  });

  it('marks one as read when what it speaks of is opened', async () => {
    const { read, router } = open([withheld, seen]);
    await userEvent.click(await screen.findByRole('link', { name: /^You took/ }));
    await waitFor(() => expect(read).toEqual(['n1']));
    expect(router.state.location.pathname).toBe('/designs/wedge');
  });

  it('marks one as read without leaving the page, and asks for it once only', async () => {
    const { read } = open([withheld, seen]);
    await userEvent.click(await screen.findByRole('button', { name: 'Mark as read' }));
    expect(await screen.findByText('All read.')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Mark as read' })).toBeNull();
    expect(read).toEqual(['n1']);
  });
});
