import type { Member } from '#shared/api/people.ts';
import { type Role, roles } from '#shared/api/vocabulary.ts';
import { Button } from '../../components/Button.tsx';
import { inputLook } from '../../components/FieldFrame.tsx';
import { roleLabels } from '../../words/labels.ts';
import { sayDay } from '../../words/say-day.ts';
import type { MemberStep } from './member-step.ts';

interface MemberRowProps {
  readonly member: Member;
  readonly isMe: boolean;
  readonly onStep: (step: MemberStep) => void;
}

export function MemberRow({ member, isMe, onStep }: MemberRowProps) {
  const isSuspended = member.suspendedAt !== undefined;
  const askFor = (role: Role | undefined) => {
    if (role !== undefined) onStep({ kind: 'role', member, role });
  };
  return (
    <li className="flex flex-wrap items-center gap-x-6 gap-y-2 border-b border-rule py-3">
      <div className="min-w-0 flex-1 basis-64">
        <h3 className="text-base leading-6">
          {member.name} {isMe && <span className="font-normal text-ink-soft">(you)</span>}
        </h3>
        <p className="text-sm leading-5 break-words text-ink-soft">
          {member.email} · joined {sayDay(member.createdAt)}
        </p>
        {member.suspendedAt !== undefined && (
          <p className="text-sm leading-5 font-semibold text-brick">
            Suspended since {sayDay(member.suspendedAt)}
          </p>
        )}
      </div>
      <div className="flex items-center gap-3">
        {/* Controlled: it shows the new role only once the server has it. */}
        <select
          aria-label={`Role of ${member.name}`}
          value={member.role}
          onChange={(event) => askFor(roles.find((role) => role === event.target.value))}
          className={`${inputLook} w-auto!`}
        >
          {roles.map((role) => (
            <option key={role} value={role}>
              {roleLabels[role]}
            </option>
          ))}
        </select>
        <Button
          look={isSuspended ? 'line' : 'danger'}
          className="w-28"
          aria-label={`${isSuspended ? 'Readmit' : 'Suspend'} ${member.name}`}
          onClick={() => onStep({ kind: isSuspended ? 'readmit' : 'suspend', member })}
        >
          {isSuspended ? 'Readmit' : 'Suspend'}
        </Button>
      </div>
    </li>
  );
}
