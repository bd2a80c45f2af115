import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { writeCleanSvg } from './clean-svg.ts';
import { geometryText } from './geometry-text.ts';
import { outlineToPathData } from './path-data.ts';
import { readDrawing } from './read.ts';
import { scaleFromMeasuredSize } from './scale-readings.ts';
import { simplifiedOutline } from './simplified-outline.ts';
import type { Drawing } from './types.ts';

function read(svgText: string, millimetresPerUnit?: number): Drawing {
  const result = readDrawing(svgText, millimetresPerUnit === undefined ? {} : { millimetresPerUnit });
  if (!result.ok) throw new Error(result.refusal.message);
  return result.drawing;
}

const page = (content: string, size = 'width="200mm" height="100mm" viewBox="0 0 200 100"') =>
  `<svg xmlns="http://www.w3.org/2000/svg" ${size}>${content}</svg>`;

const TRAY = page(`<g><title>Pockets &amp; "rims"</title>
  <rect x="10" y="10" width="60" height="40" rx="5"/><circle cx="100" cy="30" r="12.5" transform="skewX(20) scale(1 0.7)"/></g>
  <g><title>Outside</title><path d="M2 2H150V90H2ZM20 60q10 -20 20 0t20 0c5 5 9 9 12 -3"/></g>
  <path d="M100 60a20 10 30 0 1 40 0a20 10 30 1 1 -40 0z" stroke="red"/>
  <ellipse cx="50" cy="75" rx="20" ry="5" transform="rotate(15 50 75) skewY(8)"/>`);

describe('clean SVG', () => {
  it('reads back as the same shapes, sizes and layers, moved by the corner of its page', () => {
    const drawing = read(TRAY);
    const again = read(writeCleanSvg(drawing, { title: 'Tray' }));
    expect(again.units).toEqual({ source: 'mm', millimetresPerUnit: { x: 1, y: 1 }, confirmed: true });
    expect(again.layers.map(({ name, shapeCount }) => [name, shapeCount])).toEqual(
      drawing.layers.map(({ name, shapeCount }) => [name, shapeCount]),
    );
    const moveX = 5 - drawing.boundsMm.minX;
    const moveY = 5 - drawing.boundsMm.minY;
    expect(again.shapes).toHaveLength(drawing.shapes.length);
    for (const layer of drawing.layers) {
      const originals = drawing.shapes.filter((shape) => shape.layerKey === layer.key);
      const copies = again.shapes.filter((shape) => shape.layerKey === layer.key);
      for (const [index, { boundsMm, lengthMm, outlines }] of originals.entries()) {
        const copy = copies[index]!;
        expect(copy.outlines.map(({ closed }) => closed)).toEqual(outlines.map(({ closed }) => closed));
        expect(Math.abs(copy.lengthMm - lengthMm)).toBeLessThan(1e-4);
        expect(Math.abs(copy.boundsMm.minX - boundsMm.minX - moveX)).toBeLessThan(1e-5);
        expect(Math.abs(copy.boundsMm.maxX - boundsMm.maxX - moveX)).toBeLessThan(1e-5);
        expect(Math.abs(copy.boundsMm.minY - boundsMm.minY - moveY)).toBeLessThan(1e-5);
        expect(Math.abs(copy.boundsMm.maxY - boundsMm.maxY - moveY)).toBeLessThan(1e-5);
      }
    }
  });

  it('marks the origin in a layer of its own that is not read as a shape', () => {
    const drawing = read(TRAY);
    const svgText = writeCleanSvg(drawing, { title: 'Tray', originMark: { x: 2, y: 90 } });
    expect(svgText).toContain('<g id="origin" data-role="origin"');
    expect(svgText).toContain('<title>origin</title>');
    const again = read(svgText);
    expect(again.layers.map(({ name }) => name)).not.toContain('origin');
    expect(again.warnings.map(({ code }) => code)).toContain('origin-mark');
    expect(again.widthMm).toBeCloseTo(drawing.widthMm, 5);
    expect(again.shapes).toHaveLength(drawing.shapes.length);
  });

  it('carries no markup from titles or names, and is the same text every time', () => {
    const drawing = read(
      page('<g><title>&lt;script&gt;</title><circle cx="9" cy="9" r="5" onclick="x()"/></g>'),
    );
    const svgText = writeCleanSvg(drawing, { title: '</title><script>&' });
    expect(svgText).not.toMatch(/<script|onclick/);
    expect(svgText).toContain('&amp;');
    expect(writeCleanSvg(read(TRAY), { title: 'a' })).toBe(writeCleanSvg(read(TRAY), { title: 'a' }));
  });

  it('can be read again whatever titles and labels hold: noncharacters, lone surrogates, markup', () => {
    const anyText = fc.oneof(
      fc.string({ unit: 'binary' }),
      fc
        .array(fc.integer({ min: 0, max: 0xffff }), { maxLength: 200 })
        .map((units) => String.fromCharCode(...units)),
      fc.constantFrom(
        '\ufffe',
        '\uffff',
        '\ufdd0',
        '\u{1fffe}',
        '\u{10ffff}',
        '\ud800',
        'a\udc00',
        ']]>',
        '&#xfffe;',
      ),
    );
    const drawing = read(page('<g><title>Holes</title><circle cx="9" cy="9" r="5"/></g>'));
    fc.assert(
      fc.property(anyText, anyText, (title, name) => {
        const layers = drawing.layers.map((layer) => ({ ...layer, name }));
        const svgText = writeCleanSvg({ ...drawing, layers }, { title });
        expect(svgText).not.toMatch(/[\p{Noncharacter_Code_Point}\p{Cs}]/u);
        const again = read(svgText);
        expect(again.shapes).toHaveLength(1);
        expect(again.warnings).toEqual([]);
      }),
      { numRuns: 500 },
    );
  });

  it('arcs under any transform come back in place', () => {
    const part = fc.integer({ min: -300, max: 300 }).map((hundredths) => hundredths / 100);
    fc.assert(
      fc.property(part, part, part, part, fc.integer({ min: 1, max: 60 }), (a, b, c, d, radius) => {
        fc.pre(Math.abs(a * d - b * c) > 0.05);
        const transform = `matrix(${[a, b, c, d, 0, 0].join(' ')})`;
        const original = read(
          page(`<path transform="${transform}" d="M0 0A${radius} 30 40 1 0 20 10A9 9 0 0 1 0 0z"/>`),
        );
        const pathData = original.shapes[0]!.outlines.map(outlineToPathData).join('');
        const copy = read(page(`<path d="${pathData}"/>`));
        for (const side of ['minX', 'minY', 'maxX', 'maxY'] as const) {
          expect(Math.abs(copy.boundsMm[side] - original.boundsMm[side])).toBeLessThan(1e-4);
        }
        expect(pathData).not.toMatch(/\d\.\d{10}|e/);
      }),
      { numRuns: 100 },
    );
  });

  it('an ellipse pressed flat is written as the lines it is', () => {
    const flat = read(page('<circle cx="50" cy="0" r="10" transform="scale(1 0.000001)"/>'));
    expect(
      read(page(`<path d="${outlineToPathData(flat.shapes[0]!.outlines[0]!)}"/>`)).boundsMm,
    ).toMatchObject({
      minX: expect.closeTo(40, 5),
      maxX: expect.closeTo(60, 5),
    });
  });
});

