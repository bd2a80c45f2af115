import { BoundsBox } from './bounds.ts';
import { doubledShapes } from './doubled-shapes.ts';
import { drawChildren } from './draw-element.ts';
import { isNotDisplayed, isVisible, styleOf } from './element-style.ts';
import { elementToMm } from './element-transform.ts';
import { buildElementTree, type SvgElement } from './element-tree.ts';
import { INITIAL_FONT } from './font-size.ts';
import { inheritFont } from './inherit-font.ts';
import { inspectElements } from './inspect-elements.ts';
import { DRAWING_LIMITS, utf8Bytes } from './limits.ts';
import { markupForTree } from './markup-for-tree.ts';
import { type PageScale, readPageScale } from './page-scale.ts';
import { INITIAL_PAINT, inheritPaint } from './paint.ts';
import { ReadState } from './read-state.ts';
import { refuse } from './refusals.ts';
import { scaleReadings } from './scale-readings.ts';
import { SourceText } from './source-text.ts';
import type { Drawing, DrawingRefusal, DrawingResult } from './types.ts';
import { WarningCollector } from './warnings.ts';
import { checkMarkup } from './well-formed.ts';

export interface ReadDrawingOptions {
  /** The member's own scale for the root's user units, in mm; it replaces what the file says. */
  readonly millimetresPerUnit?: number;
}

/**
 * Reads the text of an SVG file into millimetres (computation.md §1): page coordinates, y down, bounds
 * exact within 1e-6 mm, lengths within 1e-6 relative. What the member can mend comes back as a refusal
 * or as warnings; nothing is thrown and nothing of the file's markup is kept.
 */
export function readDrawing(svgText: string, options: ReadDrawingOptions = {}): DrawingResult {
  const refused = (refusal: DrawingRefusal): DrawingResult => ({ ok: false, refusal });
  const stated = options.millimetresPerUnit;
  if (stated !== undefined && !(stated > 0 && stated <= DRAWING_LIMITS.coordinateMm))
    return refused(refuse.badScale());
  const bytes = utf8Bytes(svgText, DRAWING_LIMITS.fileBytes);
  if (bytes > DRAWING_LIMITS.fileBytes) return refused(refuse.tooLarge(bytes));
  const text = svgText.startsWith('\ufeff') ? svgText.slice(1) : svgText;
  const refusal = refuseByStart(text);
  if (refusal) return refused(refusal);
  const markup = checkMarkup(text);
  if (!markup.ok) return refused(markup.refusal);

  const warnings = new WarningCollector();
  if (markup.hasDoctype) warnings.count('doctype-dropped');
  const source = new SourceText(text);
  const forTree = markupForTree(text, markup.rootName.slice(0, -'svg'.length));
  if (forTree.hasStylesheetInstruction) warnings.count('external-reference');
  const root = buildElementTree(forTree, markup.elementNames);
  const state = new ReadState(source, inspectElements(root, source, warnings), warnings);
  const page = readPageScale(root, styleOf(root, state.inspection.sheet), warnings, stated);
  drawRoot(root, page, state);
  if (state.refusal) return refused(state.refusal);
  if (state.shapes.length === 0) return refused(refuse.noShapes());
  return { ok: true, drawing: finish(state, page) };
}

/** What can be said before any markup is read. */
function refuseByStart(text: string): DrawingRefusal | undefined {
  const start = text.slice(0, 2000).trimStart();
  if (start === '' && text.trim() === '') return refuse.empty();
  if (/^<(!doctype\s+html|html)\b/i.test(start)) return refuse.html();
  if (start !== '' && !start.startsWith('<')) return refuse.notSvg('it does not start with a tag');
  return undefined;
}

function drawRoot(root: SvgElement, page: PageScale, state: ReadState): void {
  const own = styleOf(root, state.inspection.sheet);
  if (isNotDisplayed(own)) return;
  const outside = {
    toMm: page.toMm,
    visible: isVisible(own, true),
    paint: inheritPaint(INITIAL_PAINT, own),
    font: inheritFont(INITIAL_FONT, own, true),
    viewport: page.viewport,
    level: 1,
  };
  state.open.add(root);
  drawChildren(root, { ...outside, toMm: elementToMm(root, own, outside, state) }, state);
}

function finish(state: ReadState, page: PageScale): Drawing {
  const { shapes, warnings } = state;
  for (const { source, key } of doubledShapes(shapes)) warnings.count('doubled-shape', () => source, key);
  const box = new BoundsBox();
  let lengthMm = 0;
  for (const shape of shapes) {
    box.addBounds(shape.boundsMm);
    lengthMm += shape.lengthMm;
  }
  const boundsMm = box.toBounds();
  const widthMm = boundsMm.maxX - boundsMm.minX;
  const heightMm = boundsMm.maxY - boundsMm.minY;
  return {
    units: page.units,
    scaleReadings: page.units.confirmed ? [] : scaleReadings(page.pxPerUnit, widthMm, heightMm),
    shapes,
    layers: state.layerKeys.layersOf(shapes),
    boundsMm,
    widthMm,
    heightMm,
    lengthMm,
    segmentCount: state.segmentCount,
    warnings: warnings.list(),
  };
}
