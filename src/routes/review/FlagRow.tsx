import { Link } from 'react-router-dom';
import type { Flag } from '#shared/api/flags.ts';
import { sayAge } from '../../words/say-age.ts';
import { decisionWords } from './decision-words.ts';
import { LevelWord, raisedByWords, takesWords } from './FlagHead.tsx';
import { SmallDrawing } from './SmallDrawing.tsx';

interface FlagRowProps {
  readonly flag: Flag;
  readonly now: Date;
}

/** A flag in the queue: how grave, of what, why, by whom, how old, and how many hold it. */
export function FlagRow({ flag, now }: FlagRowProps) {
  const { design, decision } = flag;
  return (
    <li className="relative grid gap-x-5 gap-y-3 border border-ink bg-paper p-4 focus-within:outline-2 focus-within:outline-layout hover:outline-2 hover:outline-layout sm:grid-cols-[9rem_minmax(0,1fr)]">
      <SmallDrawing slug={design.slug} revision={flag.revision} />
      <div className="min-w-0 space-y-1.5">
        <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
          <LevelWord level={flag.level} />
          <h2 className="min-w-0 text-lg leading-7">
            <Link
              to={`/review/${flag.id}`}
              className="after:absolute after:inset-0 focus-visible:outline-none"
            >
              {design.title}
            </Link>
          </h2>
          <span className="figures text-xs text-ink-soft">
            {design.drawingNumber} / {flag.revision}
          </span>
        </div>
        <p className="line-clamp-3 max-w-prose">{flag.reason}</p>
        <p className="flex flex-wrap gap-x-4 text-sm leading-5 text-ink-soft">
          <span>{raisedByWords(flag)}</span>
          <span>
            <time dateTime={flag.createdAt}>{sayAge(flag.createdAt, now)} old</time>
          </span>
          <span className={flag.takeCount > 0 ? 'font-semibold text-ink' : ''}>
            {takesWords(flag.takeCount)}
          </span>
        </p>
        {decision !== undefined && (
          <p className="border-t border-rule pt-1.5 text-sm leading-5">
            <strong className="font-semibold">
              {decision.decidedBy.name} {decisionWords[decision.action].past}
            </strong>
            : {decision.reason}
          </p>
        )}
      </div>
    </li>
  );
}
