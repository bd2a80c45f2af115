import { describe, expect, it } from 'vitest';
import { extentsAsDrawn, turnedExtents } from '#shared/geometry/turned-extents.ts';
import { readBytes } from './read.ts';
import type { ReadDrawing } from './result.ts';

const svg = (body: string, attributes = 'width="400mm" height="300mm" viewBox="0 0 400 300"') =>
  `<svg xmlns="http://www.w3.org/2000/svg" ${attributes}>${body}</svg>`;
const read = (text: string): ReadDrawing => {
  const result = readBytes(Buffer.from(text), { title: 'A <plate>' });
  if (!result.ok) throw new Error(result.refusal.message);
  return result.read;
};

describe('the text of a file', () => {
  const plate = svg('<rect width="10" height="20"/>');

  it('is read with a byte order mark', () => {
    expect(readBytes(Buffer.from(`\ufeff${plate}`), {}).ok).toBe(true);
  });

  it.each([
    ['Latin-1', Buffer.from(plate.replace('<rect', '<title>caf\u00e9</title><rect'), 'latin1')],
    ['UTF-16 with its mark', Buffer.from(`\ufeff${plate}`, 'utf16le')],
    ['UTF-16 without a mark', Buffer.from(plate, 'utf16le')],
    ['UTF-16 in network order', Buffer.from(`\ufeff${plate}`, 'utf16le').swap16()],
  ])('is refused in %s, saying to save as UTF-8', (_name, bytes) => {
    const result = readBytes(bytes, {});
    expect(result).toMatchObject({ ok: false, refusal: { code: 'not-utf8' } });
    expect(!result.ok && result.refusal.message).toContain('Save it as UTF-8');
  });

  it('is refused for what the reader refuses', () => {
    expect(readBytes(Buffer.from(''), {})).toMatchObject({ ok: false, refusal: { code: 'empty' } });
  });
});

describe('what is worked out of a drawing', () => {
  it('measures the geometry, not the page, and writes each shape', () => {
    const { inspection } = read(svg('<rect x="30" y="40" width="100" height="60"/><path d="M50 50H80"/>'));
    expect(inspection).toMatchObject({ widthMm: 100, heightMm: 60, shapeCount: 2 });
    // Perimeter 2·(100 + 60), and the line of 30.
    expect(inspection.lengthMm).toBeCloseTo(350, 9);
    expect(inspection.geometry.shapes.map(({ closed }) => closed)).toEqual([true, false]);
    expect(inspection.geometry.hullMm).toEqual(
      expect.arrayContaining([
        { x: 30, y: 40 },
        { x: 130, y: 100 },
      ]),
    );
    expect(inspection.geometry.hullMm).toHaveLength(4);
  });

  it('gives a clean drawing that reads back the same, and an outline of at most 4 kB', () => {
    const circles = Array.from(
      { length: 400 },
      (_, i) => `<circle cx="${i}" cy="${i % 290}" r="${3 + (i % 5)}"/>`,
    );
    const drawn = read(svg(circles.join('')));
    const again = read(drawn.cleanSvg);
    expect(drawn.cleanSvg).toContain('<title>A ‹plate›</title>');
    expect(again.inspection.widthMm).toBeCloseTo(drawn.inspection.widthMm, 5);
    expect(again.inspection.lengthMm).toBeCloseTo(drawn.inspection.lengthMm, 2);
    expect(Buffer.byteLength(drawn.outline)).toBeLessThanOrEqual(4096);
    expect(drawn.outline).toMatch(/^M/);
  });

  it('tells geometries apart, and not words', () => {
    const text = (body: string) => read(svg(body)).geometryText;
    const rect = '<rect width="100" height="60"/>';
    expect(text(`<g id="other">${rect}</g>`)).toBe(text(rect));
    expect(text('<rect width="100" height="60.1"/>')).not.toBe(text(rect));
  });

  it('has a hull as wide as the bounds, and round where the drawing is round', () => {
    const { hullMm } = read(svg('<circle cx="200" cy="150" r="150.0075"/>')).inspection.geometry;
    expect(extentsAsDrawn(hullMm).widthMm).toBeCloseTo(300.015, 9);
    // A disc is as wide in every direction; a chord may cut off 0.01 mm on each side.
    for (const angleRad of [0.3, 0.77, 1.2]) {
      const { widthMm } = turnedExtents(hullMm, angleRad);
      expect(widthMm).toBeLessThan(300.0153);
      expect(widthMm).toBeGreaterThan(300.015 - 0.021);
    }
  });

  it('has the same hull whether small shapes inside are drawn first or last', () => {
    const big = '<path d="M0 0L300 20L250 280L20 200Z"/>';
    const small = '<circle cx="150" cy="120" r="9"/><rect x="60" y="60" width="30" height="30"/>';
    const hull = (body: string) => read(svg(body)).inspection.geometry.hullMm;
    expect(hull(small + big)).toEqual(hull(big + small));
    expect(hull(big + small)).toHaveLength(4);
  });
});
