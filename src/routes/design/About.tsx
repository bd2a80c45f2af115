import { Link } from 'react-router-dom';
import type { Design } from '#shared/api/designs.ts';
import { kindLabels, licenceLabels } from '../../words/labels.ts';
import { licenceSentences } from '../../words/licence-sentences.ts';
import { evidenceOf } from './evidence.ts';
import { EvidenceTally } from './records/EvidenceTally.tsx';

/** Evidence, licence, kind and tags of a design. */
export function About({ design }: { readonly design: Design }) {
  return (
    <section aria-label="Evidence and licence" className="min-w-0 space-y-4">
      <div>
        <h2 className="label-narrow mb-1 text-ink-soft">Evidence, one stroke a member</h2>
        <EvidenceTally standing={design.standing} records={evidenceOf(design).ofThis} />
      </div>
      <div>
        <h2 className="label-narrow mb-1 text-ink-soft">Licence</h2>
        <p className="font-semibold">{licenceLabels[design.licence]}</p>
        <p className="text-sm leading-5 text-ink-soft">{licenceSentences[design.licence]}</p>
      </div>
      <div>
        <h2 className="label-narrow mb-1 text-ink-soft">Kind and tags</h2>
        <ul className="flex flex-wrap gap-2">
          <li>
            <Link
              to={`/?kind=${design.kind}`}
              className="block border border-ink bg-paper px-2 text-sm leading-6 hover:border-layout hover:text-layout"
            >
              {kindLabels[design.kind]}
            </Link>
          </li>
          {design.tags.map((tag) => (
            <li key={tag}>
              <Link
                to={`/?q=${encodeURIComponent(tag)}`}
                className="block border border-rule px-2 text-sm leading-6 hover:border-layout hover:text-layout"
              >
                {tag}
              </Link>
            </li>
          ))}
        </ul>
      </div>
    </section>
  );
}