describe('simplified outline', () => {
  it('fits into 4 kB, keeps the size of the drawing, and keeps the largest outlines when it must leave some out', () => {
    const holes = Array.from(
      { length: 3000 },
      (_, i) => `<circle cx="${5 + (i % 60) * 3}" cy="${5 + Math.floor(i / 60) * 1.8}" r="0.8"/>`,
    );
    const drawing = read(page(`${holes.join('')}<rect width="200" height="100"/>`));
    const pathData = simplifiedOutline(drawing);
    expect(pathData.length).toBeLessThanOrEqual(4096);
    const simplified = read(page(`<path d="${pathData}"/>`));
    expect(simplified.warnings.map(({ code }) => code)).not.toContain('path-error');
    expect(Math.abs(simplified.widthMm - 200)).toBeLessThan(1);
    expect(Math.abs(simplified.heightMm - 100)).toBeLessThan(1);
    expect(simplified.shapes[0]!.outlines[0]!.closed).toBe(true);
  });

  it('of a simple drawing keeps every outline', () => {
    const drawing = read(TRAY);
    const outlines = drawing.shapes.flatMap((shape) => shape.outlines).length;
    const simplified = read(page(`<path d="${simplifiedOutline(drawing)}"/>`));
    expect(simplified.shapes[0]!.outlines).toHaveLength(outlines);
    expect(Math.abs(simplified.widthMm - drawing.widthMm)).toBeLessThan(0.4);
  });
});

describe('geometry text', () => {
  it('does not depend on names, layers, paint or the way the file is written', () => {
    const one = read(page('<g id="a"><title>x</title><rect x="1" y="2" width="3" height="4"/></g>'));
    const two = read(page('<path fill="red" transform="translate(1 2)" d="M0 0h3v4h-3z"/>'));
    expect(geometryText(one)).toBe(geometryText(two));
  });

  it.each([
    ['a point moved by 0.00001 mm', '<path d="M1 2h3v4.00001h-3z"/>'],
    ['an open outline', '<path d="M1 2h3v4h-3"/>'],
    ['another start', '<path d="M4 2v4h-3v-4z"/>'],
    ['a shape more', '<path d="M1 2h3v4h-3z"/><path d="M1 2h3v4h-3z"/>'],
  ])('tells %s', (_name, content) => {
    expect(geometryText(read(page(content)))).not.toBe(geometryText(read(page('<path d="M1 2h3v4h-3z"/>'))));
  });
});

describe('scale from a measured size', () => {
  const bare = (scale?: number) =>
    read(page('<rect x="9" width="60" height="30"/>', 'width="99" height="99"'), scale);

  it('makes the drawing as wide, or as high, as measured', () => {
    for (const side of ['width', 'height'] as const) {
      const scale = scaleFromMeasuredSize(bare(), 120, side);
      expect(
        scale.ok && bare(scale.millimetresPerUnit)[side === 'width' ? 'widthMm' : 'heightMm'],
      ).toBeCloseTo(120, 9);
    }
  });

  it('says why it cannot', () => {
    expect(scaleFromMeasuredSize(bare(), 0)).toMatchObject({ ok: false });
    expect(scaleFromMeasuredSize({ ...bare(), heightMm: 0 }, 120, 'height')).toMatchObject({ ok: false });
  });
});
