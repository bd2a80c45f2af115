import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { CutRecord } from '#shared/api/cuts.ts';
import { answerCalls } from '../../tests/support/answered-page.tsx';
import { cutRecordOf } from '../../tests/support/cut.ts';
import { machineOf, ownBit } from '../../tests/support/design.ts';
import { listOf, openPage } from '../../tests/support/page.tsx';
import { Component } from './record.tsx';

const machine = machineOf();
const bit = ownBit(6.35);
const taken = cutRecordOf({ id: 'taken' });
const design = {
  slug: 'wedge',
  title: 'Wedge',
  drawingNumber: 'ML-0098',
  revision: { number: 2, geometryHash: 'new' },
  revisions: [
    { number: 2, geometryHash: 'new' },
    { number: 1, geometryHash: 'old' },
  ],
  cuts: [taken],
};
const ok = (body: unknown) => ({ status: 200, body });
const refusal = (status: number, more: object) => ({
  status,
  body: { type: 'x', title: 'Not as it is', detail: 'Look again.', requestId: 'r', status, ...more },
});

type Answers = Parameters<typeof answerCalls>[0];
const open = async (answers: Answers = {}, { mine = [] as CutRecord[], query = '' } = {}) => {
  const sent = answerCalls({
    'GET /api/auth/get-session': ok({ session: {} }),
    'GET /api/me': ok({ id: 'me', name: 'Tarn', email: 't@x', role: 'member', club: { name: 'Club' } }),
    'GET /api/machines': ok(listOf([machine])),
    'GET /api/bits': ok(listOf([ownBit(3.175), bit])),
    'GET /api/designs/wedge': ok(design),
    'GET /api/cuts?whose=mine': ok(listOf(mine)),
    ...answers,
  });
  const page = openPage('/designs/:slug/record', Component, `/designs/wedge/record${query}`);
  await screen.findByRole('radio', { name: /Clean/ });
  return { ...page, posts: () => sent.filter(({ call }) => !call.startsWith('GET')) };
};
const save = (name = 'Record the cut') => userEvent.click(screen.getByRole('button', { name }));

beforeEach(() => localStorage.clear());
afterEach(() => vi.unstubAllGlobals());

