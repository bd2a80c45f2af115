import type { SearchDocument } from '#server/search/document.ts';
import { kinds, materialFamilies, standingWords } from '#shared/api/vocabulary.ts';
import { type SeededRandom, seededRandom } from './random.ts';

const syllables = 'ta ro mi ka lo ben dra wer sti pol gra fen hul cor mas vin ter qua zel nor'.split(' ');

/** Words as texts have them: the n-th most frequent stands 1/n as often as the first (Zipf). */
function zipfWords(random: SeededRandom, vocabularySize: number): () => string {
  const vocabulary = Array.from({ length: vocabularySize }, () =>
    Array.from({ length: 2 + random.below(3) }, () => random.pick(syllables)).join(''),
  );
  const sums: number[] = [];
  let sum = 0;
  for (let rank = 1; rank <= vocabularySize; rank += 1) {
    sum += 1 / rank;
    sums.push(sum);
  }
  return () => {
    const at = random.next() * sum;
    let low = 0;
    let high = sums.length - 1;
    while (low < high) {
      const middle = (low + high) >> 1;
      if ((sums[middle] ?? 0) < at) low = middle + 1;
      else high = middle;
    }
    return vocabulary[low] ?? '';
  };
}

export interface Searchable {
  documents: SearchDocument[];
  queries: string[];
}

/** Designs and the words people would look for among them. */
export function searchable(count: number, queryCount: number): Searchable {
  const random = seededRandom(42);
  const word = zipfWords(random, 8000);
  const text = (length: number) => Array.from({ length }, word).join(' ');
  const documents = Array.from({ length: count }, (_, place) => documentOf(random, place, text, word));
  const queries = Array.from({ length: queryCount }, () =>
    Array.from({ length: 1 + random.below(3) }, () => {
      const whole = word();
      return random.next() < 0.3 ? whole.slice(0, 3) : whole;
    }).join(' '),
  );
  return { documents, queries };
}

function documentOf(
  random: SeededRandom,
  place: number,
  text: (length: number) => string,
  word: () => string,
): SearchDocument {
  const widthMm = 30 + random.next() * 600;
  const heightMm = 20 + random.next() * 400;
  const material = random.pick(materialFamilies);
  const isCut = random.next() < 0.8;
  const wordOfStanding = random.pick(standingWords.slice(1, 5));
  return {
    id: `id-${String(place).padStart(7, '0')}`,
    slug: `design-${place}`,
    drawingNumber: `ML-${String(place + 1).padStart(4, '0')}`,
    title: text(4),
    summary: text(30),
    tags: [word(), word()],
    kind: random.pick(kinds),
    ownerName: word(),
    createdAt: new Date(1_700_000_000_000 + place * 1_000_000).toISOString(),
    materials: isCut ? [material] : [],
    bitMms: isCut ? [random.pick([3, 3.175, 6, 6.35, 1.5])] : [],
    standings: isCut ? [{ material, word: wordOfStanding }] : [],
    bestStanding: isCut ? wordOfStanding : 'uncut',
    minutes: isCut ? random.next() * 90 : null,
    hullMm: ellipse(widthMm, heightMm),
    widthMm,
    heightMm,
    bitMm: isCut ? 3.175 : null,
  };
}

const ellipse = (widthMm: number, heightMm: number) =>
  Array.from({ length: 24 }, (_, corner) => ({
    x: (widthMm / 2) * (1 + Math.cos((corner / 12) * Math.PI)),
    y: (heightMm / 2) * (1 + Math.sin((corner / 12) * Math.PI)),
  }));
