/** Thousands are parted by a narrow no-break space, so that a figure never breaks over a line. */
const NARROW_NO_BREAK_SPACE = '\u202f';

/**
 * A figure with a fixed number of decimals and a true minus sign; never shows a minus before zero.
 * Halves go up as people round them: 113.175 is 113.18, though its double lies a hair below.
 */
export const fixed = (value: number, digits: number): string => {
  const scale = 10 ** digits;
  const text = (Math.round(Math.abs(value) * scale * (1 + 1e-13)) / scale).toFixed(digits);
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
