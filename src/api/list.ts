/** Every list of the API. */
export interface List<Item> {
  readonly items: readonly Item[];
  readonly total: number;
  readonly nextCursor: string | null;
}
