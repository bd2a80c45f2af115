import MiniSearch, { type Query } from 'minisearch';
import type { SearchDocument } from './document.ts';
import { drawingNumberTerms, termsOf, wordsOf } from './words.ts';

const fields = ['title', 'drawingNumber', 'tags', 'kind', 'summary', 'ownerName'] as const;
type Field = (typeof fields)[number];

const weights: Record<Field, number> = {
  title: 4,
  drawingNumber: 4,
  tags: 2,
  kind: 2,
  summary: 1,
  ownerName: 1,
};

const fieldText = (document: SearchDocument, field: Field): string =>
  field === 'tags' ? document.tags.join(' ') : document[field];

/** A slip of the pen is forgiven in words, never in figures: 0143 is another drawing than 0142. */
const forgiveness = (term: string): number | false => (term.length >= 4 && !/\d/.test(term) ? 0.2 : false);

/** The words of the documents, with which of them a search matches and how well. */
export class TextIndex {
  readonly #index = new MiniSearch<SearchDocument>({
    fields: [...fields],
    extractField: (document: SearchDocument, name: string) =>
      name === 'id' ? document.id : fieldText(document, name as Field),
    tokenize: (text, field) => (field === 'drawingNumber' ? drawingNumberTerms(text) : termsOf(text)),
    processTerm: (term) => term,
    searchOptions: {
      boost: weights,
      prefix: true,
      fuzzy: forgiveness,
      // A query comes as a tree whose leaves are terms already.
      tokenize: (term) => [term],
      processTerm: (term) => term,
    },
  });

  add(document: SearchDocument): void {
    this.#index.add(document);
  }

  /** Takes the document as it was added, so that nothing of it stays behind. */
  remove(document: SearchDocument): void {
    this.#index.remove(document);
  }

  /** Ids with their scores; null when the text has no word to look for. */
  match(text: string): Map<string, number> | null {
    const words = wordsOf(text).map(queryForWord);
    if (words.length === 0) return null;
    let found = this.#index.search({ combineWith: 'AND', queries: words });
    // OR would match most of the library: it is asked only when no document has all the words.
    if (found.length === 0 && words.length > 1) {
      found = this.#index.search({ combineWith: 'OR', queries: words });
    }
    return new Map(found.map(({ id, score }) => [id as string, score]));
  }
}

/** `hold-down` finds `holddown`, and `hold` together with `down`. */
function queryForWord(parts: string[]): Query {
  const [only] = parts;
  if (parts.length === 1 && only !== undefined) return only;
  return { combineWith: 'OR', queries: [parts.join(''), { combineWith: 'AND', queries: parts }] };
}
