import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import type { Flag } from '#shared/api/flags.ts';
import { designQuery } from '../../api/designs.ts';
import { LinkButton } from '../../components/LinkButton.tsx';
import { LoadProblem } from '../../components/LoadProblem.tsx';
import { PageTitle } from '../../components/PageTitle.tsx';
import { Skeleton } from '../../components/Skeleton.tsx';
import { WentWrongList } from '../../components/WentWrongList.tsx';
import { sayAge } from '../../words/say-age.ts';
import { RevisionSheet } from '../design/RevisionSheet.tsx';
import { SettingsTable } from '../design/SettingsTable.tsx';
import { actionsOn } from './actions-on.ts';
import { DecisionForm } from './DecisionForm.tsx';
import { DecisionMade } from './DecisionMade.tsx';
import { EarlierDecisions } from './EarlierDecisions.tsx';
import { FindingFigures } from './FindingFigures.tsx';
import { LevelWord, raisedByWords, takesWords } from './FlagHead.tsx';
import { isWithheldNow } from './is-withheld-now.ts';

interface FlagPageProps {
  readonly flag: Flag;
  readonly earlier: readonly Flag[];
  readonly myId: string;
  readonly onShowCurrent: () => void;
}

/** Everything a moderator judges by, on one page: drawing, record, finding, what was decided before. */
export function FlagPage({ flag, earlier, myId, onShowCurrent }: FlagPageProps) {
  const { design: about, recordId, decision, finding } = flag;
  const { data: design, error, refetch } = useQuery(designQuery(about.slug));
  const actions = actionsOn(flag, design !== undefined && isWithheldNow(design, flag));
  const record = design?.cuts.find(({ id }) => id === recordId);
  return (
    <div className="space-y-6">
      <div>
        <p className="label-narrow text-ink-soft">
          <Link to="/review" className="underline underline-offset-4">
            Review desk
          </Link>
          , {decision === undefined ? 'open flag' : 'decided flag'}
        </p>
        <PageTitle>{about.title}</PageTitle>
        <p className="mt-1 flex flex-wrap items-center gap-x-4 gap-y-1 text-sm leading-5 text-ink-soft">
          <LevelWord level={flag.level} />
          <Link
            to={`/designs/${about.slug}?revision=${flag.revision}`}
            className="figures text-layout underline underline-offset-4"
          >
            {about.drawingNumber} / {flag.revision}
          </Link>
          <span>{raisedByWords(flag)}</span>
          <span>{sayAge(flag.createdAt, new Date())} ago</span>
          <span className={flag.takeCount > 0 ? 'font-semibold text-ink' : ''}>
            {takesWords(flag.takeCount)}
          </span>
        </p>
      </div>
      <p className="max-w-prose border-l-4 border-ink pl-4 text-lg leading-7 whitespace-pre-line">
        {flag.reason}
      </p>
      <div className="grid gap-8 xl:grid-cols-[minmax(0,1fr)_minmax(0,28rem)]">
        <div className="min-w-0 space-y-6">
          {error !== null && <LoadProblem error={error} onRetry={() => void refetch()} />}
          {design === undefined && error === null && <Skeleton shape="sheet" />}
          {design !== undefined && <RevisionSheet design={design} revision={flag.revision} />}
          {record !== undefined && (
            <section aria-labelledby="record-head">
              <h2 id="record-head" className="label-narrow mb-2 text-ink-soft">
                The record of {record.member.name}, revision {record.revision}
              </h2>
              {record.wentWrong.length > 0 && (
                <p className="mb-3">
                  <WentWrongList codes={record.wentWrong} />
                </p>
              )}
              <SettingsTable record={record} />
            </section>
          )}
        </div>
        <div className="min-w-0 space-y-6">
          {finding !== undefined && <FindingFigures finding={finding} />}
          {decision !== undefined && (
            <section aria-labelledby="decided-head" className="space-y-3">
              <h2 id="decided-head" className="text-xl leading-7">
                Decided
              </h2>
              <DecisionMade decision={decision} />
              <LinkButton to="/review" look="line">
                Back to the open flags
              </LinkButton>
            </section>
          )}
          {about.ownerId !== myId && actions.length > 0 && (
            <DecisionForm key={flag.version} flag={flag} actions={actions} onShowCurrent={onShowCurrent} />
          )}
          {decision === undefined && about.ownerId === myId && (
            <p className="border-2 border-ochre bg-paper p-4">
              <strong>This design is yours, so another moderator must decide.</strong> Nobody decides on their
              own design.
            </p>
          )}
          <EarlierDecisions flags={earlier} />
        </div>
      </div>
    </div>
  );
}
