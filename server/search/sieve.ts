import { countBitSizes, isSameSize } from './bit-sizes.ts';
import type { FacetCount, SearchDocument, SearchFacets, SearchQuery } from './document.ts';
import { standingShown } from './standing-shown.ts';

/** Lets documents through that pass every filter, and counts for each facet those that pass all the others. */
export class Sieve {
  readonly #query: SearchQuery;
  readonly #fitsMachine: ((document: SearchDocument) => boolean) | null;
  readonly #kinds = new Map<string, number>();
  readonly #materials = new Map<string, number>();
  readonly #standings = new Map<string, number>();
  readonly #anyBit: SearchDocument[] = [];
  #fitting = 0;

  /** `fitsMachine` is null when the query names no machine. */
  constructor(query: SearchQuery, fitsMachine: ((document: SearchDocument) => boolean) | null) {
    this.#query = query;
    this.#fitsMachine = fitsMachine;
  }

  passes(document: SearchDocument): boolean {
    const query = this.#query;
    if (
      query.maxMinutes !== undefined &&
      !(document.minutes !== null && document.minutes <= query.maxMinutes)
    )
      return false;
    const kind = query.kind === undefined || document.kind === query.kind;
    const material = query.material === undefined || document.materials.includes(query.material);
    const bit = hasBit(document, query.bitMm);
    const shown = standingShown(document, query.material);
    const standing = query.standing === undefined || shown === query.standing;

    if (kind && material && bit && standing && this.#fitsMachine?.(document)) this.#fitting++;
    // Fit is the dear one: it is asked last, and not of documents that no count needs.
    const failed = Number(!kind) + Number(!material) + Number(!bit) + Number(!standing);
    const needed = failed <= 1 || (kind && bit);
    if (!needed || (query.fits === true && !this.#fitsMachine?.(document))) return false;

    if (material && bit && standing) add(this.#kinds, document.kind);
    if (kind && material && standing) this.#anyBit.push(document);
    if (kind && material && bit) add(this.#standings, shown);
    if (kind && bit) this.#countMaterials(document);
    return failed === 0;
  }

  facets(): SearchFacets {
    return {
      kind: mostFirst(this.#kinds),
      material: mostFirst(this.#materials),
      bitMm: countBitSizes(this.#anyBit),
      standing: mostFirst(this.#standings),
      fits: this.#fitsMachine === null ? [] : [{ value: 'true', count: this.#fitting }],
    };
  }

  /** The standing asked for is the standing in the material that would be chosen. */
  #countMaterials(document: SearchDocument): void {
    const { standing } = this.#query;
    for (const material of document.materials) {
      if (standing === undefined || standingShown(document, material) === standing)
        add(this.#materials, material);
    }
  }
}

const hasBit = ({ bitMms }: SearchDocument, bitMm: number | undefined): boolean =>
  bitMm === undefined || bitMms.some((mm) => isSameSize(mm, bitMm));

const add = (counts: Map<string, number>, value: string): void => {
  counts.set(value, (counts.get(value) ?? 0) + 1);
};

const mostFirst = (counts: Map<string, number>): FacetCount[] =>
  [...counts]
    .sort((a, b) => b[1] - a[1] || (a[0] < b[0] ? -1 : 1))
    .map(([value, count]) => ({ value, count }));
