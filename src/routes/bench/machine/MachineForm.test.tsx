import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Machine } from '#shared/api/bench.ts';
import { answerCalls, showPage } from '../../../../tests/support/answered-page.tsx';
import { machineOf } from '../../../../tests/support/samples.ts';
import { MachineForm } from './MachineForm.tsx';

afterEach(() => vi.unstubAllGlobals());

const machine: Machine = {
  ...machineOf(),
  id: '0190a000-0000-7000-8000-000000000001',
  version: 3,
  createdAt: '2026-05-05T08:00:00.000Z',
};
const path = `/api/machines/${machine.id}`;

async function retype(label: string, text: string) {
  const field = screen.getByLabelText(label);
  await userEvent.clear(field);
  if (text !== '') await userEvent.type(field, text);
}

describe('the machine form', () => {
  it('names every wrong field at the head, and at the field', async () => {
    const sent = answerCalls({});
    const onSaved = vi.fn();
    showPage('/bench', <MachineForm machine={machine} onSaved={onSaved} />);
    await retype('Bed length (X)', '');
    await retype('Z travel', '0');
    await retype('Left margin', '400');
    await retype('Dial position 2', '900000');
    await userEvent.click(screen.getByRole('button', { name: 'Save machine' }));
    const summary = await screen.findByRole('alert');
    expect(summary).toHaveFocus();
    const named = within(summary)
      .getAllByRole('button')
      .map((button) => button.textContent);
    expect(named).toEqual(['Bed length (X)', 'Z travel', 'Dial position 2']);
    expect(screen.getByLabelText('Bed length (X)')).toHaveAccessibleDescription(/Type a number/);
    expect(screen.getByLabelText('Z travel')).toHaveAccessibleDescription(/must be more than 0 mm/);
    expect(screen.getByLabelText('Dial position 2')).toBeInvalid();
    await userEvent.click(within(summary).getByRole('button', { name: 'Dial position 2' }));
    expect(screen.getByLabelText('Dial position 2')).toHaveFocus();
    expect(onSaved).not.toHaveBeenCalled();
    expect(sent).toEqual([]);
  });

  it('says which margins leave no bed', async () => {
    answerCalls({});
    showPage('/bench', <MachineForm machine={machine} onSaved={vi.fn()} />);
    await retype('Left margin', '296');
    await userEvent.click(screen.getByRole('button', { name: 'Save machine' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(/must leave some of the bed length/);
    expect(screen.getByLabelText('Left margin')).toBeInvalid();
  });

  it('reads inches and sends millimetres, with the version it was read at', async () => {
    const sent = answerCalls({ [`PATCH ${path}`]: { status: 200, body: machine } });
    const onSaved = vi.fn();
    showPage('/bench', <MachineForm machine={machine} onSaved={onSaved} />);
    await retype('Bed length (X)', '12 in');
    await userEvent.click(screen.getByRole('button', { name: 'Save machine' }));
    await vi.waitFor(() => expect(onSaved).toHaveBeenCalledOnce());
    // 1 in = 25.4 mm (CSS Values and Units, absolute lengths; S2).
    expect(sent[0]?.body).toEqual({ ...machineOf({ bedXMm: 12 * 25.4 }), version: 3 });
  });

  it('lets an optional figure be taken out again', async () => {
    const measured = { ...machine, accelerationMmPerS2: 400 };
    const sent = answerCalls({ [`PATCH ${path}`]: { status: 200, body: machine } });
    const onSaved = vi.fn();
    showPage('/bench', <MachineForm machine={measured} onSaved={onSaved} />);
    await retype('Acceleration (may stay empty)', '');
    await userEvent.click(screen.getByRole('button', { name: 'Save machine' }));
    await vi.waitFor(() => expect(onSaved).toHaveBeenCalledOnce());
    expect(sent[0]?.body).toEqual({ ...machineOf(), version: 3 });
  });

  it('shows what it is now after somebody was faster, and saves over it when told to', async () => {
    const current = { ...machine, version: 4, bedYMm: 175 };
    const conflict = {
      status: 409,
      body: { type: 'machine.changed', title: 'Changed', status: 409, detail: 'Changed.', current },
    };
    let tries = 0;
    const sent = answerCalls({
      [`PATCH ${path}`]: () => {
        tries += 1;
        return tries === 1 ? conflict : { status: 200, body: { ...current, version: 5 } };
      },
    });
    const onSaved = vi.fn();
    showPage('/bench', <MachineForm machine={machine} onSaved={onSaved} />);
    await retype('Bed width (Y)', '190');
    await userEvent.click(screen.getByRole('button', { name: 'Save machine' }));
    const note = await screen.findByRole('alert');
    expect(note).toHaveTextContent('Bed width (Y): now 175 mm, here 190 mm');
    await userEvent.click(within(note).getByRole('button', { name: 'Save what I typed' }));
    await vi.waitFor(() => expect(onSaved).toHaveBeenCalledOnce());
    expect(sent.map(({ body }) => body)).toEqual([
      { ...machineOf({ bedYMm: 190 }), version: 3 },
      { ...machineOf({ bedYMm: 190 }), version: 4 },
    ]);
  });
});
