import { Resvg } from '@resvg/resvg-js';
import { SaxesParser } from 'saxes';
import { describe, expect, it, vi } from 'vitest';
import { readDrawing } from '#shared/drawing/read.ts';
import { sheets } from './all.ts';
import { writeSvg } from './svg.ts';

/** CSS Values and Units, absolute lengths (S2); a bare number is read as a 96th of an inch there. */
const mmPerPageUnit: Readonly<Record<string, number>> = {
  mm: 1,
  cm: 10,
  in: 25.4,
  pt: 25.4 / 72,
  px: 25.4 / 96,
  // Not CSS: this file's owner states 90 units an inch.
  '': 25.4 / 90,
};

/** What the owner states when sharing a file without a physical unit. */
const statedScales: Readonly<Record<string, { millimetresPerUnit: number } | undefined>> = {
  px: { millimetresPerUnit: 25.4 / 96 },
  'bare-90': { millimetresPerUnit: 25.4 / 90 },
};

/** The extents of the geometry as another library sees them, in mm, without strokes. */
function sizeByResvg(text: string): { widthMm: number; heightMm: number; leftMm: number; topMm: number } {
  const root = /width="([\d.]+)([a-z]*)" height="[^"]+" viewBox="\S+ \S+ (\S+) /.exec(text);
  const perUnit = (Number(root?.[1]) * mmPerPageUnit[root?.[2] ?? '']!) / Number(root?.[3]);
  const filled = text
    .replaceAll(/ stroke="[^"]*"/g, '')
    .replaceAll(/fill="none"/g, 'fill="#000"')
    .replace(/fill:none;stroke:#000/, 'fill:#000');
  const box = new Resvg(filled).getBBox();
  if (!box) throw new Error('resvg found nothing to draw');
  return {
    widthMm: box.width * perUnit,
    heightMm: box.height * perUnit,
    leftMm: box.x * perUnit,
    topMm: box.y * perUnit,
  };
}

describe('the drawings of the demo club', () => {
  it('have a key each', () => {
    expect(new Set(sheets.map((sheet) => sheet.key)).size).toBe(sheets.length);
    expect(sheets.length).toBeGreaterThanOrEqual(22);
  });

  it('come out the same text on a second run', async () => {
    const first = sheets.map(writeSvg);
    vi.resetModules();
    const again = await import('./all.ts');
    const writer = await import('./svg.ts');
    expect(again.sheets).not.toBe(sheets);
    expect(again.sheets.map(writer.writeSvg)).toEqual(first);
  });

  describe.each(sheets.map((sheet) => ({ key: sheet.key, sheet })))('$key', ({ sheet }) => {
    const text = writeSvg(sheet);

    it('is well-formed, with one id a group and no number gone wrong', () => {
      const ids: string[] = [];
      const parser = new SaxesParser();
      parser.on('error', (error) => {
        throw error;
      });
      parser.on('opentag', (tag) => {
        if (tag.attributes['id'] !== undefined) ids.push(tag.attributes['id']);
      });
      parser.write(text).close();
      expect(ids.length).toBeGreaterThanOrEqual(sheet.layers.length);
      expect(new Set(ids).size).toBe(ids.length);
      expect(text).not.toMatch(/NaN|Infinity|undefined|\de[+-]/);
    });

    it('has the stated size, its corner at 0, 0, as resvg measures it', () => {
      const size = sizeByResvg(text);
      // resvg draws arcs as cubics: up to 2.7253e-4 of the radius outside the arc (Riškus 2006, S2).
      const slackMm = 0.001 + 2.7253e-4 * (Math.min(sheet.widthMm, sheet.heightMm) / 2);
      expect(Math.abs(size.widthMm - sheet.widthMm)).toBeLessThan(slackMm);
      expect(Math.abs(size.heightMm - sheet.heightMm)).toBeLessThan(slackMm);
      expect(Math.abs(size.leftMm)).toBeLessThan(slackMm);
      expect(Math.abs(size.topMm)).toBeLessThan(slackMm);
    });

    it('is read at the stated size, with one layer an operation and no warning but of scored lines', () => {
      const scale = statedScales[sheet.unit ?? 'mm'];
      const result = readDrawing(text, scale);
      if (!result.ok) throw new Error(result.refusal.message);
      const { drawing } = result;
      expect(drawing.widthMm).toBeCloseTo(sheet.widthMm, 3);
      expect(drawing.heightMm).toBeCloseTo(sheet.heightMm, 3);
      expect(drawing.units.confirmed).toBe(true);
      expect(drawing.layers.map((layer) => layer.name)).toEqual(sheet.layers.map((layer) => layer.name));
      const scored = sheet.layers.some((layer) => layer.shapes.some((shape) => shape.kind === 'line'));
      expect(drawing.warnings.map((warning) => warning.code)).toEqual(scored ? ['open-outline'] : []);
    });

    it('is confirmed by its file exactly when it has a physical unit', () => {
      const result = readDrawing(text);
      expect(result.ok && result.drawing.units.confirmed).toBe(
        statedScales[sheet.unit ?? 'mm'] === undefined,
      );
    });
  });
});
