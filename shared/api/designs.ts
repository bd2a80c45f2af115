import { z } from 'zod';
import { cutRecord, firstCut } from './cuts.ts';
import { drawingSummary, millimetresPerUnit } from './drawings.ts';
import { id, numberText, optionalWords, timestamp, version, wholeNumber, words } from './primitives.ts';
import { bitKind, kind, licence, material, materialFamily, sort, standingWord } from './vocabulary.ts';

const designWords = {
  title: words(90, 'Title'),
  summary: optionalWords(1000, 'Summary'),
  kind,
  tags: z.array(words(30, 'Tag')).max(12, 'Use at most 12 tags'),
};

/** The `details` part of a share. */
export const designDetails = z.strictObject({
  ...designWords,
  licence,
  scale: z.strictObject({ millimetresPerUnit }).optional(),
  cut: firstCut.optional(),
});
export type DesignDetails = z.infer<typeof designDetails>;

/** The `details` part of a new revision: what changed, and the settings if it was cut. */
export const revisionDetails = z.strictObject({
  changeNote: words(300, 'Change note'),
  licence: licence.optional(),
  scale: z.strictObject({ millimetresPerUnit }).optional(),
  cut: firstCut.optional(),
});
export type RevisionDetails = z.infer<typeof revisionDetails>;

/** The `details` part of a remix: a share that names the revision it was made from. */
export const remixDetails = designDetails.extend({
  parentRevision: wholeNumber(1, 100_000, 'Parent revision'),
  changeNote: words(300, 'Change note'),
});
export type RemixDetails = z.infer<typeof remixDetails>;

export const designChange = z
  .strictObject({ ...designWords, version })
  .partial({ title: true, summary: true, kind: true, tags: true });
export type DesignChange = z.infer<typeof designChange>;

const person = z.object({ id, name: z.string() });

export const standing = z.object({
  material: materialFamily,
  word: standingWord,
  votesFor: z.number().int(),
  votesAgainst: z.number().int(),
  /** Ends of the 95 % Wilson interval of votes for. */
  low: z.number(),
  high: z.number(),
});
export type Standing = z.infer<typeof standing>;

export const revision = z.object({
  number: z.number().int(),
  geometryHash: z.string(),
  drawing: drawingSummary,
  licence,
  changeNote: z.string(),
  createdAt: timestamp,
  createdBy: person,
  /** Withheld by a moderator: it is not handed out, and this says why. */
  withheld: z.object({ reason: z.string() }).optional(),
});
export type Revision = z.infer<typeof revision>;

const designCommon = {
  id,
  slug: z.string(),
  drawingNumber: z.string(),
  title: z.string(),
  summary: z.string(),
  kind,
  licence,
  tags: z.array(z.string()),
  owner: person,
  version,
  createdAt: timestamp,
  standing: z.array(standing),
  /** The revision that a remix was made from. */
  parent: z
    .object({
      slug: z.string(),
      revision: z.number().int(),
      title: z.string(),
      drawingNumber: z.string(),
      ownerName: z.string(),
    })
    .optional(),
  /** The whole design, or its newest revision, is withheld. */
  withheld: z.object({ reason: z.string() }).optional(),
  /** Cautions that moderators put on it. */
  cautions: z.array(z.object({ reason: z.string(), decidedAt: timestamp })),
  withdrawnAt: timestamp.optional(),
};

export const design = z.object({
  ...designCommon,
  revision,
  revisions: z.array(revision.omit({ drawing: true })),
  /** Records of every revision, newest first. */
  cuts: z.array(cutRecord),
  /** Votes of the settings of a record, by the same count over records cut with them. */
  settingsStanding: z.array(
    z.object({
      recordId: id,
      word: standingWord,
      votesFor: z.number().int(),
      votesAgainst: z.number().int(),
      low: z.number(),
      high: z.number(),
    }),
  ),
  remixes: z.array(
    z.object({
      slug: z.string(),
      title: z.string(),
      drawingNumber: z.string(),
      ownerName: z.string(),
      fromRevision: z.number().int(),
      withheld: z.boolean(),
    }),
  ),
  /** True once I took any revision of it. */
  takenByMe: z.boolean(),
  takeCount: z.number().int(),
});
export type Design = z.infer<typeof design>;

export const designListItem = z.object({
  ...designCommon,
  revision: z.object({
    number: z.number().int(),
    geometryHash: z.string(),
    drawing: drawingSummary.pick({ widthMm: true, heightMm: true, boundsMm: true }),
  }),
  /** Path data of the simplified drawing in page millimetres, at most 4 kB. */
  outline: z.string(),
  hullMm: z.array(z.object({ x: z.number(), y: z.number() })),
  /** From the newest cut record, absent while uncut. */
  cut: z
    .object({
      bitMm: z.number(),
      bitKind,
      materialId: material,
      stockThicknessMm: z.number(),
      runTimeS: z.number(),
    })
    .optional(),
});
export type DesignListItem = z.infer<typeof designListItem>;

const facet = z.array(z.object({ value: z.string(), count: z.number().int() }));
export const designList = z.object({
  items: z.array(designListItem),
  total: z.number().int(),
  nextCursor: z.string().nullable(),
  facets: z.object({ kind: facet, material: facet, bitMm: facet, standing: facet, fits: facet }),
});
export type DesignList = z.infer<typeof designList>;

export const designQuery = z
  .strictObject({
    q: z.string().max(200, 'Search for at most 200 characters').optional(),
    kind: kind.optional(),
    material: materialFamily.optional(),
    bitMm: numberText('bitMm').optional(),
    standing: standingWord.optional(),
    machineId: id.optional(),
    fits: z.literal('true', 'fits is true or left out').optional(),
    maxMinutes: numberText('maxMinutes').optional(),
    sort: sort.optional(),
    cursor: z.string().max(500).optional(),
  })
  .refine((query) => query.fits === undefined || query.machineId !== undefined, {
    path: ['machineId'],
    message: 'fits needs machineId: say which machine the designs should fit',
  });
export type DesignQuery = z.infer<typeof designQuery>;

/** For whom a drawing or package is taken, and with whose settings. */
export const takeQuery = z.strictObject({ machineId: id.optional(), recordId: id.optional() });
