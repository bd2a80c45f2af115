export type CsvCell = string | number | undefined;

/** Text that a spreadsheet would read as a formula, or as the start of one, gets an apostrophe in front. */
const startsFormula = /^[=+\-@＝＋－＠\t\r\n]/;
const needsQuotes = /[",\r\n]/;

function cellText(cell: CsvCell): string {
  if (cell === undefined) return '';
  if (typeof cell === 'number') return String(cell);
  const safe = startsFormula.test(cell) ? `'${cell}` : cell;
  return needsQuotes.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** Rows as CSV of RFC 4180: CRLF after each, quotes where they are needed. Texts never start a formula. */
export const csvText = (rows: readonly (readonly CsvCell[])[]): string =>
  rows.map((row) => `${row.map(cellText).join(',')}\r\n`).join('');
