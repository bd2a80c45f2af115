import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { machineClassDefaults } from '#shared/cutting/machine-classes.ts';
import { answerCalls, showPage } from '../../tests/support/answered-page.tsx';
import { machineOf } from '../../tests/support/samples.ts';
import { Component } from './welcome.tsx';

afterEach(() => vi.unstubAllGlobals());

const list = (items: readonly unknown[]) => ({
  status: 200,
  body: { items, total: items.length, nextCursor: null },
});

describe('the first machine and bits', () => {
  it('marks class defaults as such until they are typed over, and leaves the bed to be measured', async () => {
    answerCalls({ 'GET /api/machines': list([]), 'GET /api/bits': list([]) });
    showPage('/welcome', <Component />);
    await userEvent.click(await screen.findByRole('radio', { name: /Gantry on screws/ }));
    const travel = screen.getByLabelText('Z travel');
    expect(travel).toHaveValue(String(machineClassDefaults['screw-gantry'].zTravelMm));
    expect(travel).toHaveAccessibleDescription(/Class default \(P\)/);
    expect(screen.getByLabelText('Bed length (X)')).toHaveValue('');
    await userEvent.clear(travel);
    await userEvent.type(travel, '88');
    expect(travel).not.toHaveAccessibleDescription(/Class default/);
    await userEvent.click(screen.getByRole('radio', { name: /Small desktop/ }));
    expect(travel).toHaveValue('88');
  });

  it('does not let the machine be skipped', async () => {
    const sent = answerCalls({ 'GET /api/machines': list([]), 'GET /api/bits': list([]) });
    showPage('/welcome', <Component />);
    await userEvent.click(await screen.findByRole('button', { name: 'Add machine' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(/Bed length \(X\).*Bed width \(Y\)/);
    expect(screen.queryByRole('link', { name: /loft/ })).toBeNull();
    expect(sent.filter(({ call }) => call.startsWith('POST'))).toEqual([]);
  });

  it('goes on to the bits, and puts those ticked into the drawer', async () => {
    const machines: unknown[] = [];
    const sent = answerCalls({
      'GET /api/machines': () => list(machines),
      'GET /api/bits': list([]),
      'POST /api/machines': () => {
        machines.push({ ...machineOf(), id: '1', version: 1, createdAt: '2026-05-05T08:00:00.000Z' });
        return { status: 201, body: machines[0] };
      },
      'POST /api/bits': { status: 201, body: {} },
    });
    vi.stubGlobal('scrollTo', vi.fn());
    showPage('/welcome', <Component />);
    await userEvent.type(await screen.findByLabelText('Name'), 'Shed router');
    await userEvent.type(screen.getByLabelText('Bed length (X)'), '300');
    await userEvent.type(screen.getByLabelText('Bed width (Y)'), '180');
    await userEvent.click(screen.getByRole('button', { name: 'Add machine' }));
    await userEvent.click(await screen.findByRole('checkbox', { name: /^1\/8 in up-cut, two flutes/ }));
    await userEvent.click(screen.getByRole('button', { name: 'Add 1 bit' }));
    expect(await screen.findByText('now at /')).toBeVisible();
    const bit = sent.find(({ call }) => call === 'POST /api/bits')?.body;
    // 1/8 in = 3.175 mm, in a shank of the same (check-values, shanks; M).
    expect(bit).toMatchObject({ kind: 'up-cut', diameterMm: 3.175, shankMm: 3.175, flutes: 2 });
  });

  it('lets the bits be skipped', async () => {
    const mine = { ...machineOf(), id: '1', version: 1, createdAt: '2026-05-05T08:00:00.000Z' };
    answerCalls({ 'GET /api/machines': list([mine]), 'GET /api/bits': list([]) });
    showPage('/welcome', <Component />);
    await userEvent.click(await screen.findByRole('link', { name: 'Go to the loft without' }));
    expect(screen.getByText('now at /')).toBeVisible();
  });
});
