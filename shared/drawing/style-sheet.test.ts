import { performance } from 'node:perf_hooks';
import { describe, expect, it } from 'vitest';
import { readDrawing } from './read.ts';

const page = (content: string) =>
  `<svg xmlns="http://www.w3.org/2000/svg" width="100mm" height="100mm" viewBox="0 0 100 100">${content}</svg>`;

/** Many times what it takes on a slow machine; a search that starts anew for each rule takes minutes. */
const AMPLE_MS = 5000;

describe('limits of style sheets', () => {
  const rules = 200_000;
  it.each([
    ['without a semicolon', `.hidden{display:none}${'.a{fill:red}'.repeat(rules)}`],
    ['with semicolons', `.hidden{display:none;}${'.a{fill:red;}'.repeat(rules)}`],
    ['as one list of selectors', `.hidden{display:none}${Array(rules).fill('.a').join()}{fill:red}`],
    ['as statements without a block', `.hidden{display:none}${'@layer a;'.repeat(rules)}`],
  ])('200 000 rules %s are capped and take linear time', (_name, css) => {
    const svgText = page(`<style>${css}</style><rect class="hidden" width="9" height="9"/><circle r="5"/>`);
    const before = performance.now();
    const result = readDrawing(svgText);
    expect(performance.now() - before).toBeLessThan(AMPLE_MS);
    expect(result.ok && result.drawing.shapes.map(({ source }) => source.element)).toEqual(['circle']);
    const codes = result.ok ? result.drawing.warnings.map(({ code }) => code) : [];
    expect(codes.includes('style-unread')).toBe(!css.includes('@layer'));
  });

  it('20 000 elements, each with classes of its own, against 2 000 rules for all', () => {
    const css = `${'*{fill:red}'.repeat(1999)}.hidden{display:none}`;
    const shapes = Array.from({ length: 20_000 }, (_, i) => `<path class="c${i}" d="M${i % 90} 0h1v1z"/>`);
    const before = performance.now();
    const result = readDrawing(page(`<style>${css}</style>${shapes.join('')}`));
    expect(performance.now() - before).toBeLessThan(AMPLE_MS);
    expect(result.ok && result.drawing.shapes).toHaveLength(20_000);
  });

  it('a style of a million brackets or quotes is read, not thrown on', () => {
    for (const mark of ['"', "'", '(', ')', ';']) {
      const style = mark.repeat(1_000_000).replaceAll('"', '&quot;');
      const result = readDrawing(page(`<rect width="9" height="9" style="${style}"/>`));
      expect(result.ok).toBe(true);
    }
  });
});
