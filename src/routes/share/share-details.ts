import type { z } from 'zod';
import {
  type DesignDetails,
  designDetails,
  type RemixDetails,
  type RevisionDetails,
  remixDetails,
  revisionDetails,
} from '#shared/api/designs.ts';
import type { ShareMode } from './share-mode.ts';
import type { ShareValues } from './share-values.ts';

export type ShareDetails = DesignDetails | RevisionDetails | RemixDetails;

const schemas: Readonly<Record<ShareMode['kind'], z.ZodType<ShareDetails>>> = {
  new: designDetails,
  revision: revisionDetails,
  remix: remixDetails,
};

/** What the contract wants of this share. */
export const schemaOf = (mode: ShareMode): z.ZodType<ShareDetails> => schemas[mode.kind];

/** The `details` of the contract, as far as the form has them; the schema says what is wrong with them. */
export const detailsOf = (values: ShareValues, mode: ShareMode): Readonly<Record<string, unknown>> => {
  const { title, kind, summary, licence, tags, scale, isCut, cut, changeNote } = values;
  const always = {
    licence,
    scale: scale.millimetresPerUnit === undefined ? undefined : scale,
    cut: isCut === 'yes' ? cut : undefined,
  };
  const words = { title, kind, summary, tags };
  switch (mode.kind) {
    case 'new':
      return { ...words, ...always };
    case 'revision':
      return { changeNote, ...always };
    case 'remix':
      return { ...words, changeNote, parentRevision: mode.revision, ...always };
  }
};
