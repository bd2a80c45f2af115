import { pathData } from './path-data.ts';
import type { FileUnit, Sheet, SheetLayer, SheetShape } from './sheet.ts';

interface FileUnitSize {
  readonly suffix: string;
  /** mm in one unit of the root's width and height. */
  readonly pageUnitMm: number;
  /** mm in one user unit. */
  readonly userUnitMm: number;
  readonly decimals: number;
}

/** How each kind of file states its size. `px` and `bare-90` leave the scale for the member to state. */
const fileUnits: Readonly<Record<FileUnit, FileUnitSize>> = {
  mm: { suffix: 'mm', pageUnitMm: 1, userUnitMm: 1, decimals: 4 },
  cm: { suffix: 'cm', pageUnitMm: 10, userUnitMm: 0.1, decimals: 3 },
  in: { suffix: 'in', pageUnitMm: 25.4, userUnitMm: 25.4, decimals: 6 },
  pt: { suffix: 'pt', pageUnitMm: 25.4 / 72, userUnitMm: 25.4 / 72, decimals: 5 },
  px: { suffix: 'px', pageUnitMm: 25.4 / 96, userUnitMm: 25.4 / 96, decimals: 5 },
  'bare-90': { suffix: '', pageUnitMm: 25.4 / 90, userUnitMm: 25.4 / 90, decimals: 5 },
};

/** Writes a sheet as the SVG file its owner would have uploaded. The same sheet gives the same text. */
export function writeSvg(sheet: Sheet): string {
  const unit = fileUnits[sheet.unit ?? 'mm'];
  const borderMm = sheet.borderMm ?? 0;
  const inUnits: InUnits = (mm) => rounded(mm / unit.userUnitMm, unit.decimals);
  const page = (mm: number) => `${rounded((mm + 2 * borderMm) / unit.pageUnitMm, 6)}${unit.suffix}`;
  const box = [-borderMm, -borderMm, sheet.widthMm + 2 * borderMm, sheet.heightMm + 2 * borderMm];
  const relative = sheet.relativePaths === true;
  const shapes = (list: readonly SheetShape[]) =>
    list.map((shape) => `    ${element(shape, inUnits, relative)}\n`).join('');
  // The id stands on the shape itself: a group round it would look like a layer of its own.
  const defs = (sheet.reused ?? []).map(
    ({ id, shape }) => `    ${element(shape, inUnits, relative).replace(' ', ` id="${id}" `)}\n`,
  );
  const style = `<style>.cut{fill:none;stroke:#000;stroke-width:${inUnits(0.25)}}.sunk{fill:#e4e4e0;fill-rule:evenodd}</style>\n`;
  const layers = sheet.layers.map(
    (layer) =>
      `  <g id="${idOf(layer.name)}"${moved(layer, inUnits)}${paint(layer, sheet, inUnits)}>\n` +
      `    <title>${layer.name}</title>\n${shapes(layer.shapes)}  </g>\n`,
  );
  return (
    '<?xml version="1.0" encoding="UTF-8"?>\n' +
    `<svg xmlns="http://www.w3.org/2000/svg" width="${page(sheet.widthMm)}" ` +
    `height="${page(sheet.heightMm)}" viewBox="${box.map(inUnits).join(' ')}">\n` +
    (defs.length > 0 ? `  <defs>\n${defs.join('')}  </defs>\n` : '') +
    (sheet.paintByClass === true ? `  ${style}` : '') +
    `${layers.join('')}</svg>\n`
  );
}

/** Turns mm into the file's own unit, rounded as such a file would be. */
type InUnits = (mm: number) => number;

function rounded(value: number, decimals: number): number {
  return Number(value.toFixed(decimals)) + 0;
}

function idOf(name: string): string {
  return name.replaceAll(/[^a-z0-9.]+/gi, '-');
}

function paint(layer: SheetLayer, sheet: Sheet, inUnits: InUnits): string {
  const sunk = layer.name.startsWith('pocket');
  if (sheet.paintByClass === true) return ` class="${sunk ? 'cut sunk' : 'cut'}"`;
  return ` ${sunk ? 'fill="#e4e4e0" fill-rule="evenodd"' : 'fill="none"'} stroke="#000" stroke-width="${inUnits(0.25)}"`;
}

function moved(layer: SheetLayer, inUnits: InUnits): string {
  const parts: string[] = [];
  if (layer.movedMm) parts.push(`translate(${inUnits(layer.movedMm[0])} ${inUnits(layer.movedMm[1])})`);
  if (layer.mirroredAboutXMm !== undefined) {
    parts.push(`matrix(-1 0 0 1 ${inUnits(2 * layer.mirroredAboutXMm)} 0)`);
  }
  return parts.length > 0 ? ` transform="${parts.join(' ')}"` : '';
}

function element(shape: SheetShape, inUnits: InUnits, relative: boolean): string {
  const u = inUnits;
  switch (shape.kind) {
    case 'circle':
      return `<circle cx="${u(shape.xMm)}" cy="${u(shape.yMm)}" r="${u(shape.diameterMm / 2)}"/>`;
    case 'ellipse':
      return `<ellipse cx="${u(shape.xMm)}" cy="${u(shape.yMm)}" rx="${u(shape.widthMm / 2)}" ry="${u(shape.heightMm / 2)}"/>`;
    case 'rect': {
      const corner = shape.cornerMm > 0 ? ` rx="${u(shape.cornerMm)}"` : '';
      return `<rect x="${u(shape.xMm)}" y="${u(shape.yMm)}" width="${u(shape.widthMm)}" height="${u(shape.heightMm)}"${corner}/>`;
    }
    case 'line':
      return `<line x1="${u(shape.x1Mm)}" y1="${u(shape.y1Mm)}" x2="${u(shape.x2Mm)}" y2="${u(shape.y2Mm)}"/>`;
    case 'polygon':
      return `<polygon points="${shape.points.map(([x, y]) => `${u(x)},${u(y)}`).join(' ')}"/>`;
    case 'path':
      return `<path d="${pathData(shape.steps, u, relative)}"/>`;
    case 'use': {
      const turn = shape.turnedDeg === undefined ? '' : ` transform="rotate(${shape.turnedDeg})"`;
      return `<use href="#${shape.id}" x="${u(shape.xMm)}" y="${u(shape.yMm)}"${turn}/>`;
    }
  }
}
