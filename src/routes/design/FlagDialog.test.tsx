import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Design } from '#shared/api/designs.ts';
import type { Me } from '#shared/api/people.ts';
import { answerReview, flagOf, recordOf, sheetOf } from '../../../tests/support/review.ts';
import { FlagThis } from './FlagThis.tsx';

beforeEach(() => {
  // jsdom knows the element and not its methods.
  HTMLDialogElement.prototype.showModal = function show() {
    this.open = true;
  };
});
afterEach(() => vi.unstubAllGlobals());

const me = (role: Me['role'], id = 'me'): Me => ({
  id,
  name: 'Moss',
  email: 'm@x',
  role,
  club: { name: 'C' },
});

const open = async (
  role: Me['role'],
  {
    design = sheetOf({ cuts: [recordOf({})] }),
    ...options
  }: Parameters<typeof answerReview>[1] & { design?: Design; id?: string } = {},
) => {
  const sent = answerReview([flagOf({})], options);
  render(
    <QueryClientProvider client={new QueryClient({ defaultOptions: { queries: { retry: false } } })}>
      <FlagThis design={design} me={me(role, options.id)} recordId={null} />
    </QueryClientProvider>,
  );
  await userEvent.click(screen.getByRole('button', { name: 'Flag this' }));
  const dialog = within(screen.getByRole('dialog', { name: 'Flag Wedge' }));
  return {
    sent: () => sent.filter(({ call }) => call === 'POST /api/flags').map(({ body }) => body),
    dialog,
  };
};

describe('flagging a design', () => {
  it('wants a reason, and sends what it is about: the revision, or a record of it', async () => {
    const { sent, dialog } = await open('member');
    await userEvent.click(dialog.getByRole('button', { name: 'Flag it' }));
    expect(dialog.getByText('Say what is wrong with it')).toBeInTheDocument();
    expect(dialog.queryByLabelText('Decide it now, with this reason')).toBeNull();
    await userEvent.selectOptions(dialog.getByLabelText('What it is about'), 'c1');
    await userEvent.type(dialog.getByLabelText('Reason'), 'It came loose.');
    await userEvent.click(dialog.getByRole('button', { name: 'Flag it' }));
    expect(await screen.findByText(/A moderator will look at it/)).toBeInTheDocument();
    expect(sent()).toEqual([{ designSlug: 'wedge', revision: 1, recordId: 'c1', reason: 'It came loose.' }]);
  });

  it('lets a moderator decide in the same step, with the same reason', async () => {
    const { sent, dialog } = await open('moderator');
    await userEvent.type(dialog.getByLabelText('Reason'), 'Too thin.');
    await userEvent.click(dialog.getByLabelText('Decide it now, with this reason'));
    await userEvent.click(dialog.getByRole('button', { name: 'Flag it' }));
    expect(dialog.getByText('Choose a decision')).toBeInTheDocument();
    // The settings are those of a record, and none is chosen.
    expect(dialog.queryByRole('radio', { name: /Withhold the settings/ })).toBeNull();
    await userEvent.click(dialog.getByRole('radio', { name: /Withhold the design/ }));
    await userEvent.click(dialog.getByRole('button', { name: /withhold the design/ }));
    await waitFor(() =>
      expect(sent()).toEqual([
        {
          designSlug: 'wedge',
          revision: 1,
          reason: 'Too thin.',
          decision: { action: 'withholdDesign', reason: 'Too thin.' },
        },
      ]),
    );
  });

  it('lets no moderator decide on their own design', async () => {
    const { dialog } = await open('moderator', { id: 'wren' });
    expect(dialog.queryByLabelText('Decide it now, with this reason')).toBeNull();
  });

  it('says why when the server refuses', async () => {
    const { dialog } = await open('member', { decision: { status: 409, current: flagOf({}) } });
    await userEvent.type(dialog.getByLabelText('Reason'), 'Again.');
    await userEvent.click(dialog.getByRole('button', { name: 'Flag it' }));
    expect(await dialog.findByRole('alert')).toHaveTextContent('Somebody was faster.');
  });
});
