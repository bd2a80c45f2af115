import type { Role } from '#shared/api/vocabulary.ts';
import type { Letter } from './layout.ts';

const roleNames: Record<Role, string> = {
  member: 'member',
  moderator: 'moderator',
  administrator: 'administrator',
};

export function invitationLetter(given: {
  clubName: string;
  inviterName: string | null;
  role: Role;
  expiresAt: Date;
  link: string;
}): Letter {
  const who = given.inviterName ?? 'The club';
  return {
    subject: `${who} invites you to ${given.clubName}`,
    paragraphs: [
      `${who} invites you to join ${given.clubName} as ${roleNames[given.role] === 'administrator' ? 'an' : 'a'} ${roleNames[given.role]}.`,
      `The link works once, until ${given.expiresAt.toISOString().slice(0, 10)}. Keep it to yourself: whoever opens it joins in your place.`,
    ],
    link: { words: 'Join the club', href: given.link },
    closing: 'If you did not expect this, do nothing: without the link nobody joins.',
  };
}

export function decisionLetter(given: {
  name: string;
  sentence: string;
  design: { title: string; drawingNumber: string };
  isOwner: boolean;
  link: string;
}): Letter {
  const { title, drawingNumber } = given.design;
  return {
    subject: `Decision on “${title}” (${drawingNumber})`,
    paragraphs: [`Hello ${given.name},`, given.sentence],
    link: { words: 'See the design', href: given.link },
    closing: given.isOwner
      ? 'You get this because you shared the design.'
      : 'You get this because you flagged it.',
  };
}
