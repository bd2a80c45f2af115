import { type LengthContext, type LengthProblem, userLength } from './basic-shapes.ts';
import { drawShape, SHAPE_NAMES } from './draw-shape.ts';
import { isNotDisplayed, isVisible, type PropertyLookup, styleOf } from './element-style.ts';
import { elementToMm } from './element-transform.ts';
import type { SvgElement } from './element-tree.ts';
import { inheritFont } from './inherit-font.ts';
import { groupLabel } from './layers.ts';
import { DRAWING_LIMITS } from './limits.ts';
import { multiply, translation } from './matrix.ts';
import { readViewBox } from './page-scale.ts';
import { inheritPaint } from './paint.ts';
import { viewBoxTransform } from './preserve-aspect-ratio.ts';
import type { Inherited, ReadState } from './read-state.ts';
import { refuse } from './refusals.ts';

/** Value of `data-role` on the origin mark of our own clean drawings, which is never cut. */
export const ORIGIN_ROLE = 'origin';

/** Draws the children of the root. */
export function drawChildren(element: SvgElement, inherited: Inherited, state: ReadState): void {
  for (const child of element.children) {
    if (state.refusal) return;
    drawElement(child, inherited, state);
  }
}

/** Size that a `use` gives to the symbol or svg that it copies. */
interface GivenSize {
  readonly width?: string;
  readonly height?: string;
}

function drawElement(element: SvgElement, inherited: Inherited, state: ReadState, given?: GivenSize): void {
  if (!isDrawn(element, given !== undefined, state)) return;
  const own = styleOf(element, state.inspection.sheet);
  if (isNotDisplayed(own)) return;
  if (element.attributes['data-role'] === ORIGIN_ROLE) {
    state.warnings.count('origin-mark', () => state.at(element));
    return;
  }
  if (!countElement(element, inherited, state)) return;
  const inside = inherit(element, own, inherited, state);
  warnOfEffects(element, own, inside, state);
  if (SHAPE_NAMES.has(element.name)) {
    if (inside.visible) drawShape(element, own, inside, state);
    return;
  }
  if (state.open.has(element)) {
    state.stop(refuse.endlessCopy(state.at(element)));
    return;
  }
  state.open.add(element);
  if (element.name === 'use') drawUse(element, own, inside, state);
  else if (element.name === 'svg' || element.name === 'symbol')
    drawViewport(element, own, inside, state, given);
  else if (element.name === 'switch') drawSwitch(element, inside, state);
  else drawChildren(element, inside, state);
  state.open.delete(element);
}

/** Shapes and containers are drawn; text and images are told; the rest (defs, gradients, metadata) is silent. */
function isDrawn(element: SvgElement, isCopied: boolean, state: ReadState): boolean {
  switch (element.name) {
    case 'g':
    case 'a':
    case 'svg':
    case 'use':
    case 'switch':
      return true;
    case 'symbol':
      return isCopied;
    case 'text':
    case 'image':
    case 'foreignObject': {
      const own = styleOf(element, state.inspection.sheet);
      if (isNotDisplayed(own)) return false;
      const code = {
        text: 'text-not-outlines',
        image: 'image-left-out',
        foreignObject: 'foreign-object',
      } as const;
      state.warnings.count(code[element.name], () => state.at(element));
      return false;
    }
    default:
      return SHAPE_NAMES.has(element.name);
  }
}

function countElement(element: SvgElement, inherited: Inherited, state: ReadState): boolean {
  state.elementsDrawn++;
  if (state.elementsDrawn > DRAWING_LIMITS.elementsDrawn)
    state.stop(refuse.tooManyElements(state.at(element)));
  else if (inherited.level >= DRAWING_LIMITS.levels) state.stop(refuse.tooDeep(state.at(element)));
  return !state.refusal;
}

function inherit(
  element: SvgElement,
  own: PropertyLookup,
  inherited: Inherited,
  state: ReadState,
): Inherited {
  const label = SHAPE_NAMES.has(element.name) ? undefined : (groupLabel(element) ?? inherited.label);
  const nearest = label ?? inherited.label;
  const font = inheritFont(inherited.font, own);
  return {
    toMm: elementToMm(element, own, { ...inherited, font }, state),
    visible: isVisible(own, inherited.visible),
    paint: inheritPaint(inherited.paint, own),
    font,
    viewport: inherited.viewport,
    level: inherited.level + 1,
    ...(nearest === undefined ? {} : { label: nearest }),
  };
}

