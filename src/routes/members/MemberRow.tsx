import { ChevronDown } from 'lucide-react';
import type { Member } from '#shared/api/people.ts';
import { type Role, roles } from '#shared/api/vocabulary.ts';
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
        <div className="relative">
          <select
            aria-label={`Role of ${member.name}`}
            value={member.role}
            onChange={(event) => askFor(roles.find((role) => role === event.target.value))}
            className={`${inputLook} w-44! appearance-none pr-9`}
          >
            {roles.map((role) => (
              <option key={role} value={role}>
                {roleLabels[role]}
              </option>
            ))}
          </select>
          <ChevronDown
            size={18}
            strokeWidth={1.5}
            aria-hidden="true"
            className="pointer-events-none absolute top-2.75 right-3"
          />
        </div>
        <button
          type="button"
          className={`min-h-10 w-20 text-left font-semibold underline-offset-4 hover:underline ${isSuspended ? 'text-layout' : 'text-brick'}`}
          aria-label={`${isSuspended ? 'Readmit' : 'Suspend'} ${member.name}`}
          onClick={() => onStep({ kind: isSuspended ? 'readmit' : 'suspend', member })}
        >
          {isSuspended ? 'Readmit' : 'Suspend'}
        </button>
      </div>
    </li>
  );
}
