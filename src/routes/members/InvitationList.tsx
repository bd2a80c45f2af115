import { useQuery } from '@tanstack/react-query';
import type { Invitation } from '#shared/api/people.ts';
import { invitationsQuery } from '../../api/invitations.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { roleLabels } from '../../words/labels.ts';
import { sayDay } from '../../words/say-day.ts';

const sayState = ({ usedAt, expiresAt }: Invitation, now: Date): string => {
  if (usedAt !== undefined) return `used ${sayDay(usedAt)}`;
  return new Date(expiresAt) <= now ? `ran out ${sayDay(expiresAt)}` : `open until ${sayDay(expiresAt)}`;
};

export function InvitationList() {
  const { data, error } = useQuery(invitationsQuery);
  if (data === undefined && error !== null) {
    return (
      <ProblemNote
        problem={
          isProblem(error) ? error.problem : { title: 'The list is not there', detail: sentenceOf(error) }
        }
      />
    );
  }
  if (data === undefined) return <Skeleton />;
  if (data.items.length === 0) {
    return <p className="text-ink-soft">No invitation yet. Make a link and send it to one person.</p>;
  }
  const now = new Date();
  return (
    <ul aria-label="Invitations made">
      {data.items.map((invitation) => (
        <li
          key={invitation.id}
          className="flex flex-wrap justify-between gap-x-6 border-b border-rule py-2 leading-6"
        >
          <span className="min-w-0 break-words">
            <strong>{roleLabels[invitation.role]}</strong>
            {invitation.note !== '' && `, ${invitation.note}`}
          </span>
          <span className="text-sm text-ink-soft">
            made {sayDay(invitation.createdAt)} · {sayState(invitation, now)}
          </span>
        </li>
      ))}
    </ul>
  );
}
