import type { Finding } from '#shared/api/findings.ts';
import { findingLevelInk, findingLevelLabels } from '../../words/finding-levels.ts';
import { useSayFigure } from './use-say-figure.ts';

interface FindingFiguresProps {
  readonly finding: Finding;
  readonly headingLevel?: 'h2' | 'h4';
}

/** What a rule found: its sentence, what to change, the figures it rests on and where its limit comes from. */
export function FindingFigures({ finding, headingLevel: Heading = 'h2' }: FindingFiguresProps) {
  const say = useSayFigure();
  return (
    <section aria-label={`Finding: ${finding.title}`} className="border border-ink bg-paper p-4">
      <Heading className="text-base leading-6 font-bold">
        <span className={`figures text-sm ${findingLevelInk[finding.level]}`}>
          {findingLevelLabels[finding.level]}
        </span>{' '}
        {finding.title}
      </Heading>
      <p className="mt-1">{finding.sentence}</p>
      <p className="mt-1">{finding.advice}</p>
      {finding.figures.length > 0 && (
        <dl className="mt-3 border-t border-rule">
          {finding.figures.map(({ name, value, unit }) => (
            <div key={name} className="flex justify-between gap-4 border-b border-rule py-1">
              <dt className="min-w-0">{name}</dt>
              <dd className="figures shrink-0">{say(value, unit)}</dd>
            </div>
          ))}
        </dl>
      )}
      <p className="mt-2 text-xs leading-5 text-ink-soft">Source: {finding.source}</p>
    </section>
  );
}
