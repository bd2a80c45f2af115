import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { cutRecordOf } from '../../tests/support/cut.ts';
import { designItem, machineOf } from '../../tests/support/design.ts';
import { answerCalls, listOf, openPage } from '../../tests/support/page.tsx';
import { Component } from './design.tsx';

const machine = machineOf();
const { outline: _outline, hullMm, cut: _cut, revision, ...words } = designItem({ title: 'Wedge' });
const { boundsMm } = revision.drawing;
const layers = [{ key: 'a', name: 'outside', shapeCount: 1, boundsMm }];
const person = { id: 'wren', name: 'Wren' };

const cutOf = (change: Partial<CutRecord>) => cutRecordOf({ id: 'c1', member: person, ...change });

const designOf = (change: Partial<Design>): Design => {
  const issue = (number: number, geometryHash: string) => ({
    number,
    geometryHash,
    licence: words.licence,
    changeNote: 'issue',
    createdAt: words.createdAt,
    createdBy: person,
  });
  return {
    ...words,
    settingsStanding: [],
    remixes: [],
    takenByMe: false,
    owner: person,
    revision: {
      ...issue(2, 'new'),
      drawing: {
        ...revision.drawing,
        units: { source: 'mm', millimetresPerUnit: { x: 1, y: 1 }, confirmed: true },
        shapeCount: 1,
        segmentCount: 4,
        lengthMm: 280,
        layers,
        warnings: [{ code: 'x', message: '1 text cannot be cut.', line: 4, column: 7 }],
      },
    },
    revisions: [issue(2, 'new'), issue(1, 'old')],
    cuts: [],
    takeCount: 0,
    ...change,
  };
};

const open = async (design: Design, role = 'member') => {
  answerCalls({
    '/api/auth/get-session': () => ({ session: {} }),
    '/api/me': () => ({ id: 'me', name: 'Tarn', email: 't@x', role, club: { name: 'Club' } }),
    '/api/machines': () => listOf([machine]),
    '/api/designs/wedge': () => design,
    '/api/designs/wedge/revisions/2/geometry': () => ({ boundsMm, layers, shapes: [], hullMm }),
    '/api/designs/wedge/revisions/2/fit': () => ({
      verdict: 'fits',
      sentence: 'Fits your bed as drawn.',
      turnDeg: 0,
      checks: [
        { id: 'bed', result: 'fits', have: '292 × 172', need: '106 × 46', unit: 'mm', sentence: 'Room.' },
      ],
    }),
  });
  const page = openPage('/designs/:slug', Component, '/designs/wedge');
  await screen.findByText('Fits your bed as drawn.');
  return page;
};
afterEach(() => vi.unstubAllGlobals());

const takePanel = () => within(screen.getByRole('region', { name: 'Take it' }));
const packageHref = () => takePanel().getByRole('link', { name: 'Take package' }).getAttribute('href');

describe('the page of a design', () => {
  it('says plainly that nobody has cut it, and the package then names no record', async () => {
    await open(designOf({}));
    expect(screen.getByText('Not cut yet: nobody has recorded a cut.')).toBeInTheDocument();
    expect(packageHref()).toBe(`/api/designs/wedge/revisions/2/package.zip?machineId=${machine.id}`);
    expect(screen.getByRole('complementary', { name: 'Safety' })).toBeVisible();
    expect(screen.getByText('line 4, column 7')).toBeInTheDocument();
    expect(document.title).toBe('Wedge · Tallyloft');
  });

  it('puts forward the newest clean record, and takes along the one that is chosen', async () => {
    const { router } = await open(
      designOf({
        cuts: [
          cutOf({ id: 'failed', outcome: 'failed', member: { id: 'm', name: 'Moss' } }),
          cutOf({ id: 'clean' }),
          cutOf({ id: 'of-old-drawing', revision: 1 }),
        ],
      }),
    );
    expect(packageHref()).toContain('recordId=clean');
    const choice = screen.getByLabelText('Record');
    // A record of another geometry is no evidence for this one.
    expect(within(choice).getAllByRole('option')).toHaveLength(2);
    expect(screen.getByText(/1 record of earlier revisions/)).toBeInTheDocument();
    await userEvent.selectOptions(choice, 'failed');
    expect(packageHref()).toContain('recordId=failed');
    expect(screen.getByText(/This cut failed/)).toBeInTheDocument();
    expect(router.state.location.search).toBe('?record=failed');
  });

  it('hands out nothing of a withdrawn design, and says why', async () => {
    await open(designOf({ withdrawnAt: '2026-09-01T10:00:00.000Z' }));
    expect(screen.queryByRole('link', { name: /Take/ })).toBeNull();
    const button = takePanel().getByRole('button', { name: 'Take package' });
    expect(button).toBeDisabled();
    expect(button).toHaveAccessibleDescription(/withdrawn on 0?1 Sept? 2026/);
  });

  it('offers editing and withdrawing to its owner and to moderators only', async () => {
    const { unmount } = await open(designOf({}));
    expect(screen.queryByRole('button', { name: 'Withdraw' })).toBeNull();
    unmount();
    await open(designOf({}), 'moderator');
    expect(await screen.findByRole('button', { name: 'Withdraw' })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Edit the words' })).toBeInTheDocument();
  });
});
