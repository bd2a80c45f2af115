import type { StandingWord } from '#shared/api/vocabulary.ts';

/** Best first, for the one standing that a card shows when no material is asked for. */
const bestFirst: readonly StandingWord[] = [
  'well-proven',
  'proven',
  'cut-once',
  'uncut',
  'disputed',
  'withheld',
];

interface Ranked {
  readonly word: StandingWord;
  readonly low: number;
}

/** The best of a design's standings over its materials; of equal words the surer one. */
export const bestStanding = <Standing extends Ranked>(standings: readonly Standing[]): Standing | undefined =>
  [...standings].sort((a, b) => bestFirst.indexOf(a.word) - bestFirst.indexOf(b.word) || b.low - a.low)[0];
