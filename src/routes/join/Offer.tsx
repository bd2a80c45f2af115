import type { InvitationOffer } from '#shared/api/people.ts';
import { roleLabels } from '../../words/labels.ts';
import { sayDay } from '../../words/say-day.ts';

const mayDo = {
  member: 'Find, take, cut and share designs.',
  moderator: 'All that a member may, and judge on evidence what is flagged.',
  administrator: 'All that a moderator may, and invite and suspend members.',
} as const;

/** What the link offers. */
export function Offer({ offer }: { readonly offer: InvitationOffer }) {
  const cells = [
    ['Club', offer.club],
    ['You join as', roleLabels[offer.role]],
    ['Link good until', sayDay(offer.expiresAt)],
  ] as const;
  return (
    <div>
      <dl className="grid gap-px border-2 border-ink bg-ink sm:grid-cols-3">
        {cells.map(([what, text]) => (
          <div key={what} className="min-w-0 bg-paper px-4 py-2">
            <dt className="label-narrow text-ink-soft">{what}</dt>
            <dd className="font-semibold break-words">{text}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-2 text-sm text-ink-soft">{mayDo[offer.role]}</p>
    </div>
  );
}
