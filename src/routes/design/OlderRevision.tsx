import { Link } from 'react-router-dom';
import type { Design } from '#shared/api/designs.ts';

interface OlderRevisionProps {
  readonly design: Design;
  readonly revision: number;
}

/** Above the drawing of an older revision: what on the page is still of the newest. */
export function OlderRevision({ design, revision }: OlderRevisionProps) {
  const withheld = design.revisions.find(({ number }) => number === revision)?.withheld;
  return (
    <div role="status" className="mb-4 border-2 border-layout bg-paper p-4">
      <p>
        <strong>This is the drawing of revision {revision}.</strong> Fit, settings and taking below are of
        revision {design.revision.number}, the newest.{' '}
        <Link to={`/designs/${design.slug}`} className="text-layout underline underline-offset-4">
          Show revision {design.revision.number}
        </Link>
      </p>
      {withheld !== undefined && (
        <p className="mt-1">
          <strong className="text-brick">Revision {revision} is withheld by a moderator.</strong>{' '}
          {withheld.reason}
        </p>
      )}
    </div>
  );
}
