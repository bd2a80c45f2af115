import type { PropertyLookup } from './element-style.ts';
import type { SvgElement } from './element-tree.ts';
import { type FontSizes, INITIAL_FONT } from './font-size.ts';
import { inheritFont } from './inherit-font.ts';
import { type Matrix, multiply, scaling } from './matrix.ts';
import { type ViewBox, viewBoxTransform } from './preserve-aspect-ratio.ts';
import { readNumberList } from './text-cursor.ts';
import type { DrawingUnits } from './types.ts';
import { isPhysicalUnit, lengthPx, MM_PER_PX, parseLength } from './units.ts';
import type { WarningCollector } from './warnings.ts';

/** How the root's user units become page millimetres. */
export interface PageScale {
  readonly toMm: Matrix;
  readonly units: DrawingUnits;
  /** CSS pixels in one user unit across: what the readings of an unconfirmed file are made from. */
  readonly pxPerUnit: number;
  /** Size of the viewport in user units, for percentages. */
  readonly viewport: { readonly width: number; readonly height: number };
}

/** Reads `viewBox`; undefined when missing or not four finite numbers with a size above 0. */
export function readViewBox(text: string | undefined): ViewBox | undefined {
  if (text === undefined) return undefined;
  const { values, errorIndex } = readNumberList(text);
  const [x, y, width, height] = values;
  if (errorIndex !== undefined || values.length !== 4) return undefined;
  if (x === undefined || y === undefined || width === undefined || height === undefined) return undefined;
  if (!Number.isFinite(x + y + width + height) || width <= 0 || height <= 0) return undefined;
  return { x, y, width, height };
}

/** One side of the page: its size in mm where the file states one, and how it was stated. */
interface Side {
  readonly mm?: number;
  readonly source: string;
}

function readSide(text: string | undefined, font: FontSizes, warnings: WarningCollector): Side {
  if (text === undefined || /^\s*auto\s*$/i.test(text)) return { source: 'none' };
  const length = parseLength(text);
  if (!length || length.value <= 0) {
    warnings.count('bad-page-size');
    return { source: 'none' };
  }
  if (length.unit === '%') return { source: 'percent' };
  const px = lengthPx(length, 0, font);
  if (px === undefined) warnings.count('unknown-unit');
  return {
    mm: (px ?? length.value) * MM_PER_PX,
    source: isPhysicalUnit(length.unit) ? length.unit : 'px',
  };
}

/**
 * The scale of the page from the root's width, height, viewBox and preserveAspectRatio (SVG 2,
 * Coordinates). Sizes in mm, cm, in, pt, pc and Q are confirmed; px, bare numbers, percentages and
 * missing sizes are read at 96 px an inch and not confirmed. A missing side follows the viewBox.
 * Without a viewBox a user unit is a CSS pixel however large the page is, which is not confirmed either.
 * `own` is the root's style, which wins over its width and height attributes.
 * `statedMmPerUnit` is the member's own scale: it counts across, and down in the file's own ratio.
 */
export function readPageScale(
  root: SvgElement,
  own: PropertyLookup,
  warnings: WarningCollector,
  statedMmPerUnit?: number,
): PageScale {
  const viewBoxText = root.attributes['viewBox'];
  const viewBox = readViewBox(viewBoxText);
  if (viewBoxText !== undefined && !viewBox) warnings.count('bad-page-size');
  const font = inheritFont(INITIAL_FONT, own, true);
  const across = readSide(own('width'), font, warnings);
  const down = readSide(own('height'), font, warnings);
  const { widthMm, heightMm } = fillMissing(across.mm, down.mm, viewBox);
  const read = viewBox
    ? viewBoxTransform(viewBox, widthMm, heightMm, root.attributes['preserveAspectRatio'])
    : scaling(MM_PER_PX, MM_PER_PX);
  const toMm =
    statedMmPerUnit === undefined
      ? read
      : multiply(scaling(statedMmPerUnit / read.a, statedMmPerUnit / read.a), read);
  if (Math.abs(toMm.a - toMm.d) > 1e-9 * toMm.a) warnings.count('non-uniform-scale');
  const source = statedMmPerUnit === undefined ? pageSource(across, down, viewBox !== undefined) : 'stated';
  return {
    toMm,
    pxPerUnit: read.a / MM_PER_PX,
    units: {
      source,
      millimetresPerUnit: { x: toMm.a, y: toMm.d },
      confirmed: source === 'stated' || isPhysicalUnit(source),
    },
    viewport: viewBox ?? { width: widthMm / MM_PER_PX, height: heightMm / MM_PER_PX },
  };
}

/** A side that is missing follows the viewBox; with neither side, a user unit is a pixel. */
function fillMissing(
  widthMm: number | undefined,
  heightMm: number | undefined,
  viewBox: ViewBox | undefined,
) {
  const box = viewBox ?? { width: 100, height: 100 };
  const ratio = box.width / box.height;
  return {
    widthMm: widthMm ?? (heightMm === undefined ? box.width * MM_PER_PX : heightMm * ratio),
    heightMm: heightMm ?? (widthMm === undefined ? box.height * MM_PER_PX : widthMm / ratio),
  };
}

/** The less certain side decides; a side left out follows the other one. Without a viewBox a size says nothing of the units inside. */
function pageSource(across: Side, down: Side, hasViewBox: boolean): string {
  const sides = [across.source, down.source]
    .filter((source) => source !== 'none')
    .map((source) => (isPhysicalUnit(source) && !hasViewBox ? 'px' : source));
  return (
    sides.find((source) => source === 'percent') ??
    sides.find((source) => source === 'px') ??
    sides[0] ??
    'none'
  );
}
