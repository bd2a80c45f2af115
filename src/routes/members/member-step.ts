import type { Member, MemberChange } from '#shared/api/people.ts';
import type { Role } from '#shared/api/vocabulary.ts';
import { roleLabels } from '../../words/labels.ts';

/** A change to a member, asked for and not yet confirmed. */
export type MemberStep =
  | { readonly kind: 'role'; readonly member: Member; readonly role: Role }
  | { readonly kind: 'suspend'; readonly member: Member }
  | { readonly kind: 'readmit'; readonly member: Member };

interface StepWords {
  readonly title: string;
  readonly detail: string;
  /** What the button says. */
  readonly does: string;
}

const roleDetails: Readonly<Record<Role, string>> = {
  member: 'They find, take, cut and share designs.',
  moderator: 'They may also judge what is flagged and withhold it.',
  administrator: 'They may also invite and suspend members and change roles, yours among them.',
};

export const stepWords = (step: MemberStep): StepWords => {
  const { name } = step.member;
  if (step.kind === 'role')
    return {
      title: `Make ${name} ${roleLabels[step.role].toLowerCase()}?`,
      detail: roleDetails[step.role],
      does: `Make ${roleLabels[step.role].toLowerCase()}`,
    };
  if (step.kind === 'suspend')
    return {
      title: `Suspend ${name}?`,
      detail:
        'They are signed out at once and cannot come in until readmitted. Their designs and records are kept.',
      does: 'Suspend',
    };
  return {
    title: `Readmit ${name}?`,
    detail: 'They can sign in again with the password they had.',
    does: 'Readmit',
  };
};

export const stepChange = (step: MemberStep): MemberChange =>
  step.kind === 'role'
    ? { role: step.role, version: step.member.version }
    : { suspended: step.kind === 'suspend', version: step.member.version };
