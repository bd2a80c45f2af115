import { BoundsBox } from './bounds.ts';
import { ORIGIN_ROLE } from './draw-element.ts';
import { REPORT_LIMITS } from './limits.ts';
import { formatMm, shapeToPathData } from './path-data.ts';
import { plainText } from './plain-text.ts';
import type { Drawing, DrawingShape, Point } from './types.ts';

export interface CleanSvgOptions {
  readonly title: string;
  /** Where the origin mark stands, in page millimetres of the drawing; none when left out. */
  readonly originMark?: Point;
  /** Empty border around the geometry, mm. */
  readonly marginMm?: number;
}

const MARGIN_MM = 5;
/** Half the length of the origin mark's arms: within the margin when it stands on the bounds. */
const ORIGIN_ARM_MM = 4;

/**
 * The drawing as an SVG of our own in true millimetres: one user unit is one millimetre, one group a
 * layer with id and title, nothing of the member's markup. Coordinates are the drawing's own page
 * millimetres; the page is its bounds and a margin, so a reader that counts from the page's corner
 * sees everything moved by that corner. The origin mark is a layer of its own with
 * `data-role="origin"`, which `readDrawing` does not take for a shape. Same drawing, same bytes.
 */
export function writeCleanSvg(drawing: Drawing, options: CleanSvgOptions): string {
  const box = new BoundsBox();
  box.addBounds(drawing.boundsMm);
  if (options.originMark) box.add(options.originMark.x, options.originMark.y);
  const margin = options.marginMm ?? MARGIN_MM;
  const width = formatMm(box.maxX - box.minX + 2 * margin);
  const height = formatMm(box.maxY - box.minY + 2 * margin);
  const viewBox = `${formatMm(box.minX - margin)} ${formatMm(box.minY - margin)} ${width} ${height}`;
  const lines = [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}mm" height="${height}mm" viewBox="${viewBox}">`,
    `<title>${escapeXml(plainText(options.title, REPORT_LIMITS.layerNameCharacters * 2))}</title>`,
  ];
  const byLayer = new Map<string, DrawingShape[]>(drawing.layers.map((layer) => [layer.key, []]));
  for (const shape of drawing.shapes) byLayer.get(shape.layerKey)?.push(shape);
  for (const [index, layer] of drawing.layers.entries()) {
    lines.push(...layerLines(`layer-${index + 1}`, layer.name, byLayer.get(layer.key) ?? []));
  }
  if (options.originMark) lines.push(...originLines(options.originMark));
  lines.push('</svg>', '');
  return lines.join('\n');
}

function layerLines(id: string, name: string, shapes: readonly DrawingShape[]): string[] {
  return [
    `<g id="${id}" fill="none" stroke="#000000" stroke-width="0.1">`,
    `<title>${escapeXml(plainText(name, REPORT_LIMITS.layerNameCharacters))}</title>`,
    ...shapes.map((shape) => `<path d="${shapeToPathData(shape)}"/>`),
    '</g>',
  ];
}

function originLines({ x, y }: Point): string[] {
  const arm = ORIGIN_ARM_MM;
  const across = `M${formatMm(x - arm)} ${formatMm(y)}L${formatMm(x + arm)} ${formatMm(y)}`;
  const down = `M${formatMm(x)} ${formatMm(y - arm)}L${formatMm(x)} ${formatMm(y + arm)}`;
  return [
    `<g id="origin" data-role="${ORIGIN_ROLE}" fill="none" stroke="#ff0000" stroke-width="0.1">`,
    '<title>origin</title>',
    `<path d="${across}${down}"/>`,
    '</g>',
  ];
}

function escapeXml(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;');
}
