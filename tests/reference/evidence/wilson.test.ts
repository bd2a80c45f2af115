import { describe, expect, it } from 'vitest';
import { wilsonInterval } from '#shared/evidence/wilson-interval.ts';

/** Wilson 95 %, z 1.959964: worked from the formula, label C. */
const fromFormula = [
  [1, 1, 0.206549, 1],
  [3, 3, 0.438503, 1],
  [5, 5, 0.565518, 1],
  [6, 6, 0.609666, 1],
  [10, 10, 0.722467, 1],
  [9, 10, 0.59585, 0.982124],
  [8, 10, 0.490162, 0.943318],
  [0, 5, 0, 0.434482],
] as const;

/** Newcombe 1998, Table I, the score method, seen in a secondary copy: label S2. */
const printed = [
  [81, 263, 0.2553, 0.3662],
  [15, 148, 0.0624, 0.1605],
  [0, 20, 0, 0.1611],
  [1, 29, 0.0061, 0.1718],
] as const;

describe('the 95 % interval of votes for', () => {
  it.each(fromFormula)('%d of %d is %d to %d (formula, C)', (votesFor, votes, low, high) => {
    const interval = wilsonInterval(votesFor, votes);
    expect(Math.abs(interval.low - low)).toBeLessThanOrEqual(5.1e-7);
    expect(Math.abs(interval.high - high)).toBeLessThanOrEqual(5.1e-7);
  });

  it.each(printed)('%d of %d is %d to %d (Newcombe 1998, Table I, S2)', (votesFor, votes, low, high) => {
    const interval = wilsonInterval(votesFor, votes);
    expect(Math.abs(interval.low - low)).toBeLessThanOrEqual(5.1e-5);
    expect(Math.abs(interval.high - high)).toBeLessThanOrEqual(5.1e-5);
  });

  it('has the ends where the score test says so: (p − e)² = z² e (1 − e) / n', () => {
    const z = 1.959963984540054;
    for (let votes = 1; votes <= 40; votes += 1) {
      for (let votesFor = 0; votesFor <= votes; votesFor += 1) {
        const { low, high } = wilsonInterval(votesFor, votes);
        for (const end of [low, high]) {
          const left = (votesFor / votes - end) ** 2;
          expect(Math.abs(left - (z * z * end * (1 - end)) / votes)).toBeLessThan(1e-12);
        }
        expect(low).toBeLessThanOrEqual(votesFor / votes);
        expect(high).toBeGreaterThanOrEqual(votesFor / votes);
      }
    }
  });
});
