/** The rows of a raw query: both drivers answer with an object that has them. */
export function rowsOf<Row>(result: unknown): Row[] {
  return (result as { rows: Row[] }).rows;
}
