import type { SearchAnswer, SearchDocument, SearchQuery } from './document.ts';

/** The loft's search, wherever it runs. */
export interface SearchService {
  upsert(document: SearchDocument): Promise<void>;
  remove(id: string): Promise<void>;
  replaceAll(documents: readonly SearchDocument[]): Promise<void>;
  /** Throws BadCursor. */
  search(query: SearchQuery): Promise<SearchAnswer>;
  close(): Promise<void>;
}
