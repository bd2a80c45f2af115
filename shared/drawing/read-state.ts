import type { SvgElement } from './element-tree.ts';
import type { FontSizes } from './font-size.ts';
import type { Inspection } from './inspect-elements.ts';
import { LayerKeys } from './layers.ts';
import { DRAWING_LIMITS } from './limits.ts';
import type { Matrix } from './matrix.ts';
import type { Paint } from './paint.ts';
import { type PathData, parsePathData } from './path-grammar.ts';
import type { LineColumn } from './refusals.ts';
import type { SourceText } from './source-text.ts';
import type { DrawingRefusal, DrawingShape } from './types.ts';
import type { WarningCollector } from './warnings.ts';

/** What an element takes over from what it stands in. */
export interface Inherited {
  /** User units to page millimetres. */
  readonly toMm: Matrix;
  readonly visible: boolean;
  readonly paint: Paint;
  readonly font: FontSizes;
  /** Label of the nearest labelled group. */
  readonly label?: string;
  /** Size of the nearest viewport in its user units, for percentages. */
  readonly viewport: { readonly width: number; readonly height: number };
  readonly level: number;
}

/** Everything that grows while one file is drawn. A refusal, once set, ends the drawing. */
export class ReadState {
  readonly shapes: DrawingShape[] = [];
  readonly layerKeys = new LayerKeys();
  /** Elements being drawn now, outermost first: meeting one again is a loop. */
  readonly open = new Set<SvgElement>();
  segmentCount = 0;
  elementsDrawn = 0;
  refusal: DrawingRefusal | undefined;
  readonly source: SourceText;
  readonly inspection: Inspection;
  readonly warnings: WarningCollector;
  readonly #pathData = new Map<SvgElement, PathData>();

  constructor(source: SourceText, inspection: Inspection, warnings: WarningCollector) {
    this.source = source;
    this.inspection = inspection;
    this.warnings = warnings;
  }

  at(element: SvgElement): LineColumn {
    return this.source.at(element.offset);
  }

  stop(refusal: DrawingRefusal): void {
    this.refusal ??= refusal;
  }

  /** Path data of an element, read once however often the element is copied. */
  pathData(element: SvgElement, text: string): PathData {
    const known = this.#pathData.get(element);
    if (known) return known;
    const data = parsePathData(text, DRAWING_LIMITS.segments);
    this.#pathData.set(element, data);
    return data;
  }
}
