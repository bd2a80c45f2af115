import type { MaterialFamily, StandingWord } from '#shared/api/vocabulary.ts';
import type { SearchDocument } from './document.ts';

/** The standing a card shows: in the material that is looked for, else the best. Withheld overrides all. */
export function standingShown(
  { bestStanding, standings }: SearchDocument,
  material: MaterialFamily | undefined,
): StandingWord {
  if (material === undefined || bestStanding === 'withheld') return bestStanding;
  return standings.find((standing) => standing.material === material)?.word ?? 'uncut';
}
