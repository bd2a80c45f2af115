import type { PropertyLookup } from './element-style.ts';
import { REPORT_LIMITS } from './limits.ts';
import { plainText } from './plain-text.ts';

/** Inherited paint of a shape, as written in the file. */
export interface Paint {
  readonly fill: string;
  readonly stroke: string;
  readonly color: string;
  /** In the user units of the element that set it. */
  readonly strokeWidth: string;
}

/** Initial values of SVG 2, Painting. */
export const INITIAL_PAINT: Paint = { fill: 'black', stroke: 'none', color: 'black', strokeWidth: '1' };

export function inheritPaint(parent: Paint, own: PropertyLookup): Paint {
  const fill = own('fill');
  const stroke = own('stroke');
  const color = own('color');
  const strokeWidth = own('stroke-width');
  if (!fill && !stroke && !color && !strokeWidth) return parent;
  return {
    fill: fill ?? parent.fill,
    stroke: stroke ?? parent.stroke,
    color: color ?? parent.color,
    strokeWidth: strokeWidth ?? parent.strokeWidth,
  };
}

/** The basic colour words of CSS, so that `red` and `#f00` are one layer. */
const COLOUR_WORDS: Readonly<Record<string, string>> = {
  black: '#000000',
  silver: '#c0c0c0',
  gray: '#808080',
  grey: '#808080',
  white: '#ffffff',
  maroon: '#800000',
  red: '#ff0000',
  purple: '#800080',
  fuchsia: '#ff00ff',
  magenta: '#ff00ff',
  green: '#008000',
  lime: '#00ff00',
  olive: '#808000',
  yellow: '#ffff00',
  navy: '#000080',
  blue: '#0000ff',
  teal: '#008080',
  aqua: '#00ffff',
  cyan: '#00ffff',
  orange: '#ffa500',
};

/** Name for a layer of shapes without a labelled group: the stroke, else the fill, as plain text. */
export function paintName(paint: Paint): string {
  if (paint.stroke !== 'none') return `Stroke ${colourName(paint.stroke, paint)}`;
  if (paint.fill !== 'none') return `Fill ${colourName(paint.fill, paint)}`;
  return 'No paint';
}

function colourName(written: string, paint: Paint): string {
  const colour = (written.toLowerCase() === 'currentcolor' ? paint.color : written).trim().toLowerCase();
  if (colour.startsWith('url(')) return 'gradient or pattern';
  if (Object.hasOwn(COLOUR_WORDS, colour)) return COLOUR_WORDS[colour] ?? colour;
  if (/^#[\da-f]{3}$/.test(colour)) return colour.replace(/[\da-f]/g, '$&$&');
  const rgb = /^rgba?\(\s*(\d{1,3})[\s,]+(\d{1,3})[\s,]+(\d{1,3})\s*[),/]/.exec(colour);
  if (rgb)
    return `#${rgb
      .slice(1, 4)
      .map((part) => Math.min(255, Number(part)).toString(16).padStart(2, '0'))
      .join('')}`;
  return plainText(colour, REPORT_LIMITS.detailCharacters / 2);
}
