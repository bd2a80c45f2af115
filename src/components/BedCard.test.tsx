import { render, screen } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import type { DesignListItem } from '#shared/api/designs.ts';
import type { Bed } from '../drawing/bed-view.ts';
import { BedCard } from './BedCard.tsx';

const machine: Bed = {
  bedXMm: 300,
  bedYMm: 180,
  marginMm: { left: 4, right: 4, front: 4, back: 4 },
  clampStripMm: 0,
};

const item = (widthMm: number, heightMm: number): DesignListItem => ({
  id: '01890000-0000-7000-8000-000000000001',
  slug: 'wedge',
  drawingNumber: 'ML-0098',
  title: 'Wedge hold-down',
  summary: '',
  kind: 'hold-downs',
  licence: 'CC-BY-4.0',
  tags: [],
  owner: { id: '01890000-0000-7000-8000-000000000002', name: 'wren' },
  version: 1,
  cautions: [],
  createdAt: '2026-07-02T10:00:00Z',
  standing: [
    { material: 'mdf', word: 'cut-once', votesFor: 1, votesAgainst: 0, low: 0.2, high: 1 },
    { material: 'plywood', word: 'proven', votesFor: 3, votesAgainst: 0, low: 0.43, high: 1 },
  ],
  revision: {
    number: 2,
    geometryHash: 'hash',
    drawing: { widthMm, heightMm, boundsMm: { minX: 0, minY: 0, maxX: widthMm, maxY: heightMm } },
  },
  outline: `M0 0L${widthMm} 0L${widthMm} ${heightMm}L0 ${heightMm}Z`,
  hullMm: [
    { x: 0, y: 0 },
    { x: widthMm, y: 0 },
    { x: widthMm, y: heightMm },
    { x: 0, y: heightMm },
  ],
  cut: { bitMm: 6.35, bitKind: 'up-cut', materialId: 'plywood', stockThicknessMm: 12, runTimeS: 840 },
});

const show = (design: DesignListItem, turnDeg = 0, bed: Bed | null = machine) =>
  render(
    <MemoryRouter>
      <BedCard
        item={design}
        machine={bed}
        fit={{ result: 'fits', sentence: 'Fits as drawn', turnDeg }}
        href="/designs/wedge"
      />
    </MemoryRouter>,
  );
const drawing = () => screen.getByRole('img', { name: /Wedge hold-down,/ });
const scaleOf = (svg: HTMLElement) =>
  /scale\(([\d.]+)\)/.exec(
    svg.querySelector('g[transform^="translate"]')?.getAttribute('transform') ?? '',
  )?.[1];

describe('BedCard', () => {
  it('links to the design and says its standing, facts and fit', () => {
    show(item(110, 35));
    expect(screen.getByRole('link', { name: 'Wedge hold-down' })).toHaveAttribute('href', '/designs/wedge');
    expect(screen.getByText('proven')).toBeInTheDocument();
    expect(screen.getByText('6.35 mm bit · 14 min · 12 mm stock')).toBeInTheDocument();
    expect(screen.getByText('Fits as drawn')).toBeInTheDocument();
    expect(screen.getByText('ML-0098 · rev 2')).toBeInTheDocument();
  });

  it('hatches what hangs over what margins leave of the bed', () => {
    // 300 less 4 and 4 is 292.
    show(item(292.5, 100));
    expect(drawing()).toHaveAttribute('data-overhang', 'true');
    expect(drawing()).toHaveAccessibleName(/hangs over the bed/);
    expect(drawing().querySelector('clipPath')).not.toBeNull();
  });

  it('hatches nothing that fits to the last hundredth', () => {
    show(item(292, 172));
    expect(drawing()).toHaveAttribute('data-overhang', 'false');
    expect(drawing().querySelector('pattern')).toBeNull();
  });

  it('shows a part turned when it fits only so', () => {
    // 306 × 16 at 25°: 306 cos 25° + 16 sin 25° = 284.09 wide, 306 sin 25° + 16 cos 25° = 143.82 high.
    show(item(306, 16), 0);
    expect(drawing()).toHaveAttribute('data-overhang', 'true');
    show(item(306, 16), 25);
    const [, turned] = screen.getAllByRole('img', { name: /Wedge hold-down,/ });
    expect(turned).toHaveAttribute('data-overhang', 'false');
  });

  it('draws every card at the scale of the bed', () => {
    show(item(20, 10));
    show(item(412, 150));
    const [small, large] = screen.getAllByRole('img', { name: /Wedge hold-down,/ });
    expect(small && scaleOf(small)).toBeDefined();
    expect(small && scaleOf(small)).toBe(large && scaleOf(large));
  });

  it('draws the bed with its two sizes, and the part alone when there is no machine', () => {
    const { unmount } = show(item(110, 35));
    expect(screen.getByText('300')).toBeInTheDocument();
    expect(screen.getByText('180')).toBeInTheDocument();
    unmount();
    show(item(110, 35), 0, null);
    expect(screen.getByText('110')).toBeInTheDocument();
    expect(drawing()).toHaveAttribute('data-overhang', 'false');
  });
});
