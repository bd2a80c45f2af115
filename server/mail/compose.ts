import { eq } from 'drizzle-orm';
import {
  club,
  decision,
  design,
  flag,
  invitation,
  type outbox,
  revision,
  user,
} from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { invitationLink } from '#server/features/people/invitation-code.ts';
import { decisionSentence } from '#server/features/review/decision-words.ts';
import { layOut } from './layout.ts';
import type { MailMessage } from './message.ts';
import { decisionLetter, invitationLetter } from './templates.ts';

export type ComposeDeps = Pick<Deps, 'database' | 'clock' | 'secret' | 'origins'>;
type Row = Pick<typeof outbox.$inferSelect, 'id' | 'kind' | 'payload'>;

/** Puts a waiting mail together from what is true now; null when there is nothing left to say. */
export async function composeMail(deps: ComposeDeps, row: Row): Promise<MailMessage | null> {
  switch (row.kind) {
    case 'invitation':
      return composeInvitation(deps, row);
    case 'decision':
      return composeDecision(deps, row);
    default:
      throw new Error(`no template for mail of kind ${row.kind}`);
  }
}

/** The link is made again from the invitation's id: no row of the database ever held it. */
async function composeInvitation(deps: ComposeDeps, { id, payload }: Row): Promise<MailMessage | null> {
  const { db } = deps.database;
  const [found] = await db
    .select({ invitation, inviterName: user.name })
    .from(invitation)
    .leftJoin(user, eq(user.id, invitation.createdBy))
    .where(eq(invitation.id, payload['invitationId'] ?? ''));
  const isOver =
    found === undefined || found.invitation.usedAt !== null || found.invitation.expiresAt <= deps.clock.now();
  if (isOver) return null;
  const [row] = await db.select({ name: club.name }).from(club);
  const letter = invitationLetter({
    clubName: row?.name ?? 'the club',
    inviterName: found.inviterName,
    role: found.invitation.role,
    expiresAt: found.invitation.expiresAt,
    link: invitationLink(deps, found.invitation.id),
  });
  return { id, to: { name: '', address: payload['to'] ?? '' }, ...layOut(letter) };
}

async function composeDecision(deps: ComposeDeps, { id, payload }: Row): Promise<MailMessage | null> {
  const { db } = deps.database;
  const [found] = await db
    .select({ decision, design, number: revision.number })
    .from(decision)
    .innerJoin(flag, eq(flag.id, decision.flagId))
    .innerJoin(design, eq(design.id, flag.designId))
    .innerJoin(revision, eq(revision.id, flag.revisionId))
    .where(eq(decision.id, payload['decisionId'] ?? ''));
  const [member] = await db
    .select()
    .from(user)
    .where(eq(user.id, payload['memberId'] ?? ''));
  if (found === undefined || member === undefined) return null;
  const named = { ...found.design, revision: found.number };
  const letter = decisionLetter({
    name: member.name,
    sentence: payload['sentence'] ?? decisionSentence(found.decision.action, named, found.decision.reason),
    design: found.design,
    isOwner: found.design.ownerId === member.id,
    link: `${deps.origins[0]}/designs/${found.design.slug}`,
  });
  return { id, to: { name: member.name, address: member.email }, ...layOut(letter) };
}
