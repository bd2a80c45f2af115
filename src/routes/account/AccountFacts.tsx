import type { Me } from '#shared/api/people.ts';
import { roleLabels } from '../../words/labels.ts';

/** Who is signed in, as the cells of a title block. */
export function AccountFacts({ me }: { readonly me: Me }) {
  const cells = [
    ['Name', me.name],
    ['Role', roleLabels[me.role]],
    ['E-mail', me.email],
    ['Club', me.club.name],
  ] as const;
  return (
    <section aria-label="Who you are">
      <dl className="grid gap-px border-2 border-ink bg-ink sm:grid-cols-2">
        {cells.map(([what, text]) => (
          <div key={what} className="min-w-0 bg-paper px-4 py-2">
            <dt className="label-narrow text-ink-soft">{what}</dt>
            <dd className="text-lg leading-7 font-semibold break-words">{text}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-2 text-sm text-ink-soft">An administrator of the club changes roles.</p>
    </section>
  );
}
