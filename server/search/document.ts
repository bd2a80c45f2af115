import type { Machine } from '#shared/api/bench.ts';
import type { Kind, MaterialFamily, Sort, StandingWord } from '#shared/api/vocabulary.ts';
import type { Point } from '#shared/drawing/types.ts';
import type { FitBed } from '#shared/fit/fit-input.ts';

/** What the loft's search knows of one design: its newest available revision, ready to be filtered. */
export interface SearchDocument {
  readonly id: string;
  readonly slug: string;
  readonly drawingNumber: string;
  readonly title: string;
  readonly summary: string;
  readonly tags: readonly string[];
  readonly kind: Kind;
  readonly ownerName: string;
  /** ISO 8601, UTC. */
  readonly createdAt: string;
  /** Each once. */
  readonly materials: readonly MaterialFamily[];
  /** Cutting diameters of the bits in its cut records. */
  readonly bitMms: readonly number[];
  /** One a material family; empty while uncut. */
  readonly standings: readonly { readonly material: MaterialFamily; readonly word: StandingWord }[];
  readonly bestStanding: StandingWord;
  /** Run time of the newest cut record; null while uncut. */
  readonly minutes: number | null;
  readonly hullMm: readonly Point[];
  readonly widthMm: number;
  readonly heightMm: number;
  /** Bit of the newest cut record, by which the machine's travel is wider than the drawing. */
  readonly bitMm: number | null;
}

/** The machine that `fits` is asked for; id and version say when an earlier answer still holds. */
export type SearchMachine = Pick<Machine, 'id' | 'version'> & FitBed;

export interface SearchQuery {
  readonly q?: string | undefined;
  readonly kind?: Kind | undefined;
  readonly material?: MaterialFamily | undefined;
  /** Designs cut with a bit within 0.02 mm of this. */
  readonly bitMm?: number | undefined;
  /** The standing in `material` when that is given, else the best one. */
  readonly standing?: StandingWord | undefined;
  /** Designs whose run time is not known are left out. */
  readonly maxMinutes?: number | undefined;
  /** True: only what fits `machine`. */
  readonly fits?: boolean | undefined;
  readonly machine?: SearchMachine | undefined;
  /** Absent: by match when there are words to match, else the newest first. */
  readonly sort?: Sort | undefined;
  readonly cursor?: string | undefined;
  readonly limit: number;
}

/** `count` is the total that the query would have with this facet's filter set to `value`. */
export interface FacetCount {
  value: string;
  count: number;
}

export interface SearchFacets {
  kind: FacetCount[];
  material: FacetCount[];
  bitMm: FacetCount[];
  standing: FacetCount[];
  /** One entry, 'true', when a machine was named; else empty. */
  fits: FacetCount[];
}

export interface SearchAnswer {
  ids: string[];
  total: number;
  nextCursor: string | null;
  facets: SearchFacets;
}

/** A cursor that this search did not make, or made for another order. */
export class BadCursor extends Error {
  constructor() {
    super('The cursor was not made by this list in this order. Leave it out to start from the first page.');
  }
}
