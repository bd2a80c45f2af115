import { BoundsBox } from './bounds.ts';
import type { SvgElement } from './element-tree.ts';
import { REPORT_LIMITS } from './limits.ts';
import { plainText } from './plain-text.ts';
import type { DrawingLayer, DrawingShape } from './types.ts';

/** Ids that a program made up say nothing to a person. */
const MADE_UP_ID = /^(g|group|layer|svg|path|use|surface|page)?[-_]?\d+([-_]\d+)*$/i;

/**
 * The label of a group, as plain text: a `label` attribute of an editor's namespace, `data-name`,
 * `aria-label`, a `title` child, else an id that a person wrote. Undefined when it has none.
 */
export function groupLabel(element: SvgElement): string | undefined {
  const attributes = element.attributes;
  let label: string | undefined;
  for (const name in attributes) if (name.endsWith(':label')) label ??= attributes[name];
  label ||= attributes['data-name'] || attributes['aria-label'];
  label ||= element.children.find((child) => child.name === 'title')?.text;
  const id = attributes['id'];
  // Some editors write a space in an id as _x20_.
  label ||=
    id && !MADE_UP_ID.test(id)
      ? id.replace(/_x([\da-f]{2})_/gi, (_, hex: string) => String.fromCharCode(Number.parseInt(hex, 16)))
      : '';
  return plainText(label, REPORT_LIMITS.layerNameCharacters) || undefined;
}

/** Gives each layer name its key, in the order in which the names are first met. */
export class LayerKeys {
  readonly #keys = new Map<string, string>();

  keyOf(name: string): string {
    const known = this.#keys.get(name);
    if (known) return known;
    const key = `l${this.#keys.size + 1}`;
    this.#keys.set(name, key);
    return key;
  }

  /** The layers with their shapes counted and bounded, in order of first shape. */
  layersOf(shapes: readonly DrawingShape[]): DrawingLayer[] {
    const boxes = new Map<string, { box: BoundsBox; shapeCount: number }>();
    for (const shape of shapes) {
      const entry = boxes.get(shape.layerKey) ?? { box: new BoundsBox(), shapeCount: 0 };
      entry.box.addBounds(shape.boundsMm);
      entry.shapeCount++;
      boxes.set(shape.layerKey, entry);
    }
    const layers: DrawingLayer[] = [];
    for (const [name, key] of this.#keys) {
      const entry = boxes.get(key);
      if (entry) layers.push({ key, name, shapeCount: entry.shapeCount, boundsMm: entry.box.toBounds() });
    }
    return layers;
  }
}
