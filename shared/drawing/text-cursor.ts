const POWERS_OF_TEN = Array.from({ length: 23 }, (_, exponent) => 10 ** exponent);

function isDigit(code: number): boolean {
  return code >= 48 && code <= 57;
}

/** True for the white space of SVG: space, tab, line feed, form feed, carriage return. */
export function isSpace(code: number): boolean {
  return code === 32 || code === 10 || code === 9 || code === 13 || code === 12;
}

/** Reads numbers, flags and separators of SVG's number lists, on character codes since it is hot. */
export class TextCursor {
  readonly text: string;
  index = 0;

  constructor(text: string) {
    this.text = text;
  }

  get atEnd(): boolean {
    return this.index >= this.text.length;
  }

  /** Character code at the cursor; NaN at the end. */
  peek(): number {
    return this.text.charCodeAt(this.index);
  }

  skipSpace(): void {
    while (isSpace(this.text.charCodeAt(this.index))) this.index++;
  }

  /** Skips white space with at most one comma in it; true when there was a comma. */
  skipCommaSpace(): boolean {
    this.skipSpace();
    if (this.peek() !== 44) return false;
    this.index++;
    this.skipSpace();
    return true;
  }

  /** True when a number may start here. */
  startsNumber(): boolean {
    const code = this.peek();
    return isDigit(code) || code === 45 || code === 46 || code === 43;
  }

  /** An arc flag, 0 or 1, which may be followed by the next number at once; NaN when there is none. */
  flag(): number {
    const code = this.peek();
    if (code !== 48 && code !== 49) return Number.NaN;
    this.index++;
    return code - 48;
  }

  /** A number of the SVG 2 grammar; NaN, and the cursor unmoved, when there is none. May be infinite. */
  number(): number {
    const text = this.text;
    const start = this.index;
    let i = start;
    let code = text.charCodeAt(i);
    const negative = code === 45;
    if (negative || code === 43) code = text.charCodeAt(++i);
    let mantissa = 0;
    let digits = 0;
    let decimals = 0;
    while (isDigit(code)) {
      mantissa = mantissa * 10 + code - 48;
      digits++;
      code = text.charCodeAt(++i);
    }
    if (code === 46 && isDigit(text.charCodeAt(i + 1))) {
      code = text.charCodeAt(++i);
      while (isDigit(code)) {
        mantissa = mantissa * 10 + code - 48;
        digits++;
        decimals++;
        code = text.charCodeAt(++i);
      }
    }
    if (digits === 0) return Number.NaN;
    let hasExponent = false;
    if (code === 101 || code === 69) {
      let j = i + 1;
      const sign = text.charCodeAt(j);
      if (sign === 45 || sign === 43) j++;
      if (isDigit(text.charCodeAt(j))) {
        hasExponent = true;
        while (isDigit(text.charCodeAt(j))) j++;
        i = j;
      }
    }
    this.index = i;
    // Up to 15 digits the quotient of two exact doubles is the correctly rounded number.
    if (hasExponent || digits > 15) return Number(text.slice(start, i));
    const value = mantissa / (POWERS_OF_TEN[decimals] ?? 1);
    return negative ? -value : value;
  }
}

/** All numbers of a list such as `viewBox` or `points`; `errorIndex` says where it stops being one. */
export function readNumberList(text: string): { readonly values: number[]; readonly errorIndex?: number } {
  const cursor = new TextCursor(text);
  const values: number[] = [];
  cursor.skipSpace();
  while (!cursor.atEnd) {
    const value = cursor.number();
    if (Number.isNaN(value)) return { values, errorIndex: cursor.index };
    values.push(value);
    const comma = cursor.skipCommaSpace();
    if (comma && cursor.atEnd) return { values, errorIndex: text.length - 1 };
  }
  return { values };
}
