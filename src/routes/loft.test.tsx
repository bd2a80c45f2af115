import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { designItem, designListOf, machineOf, ownBit } from '../../tests/support/design.ts';
import { answerCalls, listOf, openPage } from '../../tests/support/page.tsx';
import { Component } from './loft.tsx';

const machine = machineOf();
const ply = designItem({ title: 'Wedge in ply' });
const mdf = designItem({ title: 'Tray in mdf', widthMm: 320, heightMm: 200 });

let calls: URL[];
let answerDesigns: (url: URL) => unknown;
beforeEach(() => {
  answerDesigns = ({ searchParams }) =>
    designListOf(searchParams.get('material') === 'plywood' ? [ply] : [ply, mdf]);
  calls = answerCalls({
    '/api/machines': () => listOf([machine]),
    '/api/bits': () => listOf([ownBit(6.35)]),
    '/api/designs': (url) => answerDesigns(url),
  });
});
afterEach(() => vi.unstubAllGlobals());

const open = (at = '/') => openPage('/', Component, at);
const titles = () =>
  screen.queryAllByRole('article').map((card) => within(card).getByRole('heading').textContent);
const asked = () => calls.filter(({ pathname }) => pathname === '/api/designs').at(-1)?.searchParams;

describe('the loft', () => {
  it('asks for what the address says, and shows each filter as a chip that takes it away', async () => {
    const { router } = open('/?q=wedge&material=plywood&fits=true&bitMm=6.35&maxMinutes=30&sort=title');
    await screen.findByText('Wedge in ply');
    expect(Object.fromEntries(asked() ?? [])).toEqual({
      q: 'wedge',
      material: 'plywood',
      fits: 'true',
      bitMm: '6.35',
      maxMinutes: '30',
      sort: 'title',
      machineId: machine.id,
    });
    const chips = within(screen.getByRole('list', { name: 'Filters that are set' }));
    expect(chips.getAllByRole('link').map((chip) => chip.textContent)).toEqual([
      '“wedge”',
      'Fits Shed router',
      'Plywood',
      '6.35 mm bit',
      'Under 30 min',
      'Clear all',
    ]);
    await userEvent.click(chips.getByRole('link', { name: 'Take away the filter Plywood' }));
    expect(router.state.location.search).toBe('?q=wedge&bitMm=6.35&fits=true&maxMinutes=30&sort=title');
  });

  it('never shows what its filters exclude, not even while the answer is on its way', async () => {
    const { router } = open();
    await screen.findByText('Tray in mdf');
    let letGo: (list: unknown) => void = () => undefined;
    answerDesigns = () =>
      new Promise((resolve) => {
        letGo = resolve;
      });
    await userEvent.click(screen.getByRole('link', { name: /^Plywood/ }));
    expect(router.state.location.search).toBe('?material=plywood');
    await waitFor(() => expect(asked()?.get('material')).toBe('plywood'));
    expect(titles()).toEqual([]);
    letGo(designListOf([ply]));
    await screen.findByText('Wedge in ply');
    expect(titles()).toEqual(['Wedge in ply']);
  });

  it('goes back to the list as it was', async () => {
    const { router } = open();
    await screen.findByText('Tray in mdf');
    await userEvent.click(screen.getByRole('link', { name: /^Plywood/ }));
    await waitFor(() => expect(titles()).toEqual(['Wedge in ply']));
    await router.navigate(-1);
    await waitFor(() => expect(titles()).toEqual(['Wedge in ply', 'Tray in mdf']));
  });

  it('says on each card how it lies on the bed of the machine in use', async () => {
    open();
    await screen.findByText('Wedge in ply');
    const [wedge, tray] = screen.getAllByRole('article');
    expect(wedge).toHaveTextContent('Fits as drawn');
    // 320 x 200 with a 6.35 bit round it, on 292 x 172.
    expect(tray).toHaveTextContent(/At least [\d.]+ mm too large for this bed/);
  });

  it('shows more, with the cursor of the page before, under what is there', async () => {
    answerDesigns = ({ searchParams }) =>
      searchParams.get('cursor') === null ? designListOf([ply], 'next') : designListOf([mdf]);
    open();
    await userEvent.click(await screen.findByRole('button', { name: 'Show more (1 left)' }));
    await waitFor(() => expect(titles()).toEqual(['Wedge in ply', 'Tray in mdf']));
    expect(asked()?.get('cursor')).toBe('next');
    expect(screen.queryByRole('button', { name: /Show more/ })).toBeNull();
  });

  it('offers to clear the filters when nothing passes, and to share when there is nothing at all', async () => {
    answerDesigns = () => designListOf([]);
    const { router } = open('/?kind=boxes');
    await userEvent.click(await screen.findByRole('link', { name: 'Clear all filters' }));
    expect(router.state.location.search).toBe('');
    expect(await screen.findByRole('link', { name: 'Share the first design' })).toHaveAttribute(
      'href',
      '/share',
    );
  });
});
