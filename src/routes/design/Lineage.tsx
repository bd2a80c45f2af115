import { Link } from 'react-router-dom';
import type { Design } from '#shared/api/designs.ts';

const linkLook = 'text-layout underline underline-offset-4';

/** What it was remixed from, and what was remixed from it. */
export function Lineage({ design }: { readonly design: Design }) {
  const { parent, remixes } = design;
  return (
    <section aria-labelledby="lineage-head" className="min-w-0 space-y-3">
      <h2 id="lineage-head" className="label-narrow mb-1 text-ink-soft">
        Lineage
      </h2>
      <p>
        {parent === undefined ? (
          'Not remixed from another design.'
        ) : (
          <>
            From{' '}
            <Link to={`/designs/${parent.slug}?revision=${parent.revision}`} className={linkLook}>
              <span className="figures text-sm">
                {parent.drawingNumber} / {parent.revision}
              </span>{' '}
              {parent.title}
            </Link>{' '}
            by {parent.ownerName}
          </>
        )}
      </p>
      {remixes.length === 0 ? (
        <p>Nobody has remixed it yet.</p>
      ) : (
        <div>
          <p>Remixed into</p>
          <ul className="mt-1 space-y-1">
            {remixes.map(({ slug, title, drawingNumber, ownerName, fromRevision, withheld }) => (
              <li key={slug} className="border-l-2 border-ink pl-3">
                <Link to={`/designs/${slug}`} className={linkLook}>
                  <span className="figures text-sm">{drawingNumber}</span> {title}
                </Link>{' '}
                by {ownerName} <span className="text-sm text-ink-soft">from revision {fromRevision}</span>
                {withheld && <strong className="text-brick"> withheld</strong>}
              </li>
            ))}
          </ul>
        </div>
      )}
    </section>
  );
}
