import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { csvText } from './csv.ts';

// Expected texts are written by the rules of RFC 4180, section 2.

describe('CSV', () => {
  it.each([
    ['plain cells', [['a', 1, undefined]], 'a,1,\r\n'],
    ['two rows', [['a'], ['b']], 'a\r\nb\r\n'],
    ['a comma', [['a,b']], '"a,b"\r\n'],
    ['quotes', [['say "a"']], '"say ""a"""\r\n'],
    ['a line break', [['a\nb']], '"a\nb"\r\n'],
    ['a number below zero', [[-1.5]], '-1.5\r\n'],
    ['text that could be a formula', [['=1+1', '+1', '-1', '@a', '\ta']], "'=1+1,'+1,'-1,'@a,'\ta\r\n"],
    ['a formula with a comma', [['=SUM(A1,A2)']], '"\'=SUM(A1,A2)"\r\n'],
  ])('%s', (_what, rows, text) => {
    expect(csvText(rows)).toBe(text);
  });

  it('never starts a text cell with a sign of a formula', () => {
    fc.assert(
      fc.property(fc.string(), (cell) => {
        const text = csvText([[cell]]).replace(/^"/, '');
        expect('=+-@\t').not.toContain(text.charAt(0) || 'none');
      }),
    );
  });
});