function warnOfEffects(element: SvgElement, own: PropertyLookup, inside: Inherited, state: ReadState): void {
  if (!inside.visible && SHAPE_NAMES.has(element.name)) return;
  const isSet = (property: string) => (own(property) ?? 'none') !== 'none';
  if (isSet('clip-path') || isSet('mask')) state.warnings.count('clip-or-mask', () => state.at(element));
  if (isSet('filter')) state.warnings.count('filter', () => state.at(element));
}

/** The first child that may be shown: none that needs an extension or another language (SVG 2, Structure). */
function drawSwitch(element: SvgElement, inside: Inherited, state: ReadState): void {
  const child = element.children.find(({ name, attributes }) => {
    if (!SHAPE_NAMES.has(name) && !/^(g|a|svg|use|switch|text|image|foreignObject)$/.test(name)) return false;
    const language = attributes['systemLanguage'];
    return !attributes['requiredExtensions'] && (language === undefined || /(^|,\s*)en\b/.test(language));
  });
  if (child) drawElement(child, inside, state);
}

function drawUse(element: SvgElement, own: PropertyLookup, inside: Inherited, state: ReadState): void {
  const href = hrefOf(element)?.trim();
  if (!href) return;
  const target = href.startsWith('#') ? state.inspection.byId.get(href.slice(1)) : undefined;
  if (!target) {
    // A reference out of the file is told where all elements are looked at.
    if (href.startsWith('#')) state.warnings.count('missing-reference', () => state.at(element));
    return;
  }
  if (state.open.has(target)) {
    state.stop(refuse.endlessCopy(state.at(element)));
    return;
  }
  const context = lengthContext(element, inside, state);
  const x = userLength(own('x'), 'x', context) ?? 0;
  const y = userLength(own('y'), 'y', context) ?? 0;
  const width = own('width');
  const height = own('height');
  const moved = { ...inside, toMm: multiply(inside.toMm, translation(x, y)) };
  drawElement(target, moved, state, { ...(width ? { width } : {}), ...(height ? { height } : {}) });
}

/** `href`, else the same in another namespace (xlink). */
function hrefOf(element: SvgElement): string | undefined {
  const plain = element.attributes['href'];
  if (plain !== undefined) return plain;
  for (const name in element.attributes) if (name.endsWith(':href')) return element.attributes[name];
  return undefined;
}

function lengthContext(element: SvgElement, inside: Inherited, state: ReadState): LengthContext {
  const onProblem = (problem: LengthProblem) => state.warnings.count(problem, () => state.at(element));
  return { viewport: inside.viewport, font: inside.font, onProblem };
}

/** A nested svg, or a symbol that is copied: a viewport of its own (SVG 2, Coordinates). */
function drawViewport(
  element: SvgElement,
  own: PropertyLookup,
  inside: Inherited,
  state: ReadState,
  given: GivenSize | undefined,
): void {
  const context = lengthContext(element, inside, state);
  const x = userLength(own('x'), 'x', context) ?? 0;
  const y = userLength(own('y'), 'y', context) ?? 0;
  const width = userLength(given?.width ?? own('width'), 'x', context) ?? inside.viewport.width;
  const height = userLength(given?.height ?? own('height'), 'y', context) ?? inside.viewport.height;
  if (!(width > 0 && height > 0)) {
    state.warnings.count('flat-shape', () => state.at(element));
    return;
  }
  const viewBox = readViewBox(element.attributes['viewBox']);
  const toViewport = multiply(inside.toMm, translation(x, y));
  if (!viewBox) {
    drawChildren(element, { ...inside, toMm: toViewport, viewport: { width, height } }, state);
    return;
  }
  const fit = viewBoxTransform(viewBox, width, height, element.attributes['preserveAspectRatio']);
  drawChildren(element, { ...inside, toMm: multiply(toViewport, fit), viewport: viewBox }, state);
}
