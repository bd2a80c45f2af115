import { describe, expect, it } from 'vitest';
import { readDrawing } from './read.ts';
import type { Drawing } from './types.ts';

const page = (content: string, attributes = 'width="200mm" height="100mm" viewBox="0 0 200 100"') =>
  `<svg xmlns="http://www.w3.org/2000/svg" xmlns:xlink="http://www.w3.org/1999/xlink" xmlns:ed="urn:ed" ${attributes}>${content}</svg>`;

function read(svgText: string): Drawing {
  const result = readDrawing(svgText);
  if (!result.ok) throw new Error(result.refusal.message);
  return result.drawing;
}

function expectBounds(content: string, expected: number[], attributes?: string): void {
  const { minX, minY, maxX, maxY } = read(page(content, attributes)).boundsMm;
  for (const [index, value] of [minX, minY, maxX, maxY].entries())
    expect(value).toBeCloseTo(expected[index]!, 9);
}

describe('basic shapes (SVG 2, Shapes)', () => {
  it.each([
    ['<rect x="1" y="2" width="30" height="20"/>', [1, 2, 31, 22], 100],
    // Radii past half a side are clamped; auto takes the other radius: a rounded square is a circle.
    ['<rect width="20" height="20" rx="50"/>', [0, 0, 20, 20], 20 * Math.PI],
    ['<rect width="30" height="20" rx="5"/>', [0, 0, 30, 20], 60 + 10 * Math.PI],
    ['<rect width="30" height="20" ry="5" rx="auto"/>', [0, 0, 30, 20], 60 + 10 * Math.PI],
    ['<rect width="30" height="20" rx="0" ry="5"/>', [0, 0, 30, 20], 100],
    ['<circle cx="10" cy="12" r="5"/>', [5, 7, 15, 17], 10 * Math.PI],
    ['<ellipse cx="10" cy="12" rx="5" ry="5"/>', [5, 7, 15, 17], 10 * Math.PI],
    ['<line x1="3" y1="4" x2="6" y2="8"/>', [3, 4, 6, 8], 5],
    ['<polyline points="0,0 3,0 3,4"/>', [0, 0, 3, 4], 7],
    ['<polygon points="0 0 3 0 3 4"/>', [0, 0, 3, 4], 12],
    [
      '<rect x="10%" y="10%" width="50%" height="1cm"/>',
      [20, 10, 120, 10 + (10 * 96) / 25.4],
      200 + (20 * 96) / 25.4,
    ],
    ['<rect style="width:30px;height:20px" width="1" height="1"/>', [0, 0, 30, 20], 100],
  ])('%s', (content, bounds, lengthMm) => {
    expectBounds(content, bounds);
    expect(read(page(content)).lengthMm / lengthMm).toBeCloseTo(1, 9);
  });

  it('a percentage of a radius refers to the diagonal over √2', () => {
    const radius = 0.1 * Math.sqrt((200 * 200 + 100 * 100) / 2);
    expectBounds('<circle r="10%"/>', [-radius, -radius, radius, radius]);
  });

  it('circles and ellipses are one closed exact arc, lines are open', () => {
    const circle = read(page('<circle r="5"/>')).shapes[0]!.outlines[0]!;
    expect(circle).toMatchObject({ closed: true, segments: [{ kind: 'arc', sweepAngleRad: 2 * Math.PI }] });
    expect(read(page('<line x2="9"/>')).shapes[0]!.outlines[0]!.closed).toBe(false);
    expect(read(page('<path d="M0 0h9v9L0 0"/>')).shapes[0]!.outlines[0]!.closed).toBe(true);
  });
});

describe('transforms', () => {
  it.each([
    ['translate(10)', [10, 0, 14, 2]],
    ['translate(10,20)', [10, 20, 14, 22]],
    ['translate(10 20) scale(2)', [10, 20, 18, 24]],
    ['scale(2 3)', [0, 0, 8, 6]],
    ['rotate(90)', [-2, 0, 0, 4]],
    ['rotate(90 10 10)', [18, -10 + 10, 20, 4]],
    ['rotate(-90),translate(-4,0)', [0, 0, 2, 4]],
    ['skewX(45)', [0, 0, 6, 2]],
    ['skewY(45)', [0, 0, 4, 6]],
    ['matrix(0 1 -1 0 5 6)', [3, 6, 5, 10]],
  ])('attribute %s', (transform, bounds) => {
    expectBounds(`<rect width="4" height="2" transform="${transform}"/>`, bounds);
  });

  it.each([
    ['rotate(90deg)', [-2, 0, 0, 4]],
    ['rotate(0.25turn)', [-2, 0, 0, 4]],
    ['rotate(100grad)', [-2, 0, 0, 4]],
    ['rotate(1.5707963267948966rad)', [-2, 0, 0, 4]],
    ['translate(50%, 10px)', [100, 10, 104, 12]],
    ['scaleX(2) scaleY(0.5)', [0, 0, 8, 1]],
    ['translateX(3px)translateY(1mm)', [3, 96 / 25.4, 7, 2 + 96 / 25.4]],
    ['skew(45deg)', [0, 0, 6, 2]],
    ['none', [0, 0, 4, 2]],
    ['rotate(180deg); transform-origin: 4px 2px', [4, 2, 8, 4]],
    ['rotate(180deg); transform-origin: right bottom', [396, 198, 400, 200]],
  ])('style %s wins over the attribute', (transform, bounds) => {
    expectBounds(
      `<rect width="4" height="2" transform="translate(99)" style="transform: ${transform}"/>`,
      bounds,
    );
  });

  it('arcs stay exact under a skew: a circle of r 10 skewed 45° reaches 10·√2 across', () => {
    expectBounds('<circle r="10" transform="skewX(45)"/>', [-10 * Math.SQRT2, -10, 10 * Math.SQRT2, 10]);
  });

  it('groups nest', () => {
    expectBounds(
      '<g transform="translate(10 0)"><g transform="scale(2)"><rect width="4" height="2"/></g></g>',
      [10, 0, 18, 4],
    );
  });
});

