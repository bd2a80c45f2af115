import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { openPage } from '../../../tests/support/page.tsx';
import { answerReview, recordOf, sheetOf } from '../../../tests/support/review.ts';
import { Component } from '../design.tsx';

afterEach(() => vi.unstubAllGlobals());

const open = async (design: ReturnType<typeof sheetOf>, at = '/designs/wedge') => {
  answerReview([], { role: 'member', design });
  const page = openPage('/designs/:slug', Component, at);
  await screen.findByRole('img', { name: /^Drawing of Wedge/ });
  return page;
};
const takePanel = () => within(screen.getByRole('region', { name: 'Take it' }));

describe('the sheet of a design that moderators decided on', () => {
  it('says that it is withheld and why, hands out nothing, and offers no remix', async () => {
    await open(sheetOf({ withheld: { reason: 'Too thin at the screw.' } }));
    expect(screen.getByRole('region', { name: 'Withheld' })).toHaveTextContent('Too thin at the screw.');
    expect(screen.queryByRole('link', { name: /Take/ })).toBeNull();
    const button = takePanel().getByRole('button', { name: 'Take package' });
    expect(button).toBeDisabled();
    expect(button).toHaveAccessibleDescription(/Too thin at the screw\./);
    expect(screen.getByRole('button', { name: 'Remix this' })).toBeDisabled();
  });

  it('shows cautions, and still hands it out', async () => {
    await open(sheetOf({ cautions: [{ reason: 'Leave tabs.', decidedAt: '2026-10-02T10:00:00.000Z' }] }));
    expect(screen.getByRole('list', { name: 'Cautions' })).toHaveTextContent('caution Leave tabs.');
    expect(takePanel().getByRole('link', { name: 'Take package' })).toBeInTheDocument();
  });

  it('puts no withheld settings forward, and packs none when they are looked at', async () => {
    const held = recordOf({ id: 'held', settingsWithheld: { reason: '9 mm a pass.' } });
    const { unmount } = await open(sheetOf({ cuts: [held, recordOf({})] }));
    expect(takePanel().getByRole('link', { name: 'Take package' })).toHaveAttribute(
      'href',
      expect.stringContaining('recordId=c1'),
    );
    unmount();
    await open(sheetOf({ cuts: [held] }), '/designs/wedge?record=held');
    expect(screen.getByText('These settings are withheld.')).toBeInTheDocument();
    expect(takePanel().getByRole('button', { name: 'Take package' })).toBeDisabled();
    expect(takePanel().getByRole('link', { name: 'Take drawing' })).toHaveAttribute(
      'href',
      expect.not.stringContaining('recordId'),
    );
  });

  it('names what it was remixed from and what was remixed from it', async () => {
    await open(
      sheetOf({
        parent: {
          slug: 'stop',
          revision: 2,
          title: 'Stop',
          drawingNumber: 'ML-0003',
          ownerName: 'Fern',
        },
        remixes: [
          {
            slug: 'long-wedge',
            title: 'Long wedge',
            drawingNumber: 'ML-0120',
            ownerName: 'Tarn',
            fromRevision: 1,
            withheld: true,
          },
        ],
      }),
    );
    const lineage = within(screen.getByRole('region', { name: 'Lineage' }));
    expect(lineage.getByRole('link', { name: 'ML-0003 / 2 Stop' })).toHaveAttribute(
      'href',
      '/designs/stop?revision=2',
    );
    expect(lineage.getByRole('listitem')).toHaveTextContent(
      'ML-0120 Long wedge by Tarn from revision 1 withheld',
    );
    expect(screen.getByText('ML-0003 / 2 by Fern')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Remix this' })).toHaveAttribute(
      'href',
      '/share?remixOf=wedge&revision=1',
    );
  });

  it('leads from the revision table to an older drawing and back', async () => {
    const design = sheetOf();
    const [first] = design.revisions;
    if (first === undefined) throw new Error('the sheet has a revision');
    const second = { ...first, number: 2, changeNote: 'wider' };
    await open(
      { ...design, revision: { ...design.revision, number: 2 }, revisions: [second, first] },
      '/designs/wedge?revision=1',
    );
    expect(screen.getByText('This is the drawing of revision 1.')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('link', { name: 'Show revision 2' }));
    expect(screen.queryByText('This is the drawing of revision 1.')).toBeNull();
  });
});
