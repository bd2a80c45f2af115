import type { Flag } from '#shared/api/flags.ts';
import { DecisionMade } from './DecisionMade.tsx';

/** What moderators decided on the same design before, each with the flag it answered. */
export function EarlierDecisions({ flags }: { readonly flags: readonly Flag[] }) {
  return (
    <section aria-labelledby="earlier-head">
      <h2 id="earlier-head" className="label-narrow mb-2 text-ink-soft">
        Other decisions on this design
      </h2>
      {flags.length === 0 ? (
        <p className="text-ink-soft">None.</p>
      ) : (
        <ul className="space-y-4">
          {flags.map(({ id, revision, reason, decision }) => (
            <li key={id} className="space-y-1">
              <p className="text-sm leading-5 text-ink-soft">
                Revision {revision}: {reason}
              </p>
              {decision !== undefined && <DecisionMade decision={decision} />}
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}
