export type NumberReading =
  | { readonly ok: true; readonly value: number; readonly isFraction: boolean; readonly unitText: string }
  | { readonly ok: false; readonly message: string };

const vulgarFraction = /[\u00bc-\u00be\u2150-\u215e]/g;

/** One spelling for every way of typing the same thing: spaces, fraction signs, inch marks. */
const plain = (text: string): string =>
  text
    .replace(vulgarFraction, (sign) => ` ${sign.normalize('NFKC')}`)
    .replace(/\u2044/g, '/')
    .replace(/[\u2033\u201c\u201d]|''|\u2032\u2032/g, '"')
    .replace(/\u2212/g, '-')
    .replace(/\s+/g, ' ')
    .trim();

const fraction = /^(?:(\d+)(?: ?- ?| ))?(\d+) ?\/ ?(\d+) ?(\D.*)?$/;
const decimal = /^(\d{1,3}(?: \d{3})+(?:[.,]\d+)?|\d+(?:[.,]\d*)?|[.,]\d+) ?(\D.*)?$/;
const couldBeThousands = /^[1-9]\d{0,2},\d{3}$/;

const readFraction = (match: RegExpExecArray): NumberReading => {
  const numerator = Number(match[2]);
  const denominator = Number(match[3]);
  if (denominator === 0) return { ok: false, message: 'The lower number of a fraction must not be 0' };
  if (match[1] !== undefined && numerator >= denominator) {
    return {
      ok: false,
      message: `After a whole number the fraction must be less than 1, which ${match[2]}/${match[3]} is not`,
    };
  }
  const value = Number(match[1] ?? 0) + numerator / denominator;
  return { ok: true, value, isFraction: true, unitText: (match[4] ?? '').trim().toLowerCase() };
};

/**
 * Reads the number a text begins with and leaves the rest as the unit's text, in lower case.
 * Takes `6.35`, `6,35`, `1 200`, `23/32`, `1 1/4`, `1-1/4`, `1½`. Numbers below zero are refused.
 * `1,200` is refused when `commaGroupsThousands` is not set: it could be either of two numbers.
 */
export const readNumberText = (
  text: string,
  what: string,
  { commaGroupsThousands = false }: { readonly commaGroupsThousands?: boolean } = {},
): NumberReading => {
  const typed = plain(text);
  if (typed.startsWith('-')) return { ok: false, message: `${what} must not be below zero` };
  const asFraction = fraction.exec(typed);
  if (asFraction !== null) return readFraction(asFraction);
  const asDecimal = decimal.exec(
    commaGroupsThousands ? typed.replace(/(?<=\d),(?=\d{3}(?!\d))/g, '') : typed,
  );
  const digits = asDecimal?.[1];
  if (asDecimal === null || digits === undefined) {
    return { ok: false, message: `${what} must begin with a number` };
  }
  if (couldBeThousands.test(digits)) {
    const joined = digits.replace(',', '');
    return {
      ok: false,
      message: `${digits} could be ${digits.replace(',', '.')} or ${joined}: write it without the comma`,
    };
  }
  const value = Number(digits.replaceAll(' ', '').replace(',', '.'));
  if (!Number.isFinite(value)) return { ok: false, message: `${what} is too large a number` };
  return { ok: true, value, isFraction: false, unitText: (asDecimal[2] ?? '').trim().toLowerCase() };
};
