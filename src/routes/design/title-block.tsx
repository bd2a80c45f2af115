import type { ReactNode } from 'react';
import type { Design } from '#shared/api/designs.ts';
import { TitleBlock } from '../../components/TitleBlock.tsx';
import { shownStanding } from '../../evidence/shown-standing.ts';
import { materialLabels, standingLabels } from '../../words/labels.ts';

/** The drawing number, revision and maker of what a design was remixed from. */
const fromOf = ({ parent }: Design): string | undefined =>
  parent === undefined ? undefined : `${parent.drawingNumber} / ${parent.revision} by ${parent.ownerName}`;

/** The title block of a revision, once its sheet has chosen a scale. */
export const titleBlockOf =
  (design: Design, revision: number = design.revision.number) =>
  (scale: string): ReactNode => {
    const standing = shownStanding(design.standing);
    const hasVotes = standing !== null && standing.votesFor + standing.votesAgainst > 0;
    const word = design.withheld === undefined ? (standing?.word ?? 'uncut') : 'withheld';
    const shown = design.revisions.find(({ number }) => number === revision) ?? design.revision;
    return (
      <TitleBlock
        title={design.title}
        drawingNumber={design.drawingNumber}
        revisionNumber={shown.number}
        createdAt={shown.createdAt}
        scale={scale}
        drawnBy={design.owner.name}
        lastCutBy={design.cuts[0]?.member.name ?? null}
        standingIn={hasVotes && word !== 'withheld' ? materialLabels[standing.material] : null}
        standing={standingLabels[word]}
        licence={shown.licence}
        from={fromOf(design)}
        revisions={design.revisions.map(({ number, changeNote, createdBy, createdAt, withheld }) => ({
          number,
          changeNote: withheld === undefined ? changeNote : `${changeNote} (withheld)`,
          by: createdBy.name,
          createdAt,
          href: number === shown.number ? undefined : `/designs/${design.slug}?revision=${number}`,
        }))}
      />
    );
  };
