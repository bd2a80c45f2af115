import type { Standing } from '#shared/api/designs.ts';
import type { MaterialFamily, StandingWord } from '#shared/api/vocabulary.ts';

const bestFirst: readonly StandingWord[] = [
  'withheld',
  'well-proven',
  'proven',
  'cut-once',
  'disputed',
  'uncut',
];

/** The standing a card shows: of the material asked for, else the best; withheld before all others. */
export const shownStanding = (
  standings: readonly Standing[],
  material?: MaterialFamily | undefined,
): Standing | null => {
  const withheld = standings.find(({ word }) => word === 'withheld');
  const asked = standings.find((standing) => standing.material === material);
  const [best] = [...standings].sort(
    (left, right) =>
      bestFirst.indexOf(left.word) - bestFirst.indexOf(right.word) || right.votesFor - left.votesFor,
  );
  return withheld ?? asked ?? best ?? null;
};
