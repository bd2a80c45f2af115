import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { Button } from '../../components/Button.tsx';
import { CheckField } from '../../components/CheckField.tsx';
import { hazardLabels, otherFaultLabels, slipLabels } from '../../words/went-wrong-labels.ts';
import type { RecordValues } from './record-values.ts';

const groups = [
  {
    legend: 'Hazards',
    hint: 'Danger to you or the machine. A moderator looks at each of these.',
    labels: hazardLabels,
  },
  {
    legend: 'My own slip',
    hint: 'Says nothing of the design. A failure with only these is shown and not counted.',
    labels: slipLabels,
  },
  { legend: 'On the part', hint: 'Counts by the outcome you chose.', labels: otherFaultLabels },
] as const;

/** What went wrong: asked when the outcome is not clean, and on demand. */
export function WentWrongField() {
  const { register, control } = useFormContext<RecordValues>();
  const [outcome, named] = useWatch({ control, name: ['outcome', 'wentWrong'] });
  const [isAsked, setIsAsked] = useState(false);
  const isShown = isAsked || named.length > 0 || outcome === 'usable' || outcome === 'failed';
  if (!isShown) {
    return (
      <p>
        <Button onClick={() => setIsAsked(true)}>Something went wrong all the same</Button>
      </p>
    );
  }
  return (
    <section aria-labelledby="went-wrong-head" className="space-y-3">
      <h2 id="went-wrong-head" className="text-lg leading-7">
        What went wrong?
      </h2>
      <div className="grid items-start gap-x-6 gap-y-5 md:grid-cols-3">
        {groups.map(({ legend, hint, labels }) => (
          <fieldset
            key={legend}
            className={`min-w-0 border-l-2 pl-4 ${legend === 'Hazards' ? 'border-brick' : 'border-ink'}`}
          >
            <legend className="float-left w-full font-semibold">
              {legend}
              <span className="mb-2 block text-sm leading-5 font-normal text-ink-soft">{hint}</span>
            </legend>
            <div className="clear-both space-y-3">
              {Object.entries(labels).map(([code, label]) => (
                <CheckField key={code} label={label} value={code} {...register('wentWrong')} />
              ))}
            </div>
          </fieldset>
        ))}
      </div>
    </section>
  );
}
