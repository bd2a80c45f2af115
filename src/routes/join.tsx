import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { invitationOfferQuery } from '../api/invitations.ts';
import { meQuery } from '../api/me.ts';
import { isProblem, sentenceOf } from '../api/problem-error.ts';
import { LinkButton } from '../components/LinkButton.tsx';
import { PageTitle } from '../components/PageTitle.tsx';
import { ProblemNote } from '../components/ProblemNote.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { SignOutButton } from './account/SignOutButton.tsx';
import { JoinForm } from './join/JoinForm.tsx';
import { Offer } from './join/Offer.tsx';

export function Component() {
  const { code = '' } = useParams();
  const { data: me } = useQuery(meQuery);
  const [isJoining, setIsJoining] = useState(false);
  const offer = useQuery(invitationOfferQuery(code));
  return (
    <div className="mx-auto max-w-xl space-y-6 md:pt-8">
      <PageTitle>Join the club</PageTitle>
      {offer.isPending && <Skeleton />}
      {offer.error !== null && (
        <>
          <ProblemNote
            problem={
              isProblem(offer.error)
                ? {
                    ...offer.error.problem,
                    title:
                      offer.error.problem.status === 404
                        ? 'This link does not open'
                        : offer.error.problem.title,
                  }
                : { title: 'The link was not read', detail: sentenceOf(offer.error) }
            }
          />
          <LinkButton to="/sign-in">Sign in</LinkButton>
        </>
      )}
      {offer.data !== undefined && <Offer offer={offer.data} />}
      {offer.data !== undefined &&
        (me == null || isJoining ? (
          <JoinForm code={code} onJoined={() => setIsJoining(true)} />
        ) : (
          <div className="space-y-4">
            <p>
              You are signed in as <strong>{me.name}</strong>. The link is for somebody new: pass it on, or
              sign out to use it yourself.
            </p>
            <SignOutButton to={`/join/${code}`} />
          </div>
        ))}
    </div>
  );
}
