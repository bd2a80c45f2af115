import type { Design } from '#shared/api/designs.ts';
import { Findings } from '../../components/Findings.tsx';
import { sayDay } from '../../words/say-day.ts';

/** Cautions that moderators put on the design, each with its reason. */
export function Cautions({ cautions }: Pick<Design, 'cautions'>) {
  if (cautions.length === 0) return null;
  return (
    <section aria-labelledby="cautions-head" className="mb-4 border-2 border-ochre bg-paper p-4">
      <h2 id="cautions-head" className="label-narrow mb-2 text-ink-soft">
        {cautions.length === 1 ? 'A moderator’s caution' : 'Moderators’ cautions'}
      </h2>
      <Findings
        label="Cautions"
        findings={cautions.map(({ reason, decidedAt }) => ({
          level: 'caution',
          sentence: reason,
          figures: `by a moderator, ${sayDay(decidedAt)}`,
        }))}
      />
    </section>
  );
}
