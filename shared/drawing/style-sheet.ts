import type { SvgElement } from './element-tree.ts';

/** The properties that decide what is cut and how it is named; all others are passed over. */
const READ_PROPERTIES = new Set([
  'display',
  'visibility',
  'fill',
  'stroke',
  'stroke-width',
  'color',
  'transform',
  'transform-origin',
  'clip-path',
  'mask',
  'filter',
  'x',
  'y',
  'cx',
  'cy',
  'r',
  'rx',
  'ry',
  'width',
  'height',
]);

/** Rules past this are not read: a drawing has some dozens, and every element is held against them. */
const MAX_RULES = 2000;

/** Declarations by property name; `important` ones win over all that are not. */
export interface Declarations {
  readonly normal: Map<string, string>;
  readonly important: Map<string, string>;
}

interface SimpleSelector {
  readonly element?: string;
  readonly id?: string;
  readonly classes: readonly string[];
  /** Ids, then classes, then elements, in one comparable number. */
  readonly specificity: number;
}

interface Rule {
  readonly selector: SimpleSelector;
  readonly declarations: Declarations;
  readonly order: number;
}

/** Rules of the `style` elements, found again by id, class or element name. */
export class StyleSheet {
  readonly #rules = new Map<string, Rule[]>();
  readonly #matched = new Map<string, Declarations | undefined>();
  #count = 0;
  /** A rule for a property that matters has a selector or an at-rule that is not read. */
  hasUnreadRules = false;
  hasImport = false;

  /** Adds the text of one `style` element. */
  add(cssText: string): void {
    const css = cssText
      .replace(/\/\*[\s\S]*?(\*\/|$)/g, ' ')
      .replaceAll('<!--', ' ')
      .replaceAll('-->', ' ');
    let at = 0;
    while (at < css.length) {
      const open = css.indexOf('{', at);
      const semicolon = css.indexOf(';', at);
      const head = css.slice(at, open < 0 ? css.length : open).trim();
      if (head.startsWith('@')) {
        if (/^@import\b/i.test(head)) this.hasImport = true;
        const isStatement = semicolon >= 0 && (open < 0 || semicolon < open);
        if (!isStatement && !/^@(font-face|keyframes|-)/i.test(head)) this.hasUnreadRules ||= open >= 0;
        at = isStatement ? semicolon + 1 : open < 0 ? css.length : blockEnd(css, open);
        continue;
      }
      if (open < 0) return;
      const end = blockEnd(css, open);
      this.#addRule(head, parseDeclarations(css.slice(open + 1, end - 1)));
      at = end;
    }
  }

  get isEmpty(): boolean {
    return this.#count === 0;
  }

  /** What the rules say of an element, the strongest last written over the others. */
  match(element: SvgElement): Declarations | undefined {
    const id = element.attributes['id'];
    const ownId = id !== undefined && this.#rules.has(`#${id}`) ? id : undefined;
    const key = `${element.name} ${ownId ?? ''} ${element.attributes['class'] ?? ''}`;
    if (this.#matched.has(key)) return this.#matched.get(key);
    const declarations = this.#matchAnew(element, ownId);
    this.#matched.set(key, declarations);
    return declarations;
  }

  #matchAnew(element: SvgElement, id: string | undefined): Declarations | undefined {
    const classes = [...new Set((element.attributes['class'] ?? '').split(/\s+/).filter(Boolean))];
    const keys = ['*', element.name, ...classes.map((name) => `.${name}`)];
    if (id) keys.push(`#${id}`);
    const found = keys
      .flatMap((key) => this.#rules.get(key) ?? [])
      .filter(({ selector }) => matches(selector, element.name, id, classes))
      .sort((a, b) => a.selector.specificity - b.selector.specificity || a.order - b.order);
    if (found.length === 0) return undefined;
    const result: Declarations = { normal: new Map(), important: new Map() };
    for (const { declarations } of found) {
      for (const [property, value] of declarations.normal) result.normal.set(property, value);
      for (const [property, value] of declarations.important) result.important.set(property, value);
    }
    return result;
  }

  #addRule(selectors: string, declarations: Declarations): void {
    if (declarations.normal.size + declarations.important.size === 0) return;
    for (const text of selectors.split(',')) {
      const selector = parseSelector(text.trim());
      if (!selector || this.#count >= MAX_RULES) {
        this.hasUnreadRules = true;
        continue;
      }
      const lastClass = selector.classes.at(-1);
      const key = selector.id ? `#${selector.id}` : lastClass ? `.${lastClass}` : (selector.element ?? '*');
      const rules = this.#rules.get(key);
      const rule = { selector, declarations, order: this.#count++ };
      if (rules) rules.push(rule);
      else this.#rules.set(key, [rule]);
    }
  }
}

function matches(
  selector: SimpleSelector,
  name: string,
  id: string | undefined,
  classes: readonly string[],
): boolean {
  if (selector.element && selector.element !== name) return false;
  if (selector.id && selector.id !== id) return false;
  return selector.classes.every((wanted) => classes.includes(wanted));
}

/** `path`, `.cut`, `#part`, `*` and these joined (`path.cut`); undefined for every other selector. */
function parseSelector(text: string): SimpleSelector | undefined {
  const match = /^(\*|[a-z_][\w-]*)?((?:[.#][\w\u0080-\uffff-]+)*)$/i.exec(text);
  if (!match || text === '') return undefined;
  const parts = match[2]?.match(/[.#][^.#]+/g) ?? [];
  const classes = parts.filter((part) => part.startsWith('.')).map((part) => part.slice(1));
  const ids = parts.filter((part) => part.startsWith('#')).map((part) => part.slice(1));
  if (ids.length > 1) return undefined;
  const element = match[1] && match[1] !== '*' ? match[1] : undefined;
  const specificity = ids.length * 1e6 + classes.length * 1e3 + (element ? 1 : 0);
  return { classes, specificity, ...(element ? { element } : {}), ...(ids[0] ? { id: ids[0] } : {}) };
}

/** Index after the bracket that closes the block opened at `open`. */
function blockEnd(css: string, open: number): number {
  let depth = 0;
  for (let i = open; i < css.length; i++) {
    const code = css.charCodeAt(i);
    if (code === 123) depth++;
    else if (code === 125 && --depth === 0) return i + 1;
  }
  return css.length + 1;
}

/** Reads `name: value; …`; semicolons inside brackets and quotes do not end a declaration. */
export function parseDeclarations(text: string): Declarations {
  const result: Declarations = { normal: new Map(), important: new Map() };
  for (const part of text.match(/(?:[^;"'(]+|"[^"]*"?|'[^']*'?|\([^)]*\)?)+/g) ?? []) {
    const colon = part.indexOf(':');
    if (colon < 0) continue;
    const property = part.slice(0, colon).trim().toLowerCase();
    if (!READ_PROPERTIES.has(property)) continue;
    const written = part.slice(colon + 1).trim();
    const value = written.replace(/\s*!\s*important$/i, '');
    (value === written ? result.normal : result.important).set(property, value);
  }
  return result;
}
