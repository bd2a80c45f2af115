import { answerCall } from './answer-call.ts';
import type { SearchAnswer, SearchDocument, SearchQuery } from './document.ts';
import { SearchIndex } from './index.ts';
import type { SearchCall } from './messages.ts';
import { SearchThread, type SearchThreadOptions } from './search-thread.ts';

/** The loft's search, wherever it runs. */
export interface SearchService {
  upsert(document: SearchDocument): Promise<void>;
  remove(id: string): Promise<void>;
  replaceAll(documents: readonly SearchDocument[]): Promise<void>;
  /** Throws BadCursor. */
  search(query: SearchQuery): Promise<SearchAnswer>;
  close(): Promise<void>;
}

/** In the calling thread: for tests and small libraries. */
export function inThreadSearch(): SearchService {
  const index = new SearchIndex();
  return serviceOver(
    async (call) => answerCall(index, call),
    async () => {},
  );
}

/** In a thread of its own, so that a broad search of a large library does not hold up other requests. */
export function inWorkerSearch(options: SearchThreadOptions): SearchService {
  const thread = new SearchThread(options);
  return serviceOver(
    (call) => thread.call(call),
    () => thread.close(),
  );
}

function serviceOver(
  call: (call: SearchCall) => Promise<SearchAnswer | null>,
  close: () => Promise<void>,
): SearchService {
  return {
    async upsert(document) {
      await call({ kind: 'upsert', document });
    },
    async remove(id) {
      await call({ kind: 'remove', id });
    },
    async replaceAll(documents) {
      await call({ kind: 'replaceAll', documents });
    },
    async search(query) {
      const answer = await call({ kind: 'search', query });
      if (answer === null) throw new Error('A search came back without an answer');
      return answer;
    },
    close,
  };
}
