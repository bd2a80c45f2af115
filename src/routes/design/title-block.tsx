import type { ReactNode } from 'react';
import type { Design } from '#shared/api/designs.ts';
import { TitleBlock } from '../../components/TitleBlock.tsx';
import { shownStanding } from '../../evidence/shown-standing.ts';
import { materialLabels, standingLabels } from '../../words/labels.ts';

/** The title block of a design, once its sheet has chosen a scale. */
export const titleBlockOf =
  (design: Design) =>
  (scale: string): ReactNode => {
    const standing = shownStanding(design.standing);
    const hasVotes = standing !== null && standing.votesFor + standing.votesAgainst > 0;
    return (
      <TitleBlock
        title={design.title}
        drawingNumber={design.drawingNumber}
        revisionNumber={design.revision.number}
        createdAt={design.revision.createdAt}
        scale={scale}
        drawnBy={design.owner.name}
        lastCutBy={design.cuts[0]?.member.name ?? null}
        standingIn={hasVotes ? materialLabels[standing.material] : null}
        standing={standingLabels[standing?.word ?? 'uncut']}
        licence={design.licence}
        revisions={design.revisions.map(({ number, changeNote, createdBy, createdAt }) => ({
          number,
          changeNote,
          by: createdBy.name,
          createdAt,
        }))}
      />
    );
  };
