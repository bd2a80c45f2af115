import { describe, expect, it } from 'vitest';
import { boundsOf, furthest, page, read, refusalOf } from './support.ts';

/**
 * Expected bounds are those that Debian's Chromium gives (C: getBoundingClientRect of the element in a
 * file of its own, page 200 × 100), for a rect of 4 × 2 unless it says otherwise.
 */
const size = 'width="200mm" height="100mm" viewBox="0 0 200 100"';
const drawn = (content: string) => read(page(content, size));
const codes = (content: string) => drawn(content).warnings.map(({ code }) => code);
const rect = (attributes: string) => `<rect width="4" height="2" ${attributes}/>`;
function expectBounds(content: string, expected: readonly number[]): void {
  expect(furthest(boundsOf(drawn(content)), expected)).toBeLessThan(1e-6);
}

describe('the transform attribute takes no units and no functions of CSS', () => {
  it.each([
    'rotate(30deg)',
    'rotate(0.25turn)',
    'translate(10px 5px)',
    'translate(10px,5px)',
    'translate(10%)',
    'translateX(3)',
    'scaleX(2)',
    'scale(50%)',
    'skew(20)',
    'skewx(20)',
    'ROTATE(30)',
    'rotate(30 10)',
    'matrix(1 0 0 1 5px 5)',
    'matrix(1,0,0,1,5)',
    'scale(2 3 4)',
    'translate(1 2),,scale(2)',
    'translate(1 2),',
    ',translate(1 2)',
    'translate()',
    'translate(5,)',
    'constructor(1)',
  ])('%s is an error: none is applied, and it is told', (transform) => {
    const content = rect(`transform="${transform}"`);
    expectBounds(content, [0, 0, 4, 2]);
    expect(codes(content)).toContain('transform-error');
  });

  it.each([
    ['translate(10 , 5)', [10, 5, 14, 7]],
    ['translate(1 2),scale(2)', [1, 2, 9, 6]],
    ['translate(1 2)scale(2)', [1, 2, 9, 6]],
    ['scale (2)', [0, 0, 8, 4]],
    ['none', [0, 0, 4, 2]],
  ])('%s is read', (transform, expected) => {
    const content = rect(`transform="${transform}"`);
    expectBounds(content, expected);
    expect(codes(content)).toEqual([]);
  });
});

describe('the transform of a style needs units and commas', () => {
  it.each([
    'translate(10,5)',
    'translate(10px 5px)',
    'rotate(30)',
    'rotate(30px)',
    'rotate(30deg,10px,10px)',
    'rotate (30deg)',
    'scale(2 3)',
    'scale(2px)',
    'skewX(20)',
    'matrix(1 0 0 1 5 5)',
    'matrix(1,0,0,1,5px,5px)',
    'translate(1px,2px),scale(2)',
  ])('%s is dropped, so that the attribute counts, and told', (transform) => {
    for (const content of [
      rect(`transform="translate(99)" style="transform:${transform}"`),
      `<style>.a{transform:${transform}}</style>${rect('class="a" transform="translate(99)"')}`,
    ]) {
      expectBounds(content, [99, 0, 103, 2]);
      expect(codes(content)).toContain('transform-error');
    }
  });

  it.each([
    ['rotate(0)', [0, 0, 4, 2]],
    ['translate(0,5px)', [0, 5, 4, 7]],
    ['translate(10PX)', [10, 0, 14, 2]],
    ['translate(10%,5%)', [20, 5, 24, 7]],
    ['scale(50%)', [0, 0, 2, 1]],
    ['scale(2,3)', [0, 0, 8, 6]],
    ['matrix(1,0,0,1,5,5)', [5, 5, 9, 7]],
    ['translate(1px,2px)scale(2)', [1, 2, 9, 6]],
    ['translate(1px,2px) scale(2)', [1, 2, 9, 6]],
    ['translate(1e1px)', [10, 0, 14, 2]],
    ['none', [0, 0, 4, 2]],
    ['initial', [0, 0, 4, 2]],
  ])('%s is read, and wins over the attribute', (transform, expected) => {
    const content = rect(`transform="translate(99)" style="transform:${transform}"`);
    expectBounds(content, expected);
    expect(codes(content)).toEqual([]);
  });

  it.each([
    'translate3d(1px,2px,0)',
    'rotateX(60deg)',
    'translate(calc(5px + 1px),0)',
    'translate(1em)',
    'var(--x)',
    'inherit',
  ])('%s is valid but not read: told', (transform) => {
    expect(codes(rect(`style="transform:${transform}"`))).toContain('style-unread');
  });
});

