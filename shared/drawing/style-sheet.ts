import { type Declarations, parseDeclarations } from './declarations.ts';
import type { SvgElement } from './element-tree.ts';

/** Rules past this are not read: a drawing has some dozens, and every element is held against them. */
const MAX_RULES = 2000;

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
  readonly #styles = new Map<string, Declarations>();
  /** Classes that any rule names: the others of an element cannot matter. */
  readonly #classes = new Set<string>();
  #count = 0;
  /** A rule that may matter has a selector, an at-rule or a value that is not read. */
  hasUnreadRules = false;
  /** A rule has a transform that browsers drop. */
  hasWrongTransform = false;
  hasImport = false;

  /** Adds the text of one `style` element. */
  add(cssText: string): void {
    const css = cssText
      .replace(/\/\*[\s\S]*?(\*\/|$)/g, ' ')
      .replaceAll('<!--', ' ')
      .replaceAll('-->', ' ');
    // Both marks are looked for again only once they are passed, so that a long text takes linear time.
    let open = -1;
    let semicolon = -1;
    for (let at = 0; at < css.length; ) {
      if (open < at) open = positionOf(css, '{', at);
      if (semicolon < at) semicolon = positionOf(css, ';', at);
      const head = css.slice(at, open).trim();
      if (head.startsWith('@')) {
        if (/^@import\b/i.test(head)) this.hasImport = true;
        const isStatement = semicolon < open;
        if (!isStatement && !/^@(font-face|keyframes|-)/i.test(head))
          this.hasUnreadRules ||= open < css.length;
        at = isStatement ? semicolon + 1 : blockEnd(css, open);
        continue;
      }
      if (open === css.length) return;
      if (this.#count >= MAX_RULES) {
        this.hasUnreadRules = true;
        return;
      }
      const end = blockEnd(css, open);
      this.#addRule(head, parseDeclarations(css.slice(open + 1, end - 1)));
      at = end;
    }
  }

  /** The declarations of a style attribute; editors repeat the same text on thousands of elements. */
  declarationsOf(styleText: string): Declarations {
    const known = this.#styles.get(styleText);
    if (known) return known;
    const declarations = parseDeclarations(styleText);
    this.#styles.set(styleText, declarations);
    return declarations;
  }

  get isEmpty(): boolean {
    return this.#count === 0;
  }

  /** What the rules say of an element, the strongest last written over the others. */
  match(element: SvgElement): Declarations | undefined {
    const id = element.attributes['id'];
    const ownId = id !== undefined && this.#rules.has(`#${id}`) ? id : undefined;
    const classes = this.#classesOf(element);
    const key = `${element.name} ${ownId ?? ''} ${classes.join(' ')}`;
    if (this.#matched.has(key)) return this.#matched.get(key);
    const declarations = this.#matchAnew(element, ownId, classes);
    this.#matched.set(key, declarations);
    return declarations;
  }

  #classesOf(element: SvgElement): readonly string[] {
    const text = element.attributes['class'];
    if (text === undefined) return [];
    return [...new Set(text.split(/\s+/).filter((name) => this.#classes.has(name)))];
  }

  #matchAnew(
    element: SvgElement,
    id: string | undefined,
    classes: readonly string[],
  ): Declarations | undefined {
    const keys = ['*', element.name, ...classes.map((name) => `.${name}`)];
    if (id) keys.push(`#${id}`);
    const found = keys
      .flatMap((key) => this.#rules.get(key) ?? [])
      .filter(({ selector }) => matches(selector, element.name, id, classes))
      .sort((a, b) => a.selector.specificity - b.selector.specificity || a.order - b.order);
    if (found.length === 0) return undefined;
    const result = { normal: new Map<string, string>(), important: new Map<string, string>() };
    for (const { declarations } of found) {
      for (const [property, value] of declarations.normal) result.normal.set(property, value);
      for (const [property, value] of declarations.important) result.important.set(property, value);
    }
    return { ...result, hasUnread: false, hasWrongTransform: false };
  }

  #addRule(selectors: string, declarations: Declarations): void {
    this.hasUnreadRules ||= declarations.hasUnread;
    this.hasWrongTransform ||= declarations.hasWrongTransform;
    if (declarations.normal.size + declarations.important.size === 0) return;
    for (const text of selectors.split(',')) {
      const selector = parseSelector(text.trim());
      if (!selector || this.#count >= MAX_RULES) {
        this.hasUnreadRules = true;
        if (this.#count >= MAX_RULES) return;
        continue;
      }
      for (const name of selector.classes) this.#classes.add(name);
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

/** Where a mark stands next; the end of the text when it does not. */
function positionOf(text: string, mark: string, from: number): number {
  const found = text.indexOf(mark, from);
  return found < 0 ? text.length : found;
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
