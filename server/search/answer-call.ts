import type { SearchAnswer } from './document.ts';
import type { SearchIndex } from './index.ts';
import type { SearchCall } from './messages.ts';

/** Carries out one call; only a search has an answer. */
export function answerCall(index: SearchIndex, call: SearchCall): SearchAnswer | null {
  switch (call.kind) {
    case 'search':
      return index.search(call.query);
    case 'upsert':
      index.upsert(call.document);
      return null;
    case 'remove':
      index.remove(call.id);
      return null;
    case 'replaceAll':
      index.replaceAll(call.documents);
      return null;
  }
}
