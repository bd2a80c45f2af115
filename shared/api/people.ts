import { z } from 'zod';
import { id, listOf, optionalWords, timestamp, version, wholeNumber, words } from './primitives.ts';
import { role } from './vocabulary.ts';

export const me = z.object({
  id,
  name: z.string(),
  email: z.string(),
  role,
  club: z.object({ name: z.string() }),
});
export type Me = z.infer<typeof me>;

export const member = z.object({
  id,
  name: z.string(),
  email: z.string(),
  role,
  suspendedAt: timestamp.optional(),
  createdAt: timestamp,
  version,
});
export type Member = z.infer<typeof member>;
export const memberList = listOf(member);

export const memberChange = z.strictObject({
  role: role.optional(),
  suspended: z.boolean({ error: 'suspended is true or false' }).optional(),
  version,
});
export type MemberChange = z.infer<typeof memberChange>;

export const invitationCreate = z.strictObject({
  role,
  note: optionalWords(200, 'Note').optional(),
  /** Days until the link stops working. */
  validDays: wholeNumber(1, 60, 'Days').default(14),
  /** Where the link is sent by mail; without it, whoever made the link hands it over. */
  email: z.email('E-mail must be an address such as name@example.org').max(200).optional(),
});
export type InvitationCreate = z.input<typeof invitationCreate>;

export const invitation = z.object({
  id,
  role,
  note: z.string(),
  createdAt: timestamp,
  expiresAt: timestamp,
  usedAt: timestamp.optional(),
});
export const invitationList = listOf(invitation);
export type Invitation = z.infer<typeof invitation>;

/** The link is shown once, to the one who made it. */
export const invitationMade = invitation.extend({ link: z.string() });
export type InvitationMade = z.infer<typeof invitationMade>;

export const invitationOffer = z.object({ role, expiresAt: timestamp, club: z.string() });
export type InvitationOffer = z.infer<typeof invitationOffer>;

export const invitationAcceptance = z.strictObject({
  name: words(60, 'Name'),
  email: z.email('E-mail must be an address such as name@example.org').max(200),
  password: z
    .string({ error: 'Password must be text' })
    .min(12, 'Password must have at least 12 characters')
    .max(128, 'Password must have at most 128 characters'),
});
export type InvitationAcceptance = z.infer<typeof invitationAcceptance>;
