import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { meQuery } from '../../api/me.ts';
import { membersQuery } from '../../api/members.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { MemberRow } from './MemberRow.tsx';
import type { MemberStep } from './member-step.ts';
import { StepDialog } from './StepDialog.tsx';

export function MemberList() {
  const { data: me } = useQuery(meQuery);
  const { data, error } = useQuery(membersQuery);
  const [step, setStep] = useState<MemberStep | null>(null);
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
  return (
    <section aria-labelledby="who">
      <h2 id="who" className="border-b-2 border-ink pb-2 text-xl leading-7">
        In the club <span className="figures text-base font-normal text-ink-soft">{data.total}</span>
      </h2>
      <ul>
        {data.items.map((member) => (
          <MemberRow key={member.id} member={member} isMe={member.id === me?.id} onStep={setStep} />
        ))}
      </ul>
      {step !== null && <StepDialog step={step} onClose={() => setStep(null)} />}
    </section>
  );
}
