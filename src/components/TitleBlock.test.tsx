import { render, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { TitleBlock } from './TitleBlock.tsx';

const revision = (number: number, changeNote: string, createdAt: string) => ({
  number,
  changeNote,
  by: 'wren',
  createdAt,
});

const show = (from?: string) =>
  render(
    <TitleBlock
      title="Shank drawer"
      drawingNumber="ML-0142"
      revisionNumber={3}
      createdAt="2026-10-12T23:30:00Z"
      scale="1 : 1.6"
      drawnBy="wren"
      lastCutBy={null}
      standingIn="MDF"
      standing="well proven"
      licence="CC-BY-SA-4.0"
      from={from}
      revisions={[
        revision(1, 'first issue', '2026-07-02T10:00:00Z'),
        revision(3, 'holes wider', '2026-10-12T23:30:00Z'),
        revision(2, 'long bay longer', '2026-08-30T10:00:00Z'),
      ]}
    />,
  );
const fieldValues = (label: string) =>
  screen.getAllByText(label, { selector: 'dt' }).map((term) => term.nextElementSibling?.textContent);

describe('TitleBlock', () => {
  it('fills the fields', () => {
    show();
    expect(fieldValues('Title')).toEqual(['Shank drawer']);
    expect(fieldValues('Drawing number')).toEqual(['ML-0142 / 3']);
    expect(fieldValues('Scale')).toEqual(['1 : 1.6']);
    expect(fieldValues('Drawn by')).toEqual(['wren']);
    expect(fieldValues('Last cut by')).toEqual(['nobody yet']);
    expect(fieldValues('Standing in MDF')).toEqual(['well proven']);
    expect(fieldValues('Licence')).toEqual(['CC-BY-SA-4.0']);
    expect(fieldValues('Date')).toEqual(['12 Oct 2026']);
    expect(screen.queryByText('From')).toBeNull();
  });

  it('names what it was remixed from', () => {
    show('ML-0031 / 2 by ada');
    expect(fieldValues('From')).toEqual(['ML-0031 / 2 by ada']);
  });

  it('lists revisions newest first', () => {
    show();
    const table = screen.getByRole('table', { name: 'Revisions, newest first' });
    const notes = within(table)
      .getAllByRole('row')
      .slice(1)
      .map((row) => within(row).getAllByRole('cell')[1]?.textContent);
    expect(notes).toEqual(['holes wider', 'long bay longer', 'first issue']);
  });
});
