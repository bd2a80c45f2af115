import { describe, expect, it } from 'vitest';
import { sayAge } from './say-age.ts';

const now = new Date('2026-12-01T12:00:00.000Z');

describe('how long ago something was', () => {
  it.each([
    ['2026-12-01T11:59:30.000Z', 'a moment'],
    ['2026-12-01T12:00:30.000Z', 'a moment'],
    ['2026-12-01T11:59:00.000Z', '1 minute'],
    ['2026-12-01T10:59:00.000Z', '1 hour'],
    ['2026-11-30T12:00:00.000Z', '1 day'],
    ['2026-10-24T12:00:00.000Z', '38 days'],
    ['2026-09-01T12:00:00.000Z', '2 months'],
    ['2025-11-15T12:00:00.000Z', '12 months'],
    ['2024-11-30T12:00:00.000Z', '2 years'],
  ])('tells %s as %s', (iso, words) => {
    expect(sayAge(iso, now)).toBe(words);
  });
});
