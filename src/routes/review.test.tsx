import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Flag } from '#shared/api/flags.ts';
import { openPage } from '../../tests/support/page.tsx';
import { answerReview, flagOf, sheetOf } from '../../tests/support/review.ts';
import { Component as ReviewPage } from './review.tsx';
import { Component as FlagPage } from './review-flag.tsx';

afterEach(() => vi.unstubAllGlobals());

const decisionOf = (change: Partial<NonNullable<Flag['decision']>> = {}) => ({
  action: 'withholdRevision' as const,
  reason: 'Only 3 mm is left under the screw.',
  decidedBy: { id: 'ada', name: 'Ada' },
  decidedAt: '2026-10-02T10:00:00.000Z',
  ...change,
});

const openFlag = async (flag: Flag, options: Parameters<typeof answerReview>[1] = {}) => {
  const sent = answerReview([flag], options);
  const page = openPage('/review/:flag', FlagPage, `/review/${flag.id}`);
  await screen.findByRole('heading', { level: 1, name: 'Wedge' });
  await screen.findByRole('img', { name: /^Drawing of Wedge/ });
  return { sent, ...page };
};
const decisions = (sent: readonly { call: string; body: unknown }[]) =>
  sent.filter(({ call }) => call.endsWith('/decision'));
const form = () => within(screen.getByRole('form', { name: 'Decide' }));

describe('the review desk', () => {
  it('lists what waits with its level, reason, raiser and takes, and keeps the tab in the address', async () => {
    answerReview([
      flagOf({ id: 'grave', level: 'do-not-cut', reason: 'It came loose.', takeCount: 3 }),
      flagOf({ id: 'done', state: 'decided', reason: 'Too thin.', decision: decisionOf() }),
    ]);
    const { router } = openPage('/review', ReviewPage, '/review');
    const queue = within(await screen.findByRole('list', { name: 'Open flags' }));
    const [row] = queue.getAllByRole('listitem');
    expect(queue.getAllByRole('listitem')).toHaveLength(1);
    for (const words of ['do not cut', 'It came loose.', 'flagged by Tarn', 'taken by 3 members'])
      expect(row).toHaveTextContent(words);
    await userEvent.click(screen.getByRole('link', { name: 'Decided' }));
    expect(router.state.location.search).toBe('?tab=decided');
    expect(await screen.findByRole('list', { name: 'Decided flags' })).toHaveTextContent(
      'Ada withheld the revision: Only 3 mm is left under the screw.',
    );
  });

  it('says that the chain of the audit log is broken', async () => {
    answerReview([], { chainIsWhole: false });
    openPage('/review', ReviewPage, '/review?tab=audit');
    expect(await screen.findByRole('alert')).toHaveTextContent('The chain is broken.');
    expect(screen.getByRole('list', { name: 'Audit log' })).toHaveTextContent('flag.decided by you');
  });

  it('shows a member nothing of it', async () => {
    const sent = answerReview([flagOf({})], { role: 'member' });
    openPage('/review', ReviewPage, '/review');
    expect(await screen.findByText('This desk is for moderators')).toBeInTheDocument();
    expect(sent.map(({ call }) => call)).not.toContain('GET /api/flags?state=open');
  });
});

describe('deciding a flag', () => {
  it('asks for a decision and a reason, says who is told, and sends the version that was read', async () => {
    const { sent } = await openFlag(flagOf({ version: 4 }));
    await userEvent.click(form().getByRole('button', { name: 'Decide' }));
    expect(form().getByText('Choose a decision')).toBeInTheDocument();
    expect(form().getByText('Say why: members read it')).toBeInTheDocument();
    expect(decisions(sent)).toEqual([]);
    // No record is flagged and nothing is withheld: these two would do nothing.
    expect(form().queryByRole('radio', { name: /Withhold the settings/ })).toBeNull();
    expect(form().queryByRole('radio', { name: /Restore/ })).toBeNull();
    await userEvent.click(form().getByRole('radio', { name: /Withhold the revision/ }));
    expect(form().getByText(/Tarn, who raised the flag and everyone who took this revision/)).toBeVisible();
    await userEvent.type(form().getByLabelText('Reason'), ' Too thin. ');
    await userEvent.click(form().getByRole('button', { name: 'Withhold the revision' }));
    await waitFor(() => expect(decisions(sent)).toHaveLength(1));
    expect(decisions(sent)[0]).toEqual({
      call: 'POST /api/flags/f1/decision',
      body: { action: 'withholdRevision', reason: 'Too thin.', version: 4 },
    });
  });

  it('shows what the other moderator did when both decided at once, and keeps my reason', async () => {
    const theirs = flagOf({ state: 'decided', version: 2, decision: decisionOf() });
    await openFlag(flagOf({}), { decision: { status: 409, current: theirs } });
    await userEvent.click(form().getByRole('radio', { name: /Dismiss/ }));
    await userEvent.type(form().getByLabelText('Reason'), 'It holds for me.');
    await userEvent.click(form().getByRole('button', { name: 'Dismiss' }));
    const alert = await screen.findByRole('alert');
    expect(alert).toHaveTextContent('Ada decided this before you');
    expect(alert).toHaveTextContent('Ada withheld the revision');
    expect(alert).toHaveTextContent('Only 3 mm is left under the screw.');
    expect(alert).toHaveTextContent('Your reason was: It holds for me.');
  });

  it('leaves my own design to another moderator', async () => {
    await openFlag(flagOf({ ownerId: 'me' }));
    expect(screen.getByText(/another moderator must decide/)).toBeInTheDocument();
    expect(screen.queryByRole('form')).toBeNull();
  });

  it('offers only to restore what a decided flag withheld', async () => {
    await openFlag(flagOf({ state: 'decided', decision: decisionOf() }), {
      design: sheetOf({ withheld: { reason: 'Too thin.' } }),
    });
    expect(form().getAllByRole('radio')).toHaveLength(1);
    expect(form().getByRole('radio', { name: /Restore/ })).toBeInTheDocument();
  });

  it('shows the figures and the source of what a rule found', async () => {
    const { raisedBy: _nobody, ...byRule } = flagOf({ level: 'do-not-cut' });
    await openFlag({
      ...byRule,
      finding: {
        ruleId: 'depth-of-cut',
        title: 'Depth of cut',
        level: 'do-not-cut',
        sentence: '9 mm a pass is too deep.',
        advice: 'Take at most 3 mm.',
        figures: [{ name: 'Depth of cut', value: 9, unit: 'mm' }],
        source: 'A handbook',
      },
    });
    const finding = within(screen.getByRole('region', { name: 'Finding: Depth of cut' }));
    expect(finding.getByText('9 mm')).toBeInTheDocument();
    expect(finding.getByText('Source: A handbook')).toBeInTheDocument();
    expect(screen.getByText('raised by the rule “Depth of cut”')).toBeInTheDocument();
  });
});
