import type { Ancestor } from '#server/features/designs/lineage.ts';
import type { RevisionOfDesign } from '#server/features/designs/queries.ts';
import type { PackageSettings } from '#shared/api/package.ts';

const names: Record<string, string> = {
  'CC0-1.0': 'Creative Commons Zero 1.0: given to the public domain',
  'CC-BY-4.0': 'Creative Commons Attribution 4.0: name the author',
  'CC-BY-SA-4.0':
    'Creative Commons Attribution-ShareAlike 4.0: name the author, pass on under the same licence',
  'CC-BY-NC-4.0': 'Creative Commons Attribution-NonCommercial 4.0: name the author, not for sale',
  'CC-BY-NC-SA-4.0':
    'Creative Commons Attribution-NonCommercial-ShareAlike 4.0: name the author, not for sale, pass on under the same licence',
  'CC-BY-ND-4.0': 'Creative Commons Attribution-NoDerivatives 4.0: name the author, pass on unchanged only',
  'CC-BY-NC-ND-4.0':
    'Creative Commons Attribution-NonCommercial-NoDerivatives 4.0: name the author, not for sale, pass on unchanged only',
  'CERN-OHL-P-2.0': 'CERN Open Hardware Licence 2, permissive',
  'CERN-OHL-W-2.0': 'CERN Open Hardware Licence 2, weakly reciprocal',
  'CERN-OHL-S-2.0': 'CERN Open Hardware Licence 2, strongly reciprocal',
};

/** Every original it came from, the nearest first: attribution asks for the maker, the licence and the changes. */
const chainOf = (ancestors: readonly Ancestor[]): string[] =>
  ancestors.flatMap((ancestor, place) => [
    '',
    `${place === 0 ? 'Remixed from' : 'Which was remixed from'} ${ancestor.title}`,
    `Drawing ${ancestor.drawingNumber}, revision ${ancestor.revision}: ${ancestor.changeNote}`,
    `Drawn by ${ancestor.ownerName}`,
    `Licence: ${ancestor.licence}`,
    names[ancestor.licence] ?? ancestor.licence,
  ]);

/** What moderators and the grave findings of the rules say, under a heading; nothing when they say nothing. */
const warningsOf = ({ cautions, record }: Pick<PackageSettings, 'cautions' | 'record'>): string[] => {
  const stopped = (record?.findings ?? []).filter(({ level }) => level === 'do-not-cut');
  const lines = [
    ...cautions.map((reason) => `- A moderator says: ${reason}`),
    ...stopped.map(({ sentence, source }) => `- Do not cut with these settings: ${sentence} (${source})`),
  ];
  return lines.length === 0 ? [] : ['', 'READ THIS BEFORE YOU CUT', ...lines];
};

/** The text that goes with every package: what may be done with it, who drew it, and from whose work. */
export function licenceAndCredits(
  found: RevisionOfDesign,
  ancestors: readonly Ancestor[],
  settings: Pick<PackageSettings, 'cautions' | 'record'>,
): string {
  const { design, revision, ownerName } = found;
  const lines = [
    `${design.title}`,
    `Drawing ${design.drawingNumber}, revision ${revision.number}, ${revision.createdAt.toISOString().slice(0, 10)}: ${revision.changeNote}`,
    '',
    `Drawn by ${ownerName}`,
    ...(settings.record === undefined ? [] : [`Settings recorded by ${settings.record.memberName}`]),
    ...warningsOf(settings),
    '',
    `Licence: ${revision.licence}`,
    names[revision.licence] ?? revision.licence,
    ...chainOf(ancestors),
    '',
    'The settings are starting points to be tried on scrap. The machine maker’s manual, the limits marked on the',
    'bit and local rules come first.',
    '',
  ];
  return lines.join('\n');
}
