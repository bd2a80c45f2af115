import { formatDuration } from '#shared/units/duration.ts';
import { asSentence, type Check, type FitContext, notKnown } from '../check.ts';
import { figure } from '../wording.ts';

/** Is the recorded run within the time the member has? */
export const checkRunTime = ({ runTimeS }: FitContext, limitS: number): Check => {
  if (runTimeS === undefined) {
    const why = 'how long it runs is not known';
    return { ...notKnown('run-time', 's', why, why), have: figure(limitS) };
  }
  const fits = runTimeS <= limitS;
  const clause = fits
    ? `the shared cut ran ${formatDuration(runTimeS)}, within your ${formatDuration(limitS)}`
    : `the shared cut ran ${formatDuration(runTimeS)}, longer than your ${formatDuration(limitS)}`;
  return {
    id: 'run-time',
    result: fits ? 'fits' : 'doesNotFit',
    have: figure(limitS),
    need: figure(runTimeS),
    unit: 's',
    sentence: asSentence(clause),
    clause,
  };
};
