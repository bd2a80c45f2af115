import { REPORT_LIMITS } from './limits.ts';
import type { LineColumn } from './refusals.ts';
import type { DrawingWarning } from './types.ts';

/** A stroke wider than this is taken for one that was meant as an outline. P: common practice, no source. */
export const WIDE_STROKE_MM = 1.5;
/** Ends this near were probably meant to meet (computation.md §1). */
export const SMALL_GAP_MM = 0.1;

const many = (count: number, one: string, more = `${one}s`) =>
  count === 1 ? `1 ${one}` : `${count} ${more}`;

/** One sentence a code: what was found, how often, and what to change. */
const SENTENCES = {
  'text-not-outlines': (n: number) => `${many(n, 'text')} cannot be cut: convert text to paths.`,
  'image-left-out': (n: number) => `${many(n, 'image')} cannot be cut: trace to paths, or remove.`,
  'foreign-object': (n: number) =>
    `${many(n, 'embedded page part')} (foreignObject) cannot be cut and was left out.`,
  'gradient-or-pattern': (n: number) =>
    `${many(n, 'shape')} with a gradient or pattern: only the outline is read.`,
  filter: (n: number) => `${many(n, 'element')} with a filter: the outline is read without its effect.`,
  'clip-or-mask': (n: number) =>
    `${many(n, 'element')} with a clip path or mask: the outline is shown uncut. Intersect the paths to cut what is seen.`,
  script: (n: number) => `${many(n, 'script')} left out: scripts are never run.`,
  'event-handler': (n: number) => `${many(n, 'event handler')} left out: scripts are never run.`,
  'external-reference': (n: number) =>
    `${many(n, 'reference')} to something outside the file left out. Put it into the file if it is to be cut.`,
  'origin-mark': () =>
    'An origin mark was left out: it shows where to zero and is not cut. If it is a shape of yours, remove data-role="origin" from it.',
  animation: (n: number) => `${many(n, 'animation')} left out: shapes are read where they stand in the file.`,
  'wide-stroke': (n: number) =>
    `${many(n, 'shape')} with a stroke over ${WIDE_STROKE_MM} mm (P): the middle of the stroke will be cut. Convert strokes to paths if their edge is meant.`,
  'open-outline': (n: number) =>
    `${many(n, 'outline')} open: on the line can be cut, a pocket or profile needs closed ones.`,
  'small-gap': (n: number) =>
    `${many(n, 'outline')} open by less than ${SMALL_GAP_MM} mm: join the ends if they are meant to meet.`,
  'zero-length': (n: number) => `${many(n, 'segment')} of no length: nothing is cut there.`,
  'doubled-shape': (n: number) => `${many(n, 'shape')} lying exactly on another: it would be cut twice.`,
  'flat-shape': (n: number) =>
    `${many(n, 'shape')} of no size (a width, height, radius or scale of 0 or less) left out.`,
  'unknown-unit': (n: number) => `${many(n, 'length')} in a unit that has no fixed size: read as px.`,
  'non-uniform-scale': () =>
    'The page is scaled differently across and down: circles come out as ellipses. Check both sizes.',
  'bad-page-size': () => 'The width, height or viewBox of the page cannot be read, so it was passed over.',
  'doctype-dropped': () => 'The DOCTYPE was dropped: it is not needed.',
  'missing-reference': (n: number) =>
    `${many(n, 'copy', 'copies')} (use) of something that is not in the file left out.`,
  'style-unread': () =>
    'Some styles are not read (a selector, a rule under a condition, or a property or value that moves or shapes what it names): check what is shown, and where it lies. Write it as attributes, or convert to paths.',
  'length-unread': (n: number) =>
    `${many(n, 'length')} cannot be read (calculated with calc or var, or wrong) and counted as not given. Write plain numbers.`,
  'font-unit': (n: number) =>
    `${many(n, 'length')} in a unit that depends on the font: read at a usual font size. Write mm or px.`,
  'foreign-namespace': (n: number) =>
    `${many(n, 'element')} outside the SVG namespace cannot be cut and left out. If shapes are missing, give them xmlns="http://www.w3.org/2000/svg".`,
} as const;

/** Codes of warnings that are counted and told once, at the first place. */
export type CountedWarning = keyof typeof SENTENCES;

/** Collects what was found on the way: counted warnings once each, located ones with their places. */
export class WarningCollector {
  readonly #counted = new Map<CountedWarning, { count: number; at?: LineColumn; shapeKey?: string }>();
  readonly #located: DrawingWarning[] = [];
  readonly #locatedCounts = new Map<string, number>();

  /** `at` is asked for only when this is the first of its code. */
  count(code: CountedWarning, at?: () => LineColumn, shapeKey?: string): void {
    const known = this.#counted.get(code);
    if (known) known.count++;
    else
      this.#counted.set(code, { count: 1, ...(at ? { at: at() } : {}), ...(shapeKey ? { shapeKey } : {}) });
  }

  /** A warning with a place of its own; past the limit of its code only counted. */
  locate(code: string, message: string, at: LineColumn, shapeKey?: string): void {
    const count = (this.#locatedCounts.get(code) ?? 0) + 1;
    this.#locatedCounts.set(code, count);
    if (count > REPORT_LIMITS.warningsPerCode) return;
    this.#located.push({
      code,
      message,
      line: at.line,
      column: at.column,
      ...(shapeKey ? { shapeKey } : {}),
    });
  }

  list(): DrawingWarning[] {
    const warnings = [...this.#located];
    for (const [code, count] of this.#locatedCounts) {
      const left = count - REPORT_LIMITS.warningsPerCode;
      if (left > 0) warnings.push({ code, message: `There are ${left} more of this kind.` });
    }
    for (const [code, { count, at, shapeKey }] of this.#counted) {
      const place = at ? { line: at.line, column: at.column } : {};
      warnings.push({ code, message: SENTENCES[code](count), ...place, ...(shapeKey ? { shapeKey } : {}) });
    }
    return warnings;
  }
}
