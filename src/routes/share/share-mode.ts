import type { Design } from '#shared/api/designs.ts';
import type { Kind, Licence } from '#shared/api/vocabulary.ts';
import { allowedLicences } from '#shared/licences/remix-table.ts';
import { licenceLabels } from '../../words/labels.ts';
import { licenceSentences } from '../../words/licence-sentences.ts';

const everyLicence = Object.keys(licenceLabels) as Licence[];

/** Which licences may be chosen, and why not the others; null when all may be. */
export interface LicenceChoice {
  readonly licences: readonly Licence[];
  readonly why: string | null;
}

/** What is being shared: something new, the next issue of my design, or what I made from another. */
export type ShareMode =
  | ({ readonly kind: 'new' } & LicenceChoice)
  | ({
      readonly kind: 'revision';
      readonly slug: string;
      readonly title: string;
      readonly number: number;
      readonly licence: Licence;
    } & LicenceChoice)
  | ({
      readonly kind: 'remix';
      readonly slug: string;
      readonly title: string;
      readonly revision: number;
      readonly designKind: Kind;
    } & LicenceChoice);

const free: LicenceChoice = { licences: everyLicence, why: null };

/** What the licence of an original leaves to choose from; the makers of it are not bound by their own. */
export const licenceChoice = (title: string, parent: Licence): LicenceChoice => {
  const licences = allowedLicences(parent);
  if (licences.length === everyLicence.length) return free;
  return {
    licences,
    why: `“${title}” is under ${licenceLabels[parent]}. ${licenceSentences[parent]} So only ${licences.length === 1 ? 'this licence is' : 'these licences are'} open to what is made from it.`,
  };
};

export const newMode: ShareMode = { kind: 'new', ...free };

/** The next revision of `design`; `original` is what it was remixed from, if by somebody else. */
export const revisionMode = (design: Design, original: Design | null): ShareMode => {
  const { slug, title, revision, parent } = design;
  const issued = original?.revisions.find(({ number }) => number === parent?.revision);
  const choice =
    original === null || issued === undefined ? free : licenceChoice(original.title, issued.licence);
  // The licence that it has may always be kept.
  const licences = everyLicence.filter((each) => each === revision.licence || choice.licences.includes(each));
  return {
    kind: 'revision',
    slug,
    title,
    number: revision.number + 1,
    licence: revision.licence,
    licences,
    why: choice.why,
  };
};

/** A remix of a revision; null when its licence allows none. */
export const remixMode = (design: Design, revision: number, isOwner: boolean): ShareMode | null => {
  const { slug, title, kind } = design;
  const licence = design.revisions.find(({ number }) => number === revision)?.licence ?? design.licence;
  const choice = isOwner ? free : licenceChoice(title, licence);
  if (choice.licences.length === 0) return null;
  return { kind: 'remix', slug, title, revision, designKind: kind, ...choice };
};

/** Where it is sent. */
export const sharePath = (mode: ShareMode): string => {
  if (mode.kind === 'new') return '/api/designs';
  const design = `/api/designs/${encodeURIComponent(mode.slug)}`;
  return mode.kind === 'revision' ? `${design}/revisions` : `${design}/remixes`;
};
