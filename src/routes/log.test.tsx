import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { cutRecordOf } from '../../tests/support/cut.ts';
import { machineOf } from '../../tests/support/design.ts';
import { answerCalls, listOf, openPage } from '../../tests/support/page.tsx';
import { Component } from './log.tsx';

const machine = machineOf();
const records = [
  cutRecordOf({ id: 'a', cutOn: '2026-08-03', runTimeS: 600, outcome: 'failed', wentWrong: ['bit-broke'] }),
  cutRecordOf({ id: 'b', cutOn: '2026-08-02', runTimeS: 5400 }),
  cutRecordOf({ id: 'c', cutOn: '2026-08-01', runTimeS: 60, outcome: 'usable' }),
];
let calls: URL[];
let answer: (url: URL) => unknown;
beforeEach(() => {
  answer = () => listOf(records);
  calls = answerCalls({ '/api/machines': () => listOf([machine]), '/api/cuts': (url) => answer(url) });
});
afterEach(() => vi.unstubAllGlobals());

const open = (at = '/log') => openPage('/log', Component, at);
const asked = () =>
  Object.fromEntries(calls.filter(({ pathname }) => pathname === '/api/cuts').at(-1)?.searchParams ?? []);
const days = () =>
  within(screen.getByRole('table', { name: 'Cut records' }))
    .getAllByRole('row')
    .slice(1)
    .map((row) => within(row).getAllByRole('cell')[0]?.textContent);

describe('the cut log', () => {
  it('asks for what the address says, and for the CSV alike', async () => {
    open(`/log?material=plywood&outcome=failed&machineId=${machine.id}&colour=red`);
    await screen.findByText('3 cuts of yours.');
    const query = { whose: 'mine', material: 'plywood', outcome: 'failed', machineId: machine.id };
    expect(asked()).toEqual(query);
    const csv = new URL(
      screen.getByRole('link', { name: 'Take as CSV' }).getAttribute('href') ?? '',
      'http://localhost',
    );
    expect([csv.pathname, Object.fromEntries(csv.searchParams)]).toEqual(['/api/cuts.csv', query]);
    expect(screen.getByLabelText('Machine')).toHaveValue(machine.id);
  });

  it('writes each choice into the address, and names no machine of mine among the club’s cuts', async () => {
    const { router } = open(`/log?machineId=${machine.id}`);
    await screen.findByText('3 cuts of yours.');
    await userEvent.selectOptions(screen.getByLabelText('Outcome'), 'failed');
    expect(router.state.location.search).toBe(`?outcome=failed&machineId=${machine.id}`);
    await userEvent.click(screen.getByRole('radio', { name: 'The club’s' }));
    expect(router.state.location.search).toBe('?outcome=failed&whose=club');
    await waitFor(() => expect(asked()).toEqual({ whose: 'club', outcome: 'failed' }));
    expect(screen.queryByLabelText('Machine')).toBeNull();
    expect(await screen.findByRole('columnheader', { name: 'Member' })).toBeInTheDocument();
    await router.navigate(-1);
    await waitFor(() => expect(screen.getByLabelText('Machine')).toHaveValue(machine.id));
  });

  it('sorts by what is measured, and says so to who cannot see it', async () => {
    open();
    await screen.findByText('3 cuts of yours.');
    expect(days()).toEqual(['3 Aug 2026', '2 Aug 2026', '1 Aug 2026']);
    await userEvent.click(screen.getByRole('button', { name: 'Run time' }));
    const longestFirst = ['2 Aug 2026', '3 Aug 2026', '1 Aug 2026'];
    const head = () => screen.getByRole('columnheader', { name: 'Run time' });
    if (head().getAttribute('aria-sort') === 'ascending') {
      await userEvent.click(screen.getByRole('button', { name: 'Run time' }));
    }
    expect(head()).toHaveAttribute('aria-sort', 'descending');
    expect(days()).toEqual(longestFirst);
    expect(screen.getByText('Hazard: bit broke.')).toBeInTheDocument();
  });

  it('shows the next page on demand', async () => {
    answer = ({ searchParams }) =>
      searchParams.get('cursor') === 'next'
        ? { items: records.slice(2), total: 3, nextCursor: null }
        : { items: records.slice(0, 2), total: 3, nextCursor: 'next' };
    open();
    await userEvent.click(await screen.findByRole('button', { name: 'Show more (1 left)' }));
    await waitFor(() => expect(days()).toHaveLength(3));
    expect(screen.queryByRole('button', { name: /Show more/ })).toBeNull();
  });

  it('says what to do first when nothing is there, and offers to clear filters that leave nothing', async () => {
    answer = () => listOf([]);
    const { router } = open('/log?outcome=failed');
    await userEvent.click(await screen.findByRole('button', { name: 'Clear the filters' }));
    expect(router.state.location.search).toBe('');
    expect(await screen.findByText('You have recorded no cut yet')).toBeInTheDocument();
  });
});