describe('properties of a style that move or shape what is cut', () => {
  it.each([
    'transform-box:fill-box;transform:rotate(90deg);transform-origin:center',
    'rotate:90deg',
    'translate:5px 6px',
    'scale:2',
    "d:path('M0 0h50v50z')",
    "offset-path:path('M0 0h50')",
    'ROTATE : 90deg !important',
    'all:revert',
    'width:calc(10px + 5px)',
    'x:var(--x)',
    'display:var(--x)',
  ])('%s is not read and told, in an attribute and in a rule', (style) => {
    const other = '<circle r="1"/>';
    expect(codes(`${rect(`style="${style}"`)}${other}`)).toContain('style-unread');
    expect(codes(`<style>rect{${style}}</style>${rect('')}${other}`)).toContain('style-unread');
  });

  it.each([
    'transform-box:view-box',
    'rotate:none',
    'translate:none',
    'scale:none',
    'opacity:.5;font-family:d',
  ])('%s changes nothing and is not told', (style) => {
    expect(codes(rect(`style="${style}"`))).toEqual([]);
  });

  it.each([
    ['<rect style="x:10;y:5px;width:4px;height:2" x="1"/>', [10, 5, 14, 7]],
    ['<rect style="width:30;height:20px" width="1" height="1"/>', [0, 0, 30, 20]],
    ['<circle style="cx:20px;cy:10px;r:7" r="3"/>', [13, 3, 27, 17]],
    ['<ellipse style="cx:20px;cy:10px;rx:5px;ry:2px"/>', [15, 8, 25, 12]],
    ['<style>rect{x:10px}</style><rect width="4" height="2" x="1"/>', [10, 0, 14, 2]],
  ])('geometry in %s is read', (content, expected) => {
    expectBounds(content, expected);
    expect(codes(content)).toEqual([]);
  });

  it.each([
    [rect('style="width:-5px"'), [0, 0, 4, 2]],
    [rect('style="width:9furlong"'), [0, 0, 4, 2]],
    ['<circle style="r:-7px" r="3"/>', [-3, -3, 3, 3]],
    [rect('style="transform-origin:4 2" transform="rotate(180)"'), [-4, -2, 0, 0]],
    [rect('style="visibility:foo"'), [0, 0, 4, 2]],
  ])('the invalid declaration of %s is dropped and told', (content, expected) => {
    expectBounds(content, expected);
    expect(codes(content)).toContain('style-unread');
  });

  it('a size of the root in its style wins over the attribute', () => {
    const drawing = read(page(rect(''), `style="width:50mm;height:25mm" ${size}`));
    expect(drawing.widthMm).toBeCloseTo(1, 9);
    expect(read(page(rect(''), `style="width:100%" ${size}`)).units.confirmed).toBe(false);
  });
});

describe('font units', () => {
  it.each([
    ['<rect width="2em" height="2"/>', 32],
    ['<rect width="2em" height="2" font-size="10"/>', 20],
    ['<g font-size="10"><rect width="2em" height="2"/></g>', 20],
    ['<g font-size="10"><rect width="2em" height="2" font-size="50%"/></g>', 10],
    ['<g style="font-size:1mm"><rect width="2em" height="2"/></g>', (2 * 96) / 25.4],
    ['<rect width="2em" height="2" style="font:bold 10px/2 serif"/>', 20],
    ['<rect width="2em" height="2" font-size="2em"/>', 64],
    ['<rect width="2em" height="2" font-size="large"/>', 36],
    ['<rect width="2rem" height="2" font-size="10"/>', 32],
    ['<g font-size="10"><rect width="2em" height="2" font-size="initial"/></g>', 32],
  ])('%s', (content, widthMm) => {
    expectBounds(content, [0, 0, widthMm, 2]);
    expect(codes(content)).toEqual([]);
  });

  it.each([
    '<rect width="2ex" height="2"/>',
    '<rect width="2ch" height="2"/>',
    '<rect width="2em" height="2" style="font-size:calc(1px + 2px)"/>',
    '<g font-size="larger"><rect width="2em" height="2" font-size="2em"/></g>',
  ])('%s depends on a font that is not known: told', (content) => {
    expect(codes(content)).toContain('font-unit');
  });
});

describe('lengths that are not plain', () => {
  it.each(['calc(10px + 5px)', 'var(--width)', '4 px px'])('%s is told as such, not as no size', (width) => {
    const found = codes(`<rect width="${width}" height="2"/><circle r="1"/>`);
    expect(found).toContain('length-unread');
    expect(found).not.toContain('flat-shape');
  });
});

describe('keywords', () => {
  it.each([
    `<g visibility="hidden">${rect('visibility="initial"')}</g>`,
    `<g visibility="hidden">${rect('style="visibility:initial"')}</g>`,
    `<g visibility="hidden">${rect('visibility="VISIBLE"')}</g>`,
    `<style>rect{visibility:hidden}</style>${rect('style="visibility:initial"')}`,
    `<style>rect{display:none}</style>${rect('style="display:initial"')}`,
    rect('display="initial"'),
    rect('visibility="foo"'),
  ])('%s is seen', (content) => {
    expectBounds(content, [0, 0, 4, 2]);
  });

  it.each([
    rect('visibility="HIDDEN"'),
    rect('style="visibility:Hidden"'),
    rect('visibility="collapse"'),
    rect('display="NONE"'),
    rect('style="display:foo" display="none"'),
    `<g visibility="hidden">${rect('style="visibility:revert"')}</g>`,
    `<g visibility="hidden">${rect('style="visibility:foo"')}</g>`,
  ])('%s is not', (content) => {
    expect(refusalOf(page(content, size)).code).toBe('no-shapes');
  });
});
