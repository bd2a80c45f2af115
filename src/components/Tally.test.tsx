import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { Standing } from '#shared/api/designs.ts';
import { Tally } from './Tally.tsx';

const standing = (votesFor: number, votesAgainst: number): Standing => ({
  material: 'mdf',
  word: 'proven',
  votesFor,
  votesAgainst,
  low: 0.490162,
  high: 0.943318,
});
const groups = (container: HTMLElement) =>
  [...container.querySelectorAll('[data-strokes]')].map((group) =>
    Number(group.getAttribute('data-strokes')),
  );
/** Lines drawn: every `M` starts one. */
const linesOf = (group: Element | undefined) =>
  (group?.querySelector('path')?.getAttribute('d')?.match(/M/g) ?? []).length;

describe('Tally', () => {
  it('counts in fives, the fifth across the four', () => {
    const { container } = render(<Tally standing={standing(7, 0)} />);
    expect(groups(container)).toEqual([5, 2]);
    const [five, two] = container.querySelectorAll('[data-strokes]');
    expect(linesOf(five)).toBe(5);
    expect(linesOf(two)).toBe(2);
  });

  it('keeps votes against in a group of their own, and says both in words', () => {
    const { container } = render(<Tally standing={standing(4, 1)} />);
    expect(groups(container)).toEqual([4, 1]);
    expect(screen.getByRole('img', { name: '4 for, 1 against' })).toBeInTheDocument();
    expect(screen.getByText('proven')).toBeInTheDocument();
    expect(screen.getByText('in MDF', { exact: false })).toBeInTheDocument();
  });

  it('writes the interval beside the strokes on request', () => {
    // check-values.md, evidence: 8 of 10 → .490162–.943318 (C).
    render(<Tally standing={standing(8, 2)} withInterval />);
    expect(screen.getByText('8 of 10 for; 95 % interval 49–94 %')).toBeInTheDocument();
  });

  it('writes what nobody would count', () => {
    const { container } = render(<Tally standing={standing(43, 0)} />);
    expect(groups(container)).toEqual([5, 5, 5, 5, 5, 5]);
    expect(screen.getByText('+13')).toBeInTheDocument();
    expect(screen.getByRole('img', { name: '43 for, 0 against' })).toBeInTheDocument();
  });

  it('says uncut without strokes', () => {
    const { container } = render(<Tally standing={null} />);
    expect(groups(container)).toEqual([]);
    expect(screen.getByText('uncut')).toBeInTheDocument();
  });
});
