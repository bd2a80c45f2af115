import type { SearchAnswer, SearchDocument, SearchQuery } from './document.ts';

export type SearchCall =
  | { readonly kind: 'upsert'; readonly document: SearchDocument }
  | { readonly kind: 'remove'; readonly id: string }
  | { readonly kind: 'replaceAll'; readonly documents: readonly SearchDocument[] }
  | { readonly kind: 'search'; readonly query: SearchQuery };

export interface NumberedCall {
  readonly number: number;
  readonly call: SearchCall;
}

export type SearchReply =
  | { readonly kind: 'done'; readonly number: number; readonly answer: SearchAnswer | null }
  | { readonly kind: 'bad-cursor'; readonly number: number }
  | { readonly kind: 'failed'; readonly number: number; readonly message: string };
