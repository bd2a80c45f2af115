import { describe, expect, it } from 'vitest';
import { boundsOf, page, read } from './support.ts';

const BOX = '<rect width="10" height="10" fill="none"/>';
const codes = (svgText: string) => read(svgText).warnings.map(({ code }) => code);

describe('what cannot be cut is told, and the file is still read', () => {
  it.each([
    ['text', page(`${BOX}<text x="5" y="5">Hi</text>`), 'text-not-outlines'],
    [
      'an image',
      page(`${BOX}<image href="data:image/png;base64,AA" width="5" height="5"/>`),
      'image-left-out',
    ],
    ['an embedded page', page(`${BOX}<foreignObject><p/></foreignObject>`), 'foreign-object'],
    ['a gradient', page('<rect width="9" height="9" fill="url(#g)"/>'), 'gradient-or-pattern'],
    ['a filter', page('<rect width="9" height="9" filter="url(#f)"/>'), 'filter'],
    ['a clip path', page(`<g clip-path="url(#c)">${BOX}</g>`), 'clip-or-mask'],
    ['a mask in a style', page('<rect width="9" height="9" style="mask:url(#m)"/>'), 'clip-or-mask'],
    ['a script', page(`<script>alert(1)</script>${BOX}`), 'script'],
    ['a script address', page(`<a href="javascript:alert(1)">${BOX}</a>`), 'script'],
    ['an event handler', page('<rect width="9" height="9" onclick="alert(1)"/>'), 'event-handler'],
    ['an external copy', page(`${BOX}<use href="other.svg#a"/>`), 'external-reference'],
    ['an external image', page(`${BOX}<image href="http://127.0.0.1/a.png"/>`), 'external-reference'],
    [
      'an external fill',
      page('<rect width="9" height="9" fill="url(http://127.0.0.1/#g)"/>'),
      'external-reference',
    ],
    [
      'an imported style',
      page(`<style>@import "http://127.0.0.1/a.css";</style>${BOX}`),
      'external-reference',
    ],
    ['a style sheet instruction', `<?xml-stylesheet href="a.css"?>${page(BOX)}`, 'external-reference'],
    ['an animation', page(`<rect width="9" height="9"><animate attributeName="x"/></rect>`), 'animation'],
    ['a wide stroke', page('<path d="M0 0h9" fill="none" stroke="red" stroke-width="3"/>'), 'wide-stroke'],
    ['an open outline', page('<path d="M0 0h9v9"/>'), 'open-outline'],
    ['ends that nearly meet', page('<path d="M0 0h9v9h-9v-8.95"/>'), 'small-gap'],
    ['a segment of no length', page('<path d="M0 0h9v0v9z"/>'), 'zero-length'],
    [
      'a shape drawn twice, the other way round',
      page('<path d="M0 0h9v9z"/><path d="M9 9V0H0z"/>'),
      'doubled-shape',
    ],
    ['a rect of no width', page(`${BOX}<rect width="0" height="9"/>`), 'flat-shape'],
    [
      'a shape scaled to nothing',
      page(`${BOX}<rect width="9" height="9" transform="scale(1 0)"/>`),
      'flat-shape',
    ],
    ['an unknown unit', page(`<rect width="9furlong" height="9"/>`), 'unknown-unit'],
    [
      'different scale across and down',
      page(BOX, 'width="100mm" height="50mm" viewBox="0 0 10 10" preserveAspectRatio="none"'),
      'non-uniform-scale',
    ],
    [
      'a page size that is no length',
      page(BOX, 'width="wide" height="10mm" viewBox="0 0 10 10"'),
      'bad-page-size',
    ],
    ['a viewBox of three numbers', page(BOX, 'width="10mm" height="10mm" viewBox="0 0 10"'), 'bad-page-size'],
    [
      'a plain DOCTYPE',
      `<!DOCTYPE svg PUBLIC "-//W3C//DTD SVG 1.1//EN" "svg11.dtd">${page(BOX)}`,
      'doctype-dropped',
    ],
    [
      'an internal subset without entities',
      `<!DOCTYPE svg [<!ATTLIST a b CDATA ">]">]>${page(BOX)}`,
      'doctype-dropped',
    ],
    ['a copy of nothing', page(`${BOX}<use href="#gone"/>`), 'missing-reference'],
    ['a rule that is not read', page(`<style>g > rect{display:none}</style>${BOX}`), 'style-unread'],
    ['a wrong transform', page('<rect width="9" height="9" transform="rotate(ten)"/>'), 'transform-error'],
    ['points that go wrong', page('<polyline points="0,0 9,0 9,x"/>'), 'path-error'],
    ['an odd coordinate', page('<polyline points="0,0 9,0 9"/>'), 'path-error'],
  ])('%s', (_name, svgText, code) => {
    expect(codes(svgText)).toContain(code);
  });

  it('a plain closed shape has nothing to tell', () => {
    expect(codes(page(BOX))).toEqual([]);
    expect(codes(page('<path d="M0 0h9M0 9L9 0" fill="none" stroke="red" stroke-width=".2"/>'))).toEqual([
      'open-outline',
    ]);
    expect(codes(page('<path d="M0 0L9 9"/><path d="M0 9L9 0"/>'))).not.toContain('doubled-shape');
  });

  it('hidden text is not told', () => {
    expect(codes(page(`${BOX}<text display="none">Hi</text>`))).toEqual([]);
  });

  it('a broken path is read up to its error, and the place is the character itself', () => {
    const svgText = page('\n  <path id="p" fill="none"\n    d="M10 10 L20 20\n L30 x 40 40"/>');
    const drawing = read(svgText);
    expect(boundsOf(drawing)).toEqual([10, 10, 20, 20]);
    const error = drawing.warnings.find(({ code }) => code === 'path-error');
    expect(error).toMatchObject({ line: 4, column: 6, shapeKey: 's1' });
    expect(svgText.split('\n')[3]?.charAt(5)).toBe('x');
    expect(error?.message).toContain('“x”');
  });

  it.each([
    ['M10 10 L20 20 Z 5 5', [10, 10, 20, 20]],
    ['M10 10 20 20,', [10, 10, 20, 20]],
    ['M10 10,,20 20 L0 0', undefined],
    ['M10 10 L20 20 L30. 40', [10, 10, 20, 20]],
    ['M10 10 L20 20 A5 5 0 2 1 40 40', [10, 10, 20, 20]],
    ['M10 10 H20 V', [10, 10, 20, 10]],
    ['L10 10 20 20', undefined],
  ])('the path %s stops where the SVG 2 grammar does', (pathData, expected) => {
    const drawing = read(page(`<path d="${pathData}"/><circle cx="15" cy="15" r="1"/>`));
    expect(drawing.warnings.some(({ code }) => code === 'path-error')).toBe(true);
    const path = drawing.shapes.find(({ source }) => source.element === 'path')?.boundsMm;
    expect(path && [path.minX, path.minY, path.maxX, path.maxY]).toEqual(expected);
  });

  it('many warnings of one kind are counted, not repeated without end', () => {
    const drawing = read(page('<path d="M0 0h9 x"/>'.repeat(300)));
    expect(drawing.warnings.length).toBeLessThan(30);
    expect(drawing.warnings.map(({ message }) => message).join()).toContain('280 more');
  });
});
