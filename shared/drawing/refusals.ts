import { DRAWING_LIMITS } from './limits.ts';
import type { DrawingRefusal } from './types.ts';

/** A line and column in the file, both counted from 1. */
export interface LineColumn {
  readonly line: number;
  readonly column: number;
}

const whole = new Intl.NumberFormat('en-GB');

function refusal(code: string, message: string, at?: LineColumn): DrawingRefusal {
  return at ? { code, message, line: at.line, column: at.column } : { code, message };
}

/** Every reason for which a file is refused: each sentence says the limit, the figure and what to change. */
export const refuse = {
  empty: () => refusal('empty', 'The file is empty. Export the drawing again as SVG and choose that file.'),
  notSvg: (found: string) =>
    refusal(
      'not-svg',
      `This is not an SVG drawing: ${found}. Export the drawing as plain SVG and choose that file.`,
    ),
  html: () =>
    refusal(
      'not-svg',
      'This is a web page (HTML), not an SVG drawing. Save the drawing itself as an .svg file and choose that.',
    ),
  illFormed: (reason: string, at: LineColumn) =>
    refusal(
      'ill-formed',
      `The file is not well-formed XML at line ${at.line}, column ${at.column}: ${reason}. Export it again, or mend it there.`,
      at,
    ),
  noShapes: () =>
    refusal(
      'no-shapes',
      'The drawing has no shapes that can be cut: nothing but hidden parts, text or images was found. Convert text and objects to paths, show hidden layers, and export again.',
    ),
  tooLarge: (bytes: number) =>
    refusal(
      'too-large',
      `The file is over the limit of ${DRAWING_LIMITS.fileBytes / 1024 / 1024} MB: it has at least ${(bytes / 1024 / 1024).toFixed(1)} MB. Remove images, or simplify the paths, and export again.`,
    ),
  entities: (at: LineColumn) =>
    refusal(
      'entities',
      'The file declares entities (ENTITY in its DOCTYPE), which are not read: 0 are allowed. Export it as plain SVG, without the editor’s own data, or remove the DOCTYPE and write the values out.',
      at,
    ),
  tooDeep: (at: LineColumn) =>
    refusal(
      'too-deep',
      `The drawing is nested more than ${DRAWING_LIMITS.levels} levels deep, here at line ${at.line}. Ungroup the drawing and export again.`,
      at,
    ),
  tooManySegments: (at: LineColumn) =>
    refusal(
      'too-many-segments',
      `The drawing has more than ${whole.format(DRAWING_LIMITS.segments)} segments once its copies are drawn out, passed at line ${at.line}. Simplify the paths or split the drawing.`,
      at,
    ),
  tooManyElements: (at: LineColumn) =>
    refusal(
      'too-many-elements',
      `The drawing has more than ${whole.format(DRAWING_LIMITS.elementsDrawn)} elements once its copies (use) are drawn out, passed at line ${at.line}. Remove copies of copies and export again.`,
      at,
    ),
  endlessCopy: (at: LineColumn) =>
    refusal(
      'use-loop',
      `A copy (use) at line ${at.line} contains itself, so it would never end: 0 such loops are allowed. Point it at another shape, or replace it by the shape itself.`,
      at,
    ),
  outOfRange: (at: LineColumn) =>
    refusal(
      'out-of-range',
      `The shape at line ${at.line} lies beyond ±${whole.format(DRAWING_LIMITS.coordinateMm)} mm or has a number that is not finite. Move the drawing near the page, or check its units and transforms.`,
      at,
    ),
  badScale: () =>
    refusal(
      'bad-scale',
      'The stated scale must be a number of millimetres a unit above 0 and at most 1,000,000. State it again.',
    ),
} as const;
