import type { Flag } from '#shared/api/flags.ts';
import { Button } from '../../components/Button.tsx';
import { DecisionMade } from './DecisionMade.tsx';

interface DecidedMeanwhileProps {
  readonly now: Flag;
  /** The reason that was typed, so that it is not lost. */
  readonly mine: string;
  readonly onShow: () => void;
}

/** Another moderator was faster: what they did, and that nothing of mine was saved. */
export function DecidedMeanwhile({ now, mine, onShow }: DecidedMeanwhileProps) {
  return (
    <div role="alert" className="space-y-4 border-2 border-brick bg-paper p-4">
      <p className="font-bold text-brick">
        <span aria-hidden="true">✕ </span>
        {now.decision === undefined
          ? 'The flag changed while you were reading'
          : `${now.decision.decidedBy.name} decided this before you`}
      </p>
      {now.decision !== undefined && <DecisionMade decision={now.decision} />}
      <p>Your decision was not saved. If it is still needed, flag the design again and decide that flag.</p>
      {mine.trim() !== '' && (
        <p className="text-sm leading-5">
          <span className="text-ink-soft">Your reason was: </span>
          {mine}
        </p>
      )}
      <Button onClick={onShow}>Show the flag as it is now</Button>
    </div>
  );
}
