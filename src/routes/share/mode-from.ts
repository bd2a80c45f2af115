import type { Design } from '#shared/api/designs.ts';
import { licenceLabels } from '../../words/labels.ts';
import { remixMode, revisionMode, type ShareMode } from './share-mode.ts';

interface From {
  readonly design: Design;
  /** What it was remixed from. */
  readonly original: Design | null;
  readonly memberId: string;
  readonly as: 'revision' | 'remix';
  readonly revision: number;
}

type Begun = { readonly mode: ShareMode } | { readonly refusal: string };

const revisionFrom = ({ design, original, memberId }: From): Begun => {
  if (design.owner.id !== memberId)
    return {
      refusal: 'Only its uploader issues new revisions of it. What you change, you share as a remix.',
    };
  if (design.withdrawnAt !== undefined)
    return { refusal: 'It was withdrawn, so it gets no new revisions. Share the drawing as a new design.' };
  // Nobody is bound by a licence of their own.
  return { mode: revisionMode(design, original?.owner.id === memberId ? null : original) };
};

const remixFrom = ({ design, memberId, revision }: From): Begun => {
  const issued = design.revisions.find(({ number }) => number === revision);
  const number = issued?.number ?? design.revision.number;
  if (design.withdrawnAt !== undefined) return { refusal: 'It was withdrawn, so it cannot be remixed.' };
  const withheld = issued === undefined ? design.withheld : issued.withheld;
  if (withheld !== undefined)
    return { refusal: `A moderator withheld it, so it cannot be remixed. The reason: ${withheld.reason}` };
  const mode = remixMode(design, number, design.owner.id === memberId);
  if (mode !== null) return { mode };
  return {
    refusal: `Its licence, ${licenceLabels[issued?.licence ?? design.licence]}, allows no changed copies to be shared. Ask ${design.owner.name} for another licence.`,
  };
};

/** What a share starts with, or a sentence that says why it cannot be begun. */
export const modeFrom = (from: From): Begun =>
  from.as === 'revision' ? revisionFrom(from) : remixFrom(from);