describe('structure', () => {
  const star = '<defs><path id="s" d="M0 0h4v2h-4z"/></defs>';
  it.each([
    ['use moves', `${star}<use href="#s" x="10" y="20"/>`, [10, 20, 14, 22]],
    [
      'xlink:href, transform before x',
      `${star}<use xlink:href="#s" x="10" transform="scale(2)"/>`,
      [20, 0, 28, 4],
    ],
    [
      'a symbol has its own viewBox and takes its size from use',
      '<symbol id="y" viewBox="0 0 4 2"><path d="M0 0h4v2h-4z"/></symbol><use href="#y" x="10" width="40" height="40"/>',
      [10, 10, 50, 30],
    ],
    [
      'a nested svg is a viewport',
      '<svg x="10" y="10" width="40" height="20" viewBox="5 5 4 2"><rect x="5" y="5" width="4" height="2"/></svg>',
      [10, 10, 50, 30],
    ],
    [
      'a nested svg without viewBox moves only',
      '<svg x="10" y="5"><rect width="4" height="2"/></svg>',
      [10, 5, 14, 7],
    ],
    [
      'percentages refer to the nearest viewport',
      '<svg width="40" height="20" viewBox="0 0 8 4"><rect width="50%" height="50%"/></svg>',
      [0, 0, 20, 10],
    ],
    [
      'switch draws its first child that may be shown',
      '<switch><foreignObject requiredExtensions="x"/><rect width="4" height="2"/><rect width="90" height="90"/></switch>',
      [0, 0, 4, 2],
    ],
    ['a link is a group', '<a href="#x"><rect width="4" height="2"/></a>', [0, 0, 4, 2]],
    [
      'clip paths, markers and patterns are not drawn',
      '<clipPath id="c"><rect width="99" height="99"/></clipPath><marker><path d="M0 0h99"/></marker><pattern><path d="M0 0h99"/></pattern><rect width="4" height="2"/>',
      [0, 0, 4, 2],
    ],
    [
      'what is in a comment or CDATA is not markup',
      '<!-- a > "b <rect width="99" height="99"/> --><desc><![CDATA[<rect>]]></desc><rect width="4" height="2"/>',
      [0, 0, 4, 2],
    ],
    ['character references in values', '<path d="M0&#32;0h4&#x20;v2h-4z"/>', [0, 0, 4, 2]],
    [
      'elements of other namespaces',
      '<ed:rect width="99" height="99"/><rect width="4" height="2"/>',
      [0, 0, 4, 2],
    ],
  ])('%s', (_name, content, bounds) => {
    expectBounds(content, bounds);
  });

  it('a prefix for the SVG namespace', () => {
    const result = readDrawing(
      '<s:svg xmlns:s="http://www.w3.org/2000/svg" width="10mm" height="10mm" viewBox="0 0 10 10"><s:g><s:rect width="4" height="2"/></s:g></s:svg>',
    );
    expect(result.ok && result.drawing.widthMm).toBe(4);
  });
});