describe('recording a cut', () => {
  it('asks for outcome and run time only, and has the rest from the record, my bench and my last stock', async () => {
    const mine = [
      cutRecordOf({ materialId: 'mdf', materialFamily: 'mdf', stockThicknessMm: 18, holdDown: 'screws' }),
      cutRecordOf({ stockThicknessMm: 11.8, holdDown: 'vacuum' }),
    ];
    const { router, posts } = await open({ 'POST /api/designs/wedge/cuts': ok({ id: 'new' }) }, { mine });
    await userEvent.click(screen.getByRole('radio', { name: /Clean/ }));
    await userEvent.type(screen.getByLabelText('Run time'), '1:08');
    await userEvent.type(screen.getByLabelText(/Feed override/), '90');
    await save();
    await waitFor(() => expect(router.state.location.pathname).toBe('/designs/wedge'));
    expect(router.state.location.hash).toBe('#record-new');
    expect(posts()).toEqual([
      {
        call: 'POST /api/designs/wedge/cuts',
        body: {
          revision: 2,
          machineId: machine.id,
          bitId: bit.id,
          materialId: 'plywood',
          // Of my own plywood, not of the MDF that I cut last.
          stockThicknessMm: 11.8,
          holdDown: 'vacuum',
          settings: taken.settings,
          outcome: 'clean',
          runTimeS: 4080,
          overridePercent: 90,
          wentWrong: [],
          measured: [],
          cutOn: expect.stringMatching(/^\d{4}-\d\d-\d\d$/),
          notes: '',
        },
      },
    ]);
    // Recorded: no draft is left.
    expect(Object.keys(localStorage)).toEqual([]);
  });

  it('claims no bit that is not in my drawer, and has the measures ready to describe it', async () => {
    await open({ 'GET /api/bits': ok(listOf([ownBit(3.175)])) });
    expect(screen.getByLabelText('Bit')).toHaveValue('');
    await userEvent.click(screen.getByRole('radio', { name: /Clean/ }));
    await userEvent.type(screen.getByLabelText('Run time'), '9');
    await save();
    expect(await screen.findByText('One thing to change')).toBeInTheDocument();
    await userEvent.selectOptions(screen.getByLabelText('Bit'), 'described');
    expect(screen.getByLabelText('Bit diameter')).toHaveValue('6.35');
  });

  it('parts hazards from own slips, and asks of them when the outcome is not clean', async () => {
    const { posts } = await open({ 'POST /api/designs/wedge/cuts': ok({ id: 'new' }) });
    expect(screen.queryByRole('group', { name: /Hazards/ })).toBeNull();
    await userEvent.click(screen.getByRole('radio', { name: /Failed/ }));
    const named = (name: RegExp) =>
      within(screen.getByRole('group', { name }))
        .getAllByRole('checkbox')
        .map((box) => (box as HTMLInputElement).value);
    expect(named(/Hazards/)).toEqual(['part-came-loose', 'bit-broke', 'fire-or-smoke', 'unexpected-motion']);
    expect(named(/My own slip/)).toEqual(['not-zeroed', 'wrong-bit', 'clamp-forgotten']);
    await userEvent.click(screen.getByRole('checkbox', { name: 'Bit broke' }));
    await userEvent.click(screen.getByRole('checkbox', { name: 'Tear-out' }));
    // What was named stays named when the outcome is changed.
    await userEvent.click(screen.getByRole('radio', { name: /Clean/ }));
    await userEvent.type(screen.getByLabelText('Run time'), '9');
    await save();
    await waitFor(() => expect(posts()).toHaveLength(1));
    expect(posts()[0]?.body).toMatchObject({ outcome: 'clean', wentWrong: ['bit-broke', 'tear-out'] });
  });

  it('puts the question of the unit at its row, converts at one tap, or says that it is right', async () => {
    const asked = refusal(422, { errors: [{ path: 'measured.0.measuredMm', message: 'is that inches?' }] });
    let answer: { status: number; body: unknown } = asked;
    const { posts } = await open({ 'POST /api/designs/wedge/cuts': () => answer });
    await userEvent.click(screen.getByRole('radio', { name: /Clean/ }));
    await userEvent.type(screen.getByLabelText('Run time'), '9');
    await userEvent.click(screen.getByRole('button', { name: 'Measured size' }));
    await userEvent.type(screen.getByLabelText('Drawn 1'), '100');
    await userEvent.type(screen.getByLabelText('Measured 1'), '3.94');
    await save();
    expect(await screen.findByText('Which unit?')).toBeInTheDocument();
    // 3.94 in x 25.4 mm/in = 100.076 mm.
    await userEvent.click(screen.getByRole('button', { name: 'It was inches: convert to 100.08 mm' }));
    expect(screen.getByLabelText('Measured 1')).toHaveValue('100.076');
    expect(screen.queryByText('Which unit?')).toBeNull();
    await save();
    await userEvent.click(await screen.findByRole('button', { name: 'Yes, millimetres' }));
    await waitFor(() => expect(posts()).toHaveLength(3));
    answer = ok({ id: 'new' });
    const bodies = posts().map(({ body }) => body as Record<string, unknown>);
    expect(bodies.map((body) => body['sizesAreMm'])).toEqual([undefined, undefined, true]);
    expect(bodies[1]?.['measured']).toEqual([{ drawnMm: 100, measuredMm: expect.closeTo(100.076, 6) }]);
  });

  it('finds the draft again after a reload, and can start afresh', async () => {
    const { unmount } = await open();
    await userEvent.click(screen.getByRole('radio', { name: /Usable/ }));
    await userEvent.type(screen.getByLabelText('Run time'), '52');
    unmount();
    await open();
    expect(screen.getByRole('radio', { name: /Usable/ })).toBeChecked();
    expect(screen.getByLabelText('Run time')).toHaveValue('52');
    await userEvent.click(screen.getByRole('button', { name: 'Start afresh' }));
    expect(screen.getByRole('radio', { name: /Usable/ })).not.toBeChecked();
    expect(screen.getByLabelText('Run time')).toHaveValue('');
  });

  it('corrects my record at its version, and shows what it is now when another window was faster', async () => {
    const own = cutRecordOf({ id: 'own', member: { id: 'me', name: 'Tarn' }, runTimeS: 840 });
    const conflict = refusal(409, { current: { ...own, version: 2, runTimeS: 3600 } });
    const { posts } = await open(
      { 'GET /api/cuts/own': ok({ ...own, earlier: [] }), 'PATCH /api/cuts/own': conflict },
      { query: '?correct=own' },
    );
    await userEvent.clear(screen.getByLabelText('Run time'));
    await userEvent.type(screen.getByLabelText('Run time'), '20');
    await save('Save the correction');
    const note = (await screen.findByText(/was changed in the meantime/)).parentElement as HTMLElement;
    expect(note).toHaveTextContent('Run time: now 1 h 00, here 20 min');
    await userEvent.click(within(note).getByRole('button', { name: 'Save what I typed' }));
    await waitFor(() => expect(posts()).toHaveLength(2));
    expect(posts().map(({ body }) => body)).toMatchObject([
      { version: 1, runTimeS: 1200 },
      { version: 2, runTimeS: 1200 },
    ]);
  });
});
