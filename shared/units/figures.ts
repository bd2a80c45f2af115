/** Thousands are parted by a narrow no-break space, so that a figure never breaks over a line. */
const NARROW_NO_BREAK_SPACE = '\u202f';

/** A figure with a fixed number of decimals and a true minus sign; never shows a minus before zero. */
export const fixed = (value: number, digits: number): string => {
  const text = Math.abs(value).toFixed(digits);
  return value < 0 && Number(text) !== 0 ? `\u2212${text}` : text;
};

/** A figure with at most so many decimals: `3.175`, `6.35`, `3`. */
export const trimmed = (value: number, atMostDigits: number): string => {
  const text = fixed(value, atMostDigits);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
};

/** Groups the whole part in threes from four digits up: `1 200`, `18 000`. */
export const grouped = (figure: string): string => {
  const [whole = '', part] = figure.split('.');
  const inThrees = whole.replace(/\B(?=(\d{3})+$)/g, NARROW_NO_BREAK_SPACE);
  return part === undefined ? inThrees : `${inThrees}.${part}`;
};
