import type { FitReport } from '#shared/api/fit.ts';
import { asSentence, type Check, severity, worstFirst } from './check.ts';
import { listed } from './wording.ts';

const NAMED = 2;

/** The first two reasons in words, the rest as a number. */
const reasons = (checks: readonly Check[]): string => {
  const said = checks.filter(({ clause }) => clause !== '');
  const left = said.length - NAMED;
  const named = said.slice(0, NAMED).map(({ clause }) => clause);
  if (left > 0) named.push(left === 1 ? '1 more check needs a look' : `${left} more checks need a look`);
  return named.join('; ');
};

/**
 * The worst check in one sentence, the bed first: it is what a member asks first, and it is known even
 * of a design that nobody has cut. Order of the results: worstFirst of check.ts.
 */
export const verdictOf = (
  bed: Check,
  others: readonly Check[],
  neverCut: boolean,
): Pick<FitReport, 'verdict' | 'sentence'> => {
  const all = [bed, ...others];
  const verdict = worstFirst.find((result) => all.some((check) => check.result === result)) ?? 'fits';
  if (bed.result === 'doesNotFit') return { verdict, sentence: bed.sentence };
  const troubles = others
    .filter(({ result }) => result === 'doesNotFit' || result === 'fitsIf')
    .sort((a, b) => severity(b.result) - severity(a.result));
  const unknown = others.filter(({ result }) => result === 'notKnown');
  if (troubles.length > 0)
    return { verdict, sentence: asSentence(`${bed.clause}, but ${reasons(troubles)}`) };
  if (neverCut) {
    return {
      verdict,
      sentence: asSentence(
        `${bed.clause}; nobody has shared a cut of it, so which bit, depth and settings it takes is not known`,
      ),
    };
  }
  if (unknown.length > 0) {
    const why = reasons(unknown);
    const names = listed(unknown.map(({ id }) => id.replaceAll('-', ' ')));
    return {
      verdict,
      sentence: asSentence(`${bed.clause}, but ${why === '' ? `${names} cannot be told` : why}`),
    };
  }
  return { verdict, sentence: asSentence(`${bed.clause}, and the rest of your bench suits it`) };
};