describe('display, visibility and style rules', () => {
  const hidden = '<rect width="99" height="99"';
  it.each([
    [
      'display none takes the subtree out',
      `<g display="none"><rect display="inline" width="99" height="99"/></g>`,
    ],
    ['display none in a style', `${hidden} style="display:none"/>`],
    [
      'visibility inherits and may be shown again',
      `<g visibility="hidden">${hidden}/><rect visibility="visible" width="4" height="2"/></g>`,
    ],
    ['a class rule', `<style>.off{display:none}</style>${hidden} class="on off"/>`],
    [
      'an id rule over a class rule',
      `<style>#x{display:none} .a{display:inline}</style>${hidden} id="x" class="a"/>`,
    ],
    [
      'a class rule over an element rule',
      `<style>.a{visibility:hidden} rect{visibility:visible}</style>${hidden} class="a"/>`,
    ],
    [
      'a later rule over an earlier one',
      `<style>.a{display:inline} .a{display:none}</style>${hidden} class="a"/>`,
    ],
    [
      'a list of selectors in CDATA',
      `<style><![CDATA[ /* { */ .b, rect.a { display : none } ]]></style>${hidden} class="a"/>`,
    ],
    [
      'a rule over a presentation attribute',
      `<style>.a{display:none}</style>${hidden} class="a" display="inline"/>`,
    ],
    [
      'an important rule over the style attribute',
      `<style>.a{display:none!important}</style>${hidden} class="a" style="display:inline"/>`,
    ],
  ])('%s', (_name, content) => {
    expectBounds(`${content}<rect width="4" height="2"/>`, [0, 0, 4, 2]);
  });

  it('the style attribute over a rule', () => {
    expectBounds(
      '<style>.a{display:none}</style><rect class="a" style="display:inline" width="9" height="9"/>',
      [0, 0, 9, 9],
    );
  });

  it('display none on an ancestor in defs does not hide a copy', () => {
    expectBounds(
      '<defs><g display="none"><rect id="r" width="4" height="2"/></g></defs><use href="#r"/>',
      [0, 0, 4, 2],
    );
  });
});

describe('layers', () => {
  const names = (content: string) =>
    read(page(content)).layers.map(({ name, shapeCount }) => [name, shapeCount]);

  it('group by the nearest labelled group, else by paint', () => {
    expect(
      names(
        '<g ed:label="Pockets"><rect width="1" height="1"/><g id="g12"><rect width="2" height="1"/></g></g>' +
          '<g><title>Holes</title><circle r="1"/></g>' +
          '<rect width="3" height="1" stroke="RED"/><rect width="4" height="1" style="stroke:#f00"/><rect width="5" height="1"/>',
      ),
    ).toEqual([
      ['Pockets', 2],
      ['Holes', 1],
      ['Stroke #ff0000', 2],
      ['Fill #000000', 1],
    ]);
  });

  it('names are plain text: no markup, control or direction characters, not endless', () => {
    const [[name]] = names(`<g ed:label="&lt;b&gt;A&#9;&#x202e;B&lt;/b&gt;"><circle r="1"/></g>`) as [
      [string],
    ];
    expect(name).toBe('‹b›A B‹/b›');
    const [[long]] = names(`<g ed:label="${'x'.repeat(5000)}"><circle r="1"/></g>`) as [[string]];
    expect(Array.from(long)).toHaveLength(80);
  });
});

describe('scale', () => {
  const size = (attributes: string) => read(page('<rect width="100" height="50"/>', attributes));

  it.each([
    ['width="100" height="50" viewBox="0 0 100 50"', 'px'],
    ['width="100px" height="50px"', 'px'],
    // A physical page without a viewBox says nothing of the units inside: 96 an inch is assumed.
    ['width="100mm" height="100mm"', 'px'],
    ['width="4in"', 'px'],
    ['width="100mm" height="100mm" viewBox="0 0 100"', 'px'],
    ['width="100%" height="100%" viewBox="0 0 100 50"', 'percent'],
    ['viewBox="0 0 100 50"', 'none'],
    ['', 'none'],
  ])('%s is not confirmed and allows four readings', (attributes, source) => {
    const drawing = size(attributes);
    expect(drawing.units).toMatchObject({ source, confirmed: false });
    expect(drawing.scaleReadings.map(({ name, widthMm, heightMm }) => [name, widthMm, heightMm])).toEqual([
      ['mm', expect.closeTo(100, 9), expect.closeTo(50, 9)],
      ['96 an inch', expect.closeTo((100 * 25.4) / 96, 9), expect.closeTo((50 * 25.4) / 96, 9)],
      ['90 an inch', expect.closeTo((100 * 25.4) / 90, 9), expect.closeTo((50 * 25.4) / 90, 9)],
      ['72 an inch', expect.closeTo((100 * 25.4) / 72, 9), expect.closeTo((50 * 25.4) / 72, 9)],
    ]);
    for (const reading of drawing.scaleReadings) {
      const result = readDrawing(page('<rect width="100" height="50"/>', attributes), {
        millimetresPerUnit: reading.millimetresPerUnit,
      });
      expect(result.ok && result.drawing.widthMm).toBeCloseTo(reading.widthMm, 9);
      expect(result.ok && result.drawing.units).toMatchObject({ source: 'stated', confirmed: true });
    }
  });

  it('a missing side follows the viewBox', () => {
    const drawing = size('width="200mm" viewBox="0 0 100 50"');
    expect([drawing.widthMm, drawing.heightMm, drawing.units.confirmed]).toEqual([200, 100, true]);
  });

  it('physical size without viewBox: a user unit is a CSS pixel', () => {
    expect(size('width="100mm" height="50mm"').widthMm).toBeCloseTo((100 * 25.4) / 96, 9);
  });
});
