import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import type { CutRecord } from '#shared/api/cuts.ts';
import { cutRecordOf } from '../../../../tests/support/cut.ts';
import { EvidenceTally } from './EvidenceTally.tsx';
import { RecordsList } from './RecordsList.tsx';

const show = (records: CutRecord[], state: unknown = null) =>
  render(
    <QueryClientProvider client={new QueryClient()}>
      <MemoryRouter initialEntries={[{ pathname: '/', state }]}>
        <RecordsList
          evidence={{ ofThis: records, ofOthers: [] }}
          recordHref="/designs/wedge/record?revision=2"
          memberId="me"
          chosenId={null}
          onChoose={() => undefined}
        />
      </MemoryRouter>
    </QueryClientProvider>,
  );
const many = (count: number) =>
  Array.from({ length: count }, (_, place) =>
    cutRecordOf({ id: `r${place}`, member: { id: `m${place}`, name: `Member ${place}` } }),
  );

describe('the records of a design', () => {
  it('tells what was measured beside what is drawn, what went wrong, and how the part holds', () => {
    show([
      cutRecordOf({
        outcome: 'usable',
        wentWrong: ['not-zeroed', 'part-came-loose', 'tear-out'],
        measured: [{ drawnMm: 12, measuredMm: 11.9 }],
        overridePercent: 80,
        inService: { result: 'broke', notes: 'At the neck.', notedAt: '2026-09-01T10:00:00.000Z' },
      }),
    ]);
    const record = within(screen.getByRole('article', { name: 'Wren’s cut of 1 Aug 2026' }));
    expect(record.getByText('Hazard: part came loose.')).toBeInTheDocument();
    expect(record.getByText('own slip: not zeroed.')).toBeInTheDocument();
    expect(record.getByText(/No moderator has settled this hazard yet/)).toBeInTheDocument();
    expect(record.getAllByRole('cell').map((cell) => cell.textContent)).toEqual(['12.00', '11.90', '−0.10']);
    expect(record.getByText('80 %')).toBeInTheDocument();
    expect(record.getByText(/rpm, feed/)).toBeInTheDocument();
    expect(record.getByText(/Broke in use/).parentElement).toHaveTextContent('At the neck.');
    // Not mine: nothing of it is for me to change.
    expect(record.queryByRole('link', { name: 'Correct' })).toBeNull();
  });

  it('lets me correct my own, and marks the one just recorded', () => {
    const own = cutRecordOf({ id: 'own', member: { id: 'me', name: 'Tarn' } });
    show([own], { recorded: 'own' });
    expect(screen.getByRole('link', { name: 'Correct' })).toHaveAttribute(
      'href',
      '/designs/wedge/record?correct=own',
    );
    expect(screen.getByRole('button', { name: 'How does it hold?' })).toBeInTheDocument();
    expect(screen.getByRole('status')).toHaveTextContent('Your record is in.');
    expect(screen.getByRole('article')).toHaveFocus();
  });

  it('folds a long list away, but never a record that must not be cut again', async () => {
    const grave = cutRecordOf({
      id: 'grave',
      member: { id: 'g', name: 'Grave' },
      findings: [
        {
          ruleId: 'deeper-than-stock',
          title: 'Deeper than the stock',
          level: 'do-not-cut',
          sentence: 'It is deeper than the stock.',
          advice: 'Cut less deep.',
          figures: [{ name: 'depth', value: 14, unit: 'mm' }],
          source: 'common practice, no published source',
        },
      ],
    });
    show([...many(9), grave]);
    const names = () =>
      screen.getAllByRole('article').map((record) => within(record).getByRole('heading').textContent);
    expect(names()).toHaveLength(7);
    expect(names().at(-1)).toContain('Grave');
    expect(screen.getByText('do not cut')).toBeInTheDocument();
    expect(screen.getByText(/depth 14 mm · common practice/)).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Show all 10 records' }));
    expect(names()).toHaveLength(10);
  });

  it('writes out no settings that a moderator withheld', () => {
    show([cutRecordOf({ settingsWithheld: { reason: 'Far too fast.' } })]);
    expect(screen.getByText('Far too fast.')).toBeInTheDocument();
    expect(screen.queryByText(/rpm, feed/)).toBeNull();
    expect(screen.queryByRole('button', { name: 'Show these settings' })).toBeNull();
  });
});

describe('the tally of a design', () => {
  it('says why it is disputed, and what is set aside', () => {
    const hazard = cutRecordOf({ id: 'h', wentWrong: ['bit-broke'] });
    const slip = cutRecordOf({ id: 's', outcome: 'failed', wentWrong: ['not-zeroed'] });
    render(
      <EvidenceTally
        // Wilson, 1 of 1: 0.2065 to 1 (check-values.md, M).
        standing={[
          { material: 'plywood', word: 'disputed', votesFor: 1, votesAgainst: 0, low: 0.2065, high: 1 },
        ]}
        records={[hazard, slip]}
      />,
    );
    expect(
      screen.getByText('Disputed: no moderator has settled the hazard: bit broke (Wren, 1 Aug 2026).'),
    ).toBeInTheDocument();
    expect(screen.getByText(/^1 record shown and not counted/)).toBeInTheDocument();
    expect(screen.getByText('1 of 1 for; 95 % interval 21–100 %')).toBeInTheDocument();
  });
});
