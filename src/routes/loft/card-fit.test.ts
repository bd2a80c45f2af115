import { describe, expect, it } from 'vitest';
import { designItem, machineOf, ownBit } from '../../../tests/support/design.ts';
import { cardFit } from './card-fit.ts';

// A bed of 300 x 180 with 4 mm margins: 292 x 172 to cut in. The 6.35 bit runs round the outside, so a
// part may be 285.65 x 165.65 (292 - 6.35, 172 - 6.35). C: computed in the comments.
const machine = machineOf({ bedXMm: 300, bedYMm: 180 });
const fitOf = (widthMm: number, heightMm: number, bits = [ownBit(6.35)], system: 'mm' | 'in' = 'mm') =>
  cardFit(designItem({ widthMm, heightMm }), machine, bits, system);

describe('the fit sentence of a card', () => {
  it('says how the part lies', () => {
    expect(fitOf(285.6, 165.6)).toEqual({ result: 'fits', sentence: 'Fits as drawn', turnDeg: 0 });
    expect(fitOf(165.6, 285.6)).toEqual({ result: 'fits', sentence: 'Fits turned 90°', turnDeg: 90 });
  });

  it('gives the turn of a batten that fits on no side', () => {
    // 306 long: cos a · 306 + sin a · 16 <= 285.65 from about 24° on.
    const { result, sentence, turnDeg } = fitOf(306, 16);
    expect(result).toBe('fits');
    expect(sentence).toMatch(/^Fits only turned \d\d°$/);
    const angle = ((turnDeg ?? 0) * Math.PI) / 180;
    expect(306 * Math.cos(angle) + 16 * Math.sin(angle)).toBeLessThanOrEqual(285.65 + 0.011);
    expect(306 * Math.sin(angle) + 16 * Math.cos(angle)).toBeLessThanOrEqual(165.65 + 0.011);
  });

  it('says by how much a part is too large, in the units in use', () => {
    // A square of 200: 200 - 165.65 = 34.35 too high whichever way (turning only makes it larger), up to 34.4.
    expect(fitOf(200, 200)).toEqual({
      result: 'doesNotFit',
      sentence: 'At least 34.4 mm too large for this bed',
      turnDeg: null,
    });
    expect(fitOf(200, 200, [], 'in').sentence).toBe('At least 1.354 in too large for this bed');
  });

  it('names the bit that the drawer lacks, but holds an empty drawer against nothing', () => {
    expect(fitOf(100, 100, [ownBit(8)]).sentence).toBe('Fits as drawn; needs a 6.35 mm bit');
    expect(fitOf(100, 100, [ownBit(8)]).result).toBe('fitsIf');
    expect(fitOf(100, 100, [ownBit(8), ownBit(6.35)]).sentence).toBe('Fits as drawn');
    expect(fitOf(100, 100, []).sentence).toBe('Fits as drawn');
  });
});
