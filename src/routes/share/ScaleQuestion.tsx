import { useEffect, useRef, useState } from 'react';
import type { Inspection, ScaleReading } from '#shared/api/drawings.ts';
import { scaleFromMeasuredSize } from '#shared/drawing/scale-readings.ts';
import { formatSize } from '#shared/units/length.ts';
import { NumberField } from '../../components/NumberField.tsx';
import { RadioCards } from '../../components/RadioCards.tsx';
import { useUnits } from '../../units/units-context.tsx';

export interface ScaleChoice {
  /** The name of a reading, or `measured`. */
  readonly from: string;
  readonly measuredMm: number | undefined;
  /** Undefined while no scale follows from the choice. */
  readonly millimetresPerUnit: number | undefined;
}

interface ScaleQuestionProps {
  readonly asFiled: Inspection;
  readonly choice: Pick<ScaleChoice, 'from' | 'measuredMm'>;
  readonly onChoose: (choice: ScaleChoice) => void;
  readonly error: string | undefined;
}

const readingWords: Readonly<Record<ScaleReading['name'], string>> = {
  mm: '1 unit is 1 mm',
  '96 an inch': '96 units an inch',
  '90 an inch': '90 units an inch',
  '72 an inch': '72 units an inch',
};

/** A moment after the last key, so that not every digit is a scale of its own. */
const REST_MS = 400;

/** How large is it? Asked when the file does not say: guessing would cut it at the wrong size. */
export function ScaleQuestion({ asFiled, choice, onChoose, error }: ScaleQuestionProps) {
  const { system } = useUnits();
  const [message, setMessage] = useState<string>();
  const resting = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(resting.current), []);
  const side = asFiled.widthMm > 0 ? 'width' : 'height';
  const both = (reading: ScaleReading): string => {
    const sides = [reading.widthMm, reading.heightMm];
    return `${formatSize(sides, 'mm')}, or ${formatSize(sides, 'in', { fractions: false })}`;
  };

  const measure = (measuredMm: number | undefined) => {
    clearTimeout(resting.current);
    const scale =
      measuredMm === undefined || Number.isNaN(measuredMm)
        ? null
        : scaleFromMeasuredSize(asFiled, measuredMm, side);
    setMessage(scale?.ok === false ? scale.message : undefined);
    onChoose({ from: 'measured', measuredMm, millimetresPerUnit: undefined });
    if (scale?.ok !== true) return;
    const { millimetresPerUnit } = scale;
    resting.current = setTimeout(
      () => onChoose({ from: 'measured', measuredMm, millimetresPerUnit }),
      REST_MS,
    );
  };
  const choose = (from: string) => {
    clearTimeout(resting.current);
    const reading = asFiled.scaleReadings.find(({ name }) => name === from);
    if (reading === undefined) measure(choice.measuredMm);
    else {
      const { millimetresPerUnit } = reading;
      onChoose({ from, measuredMm: choice.measuredMm, millimetresPerUnit });
    }
  };

  return (
    <div className="space-y-4 border-2 border-ochre bg-paper p-4">
      <p>
        <strong>How large is it?</strong> The file gives no size in millimetres or inches. Choose the reading
        that comes out as you drew it, or measure the whole drawing.
      </p>
      <RadioCards
        legend="Scale"
        name="scaleFrom"
        value={choice.from}
        error={error}
        onChange={(event) => choose(event.target.value)}
        cards={[
          ...asFiled.scaleReadings.map((reading) => ({
            value: reading.name,
            label: readingWords[reading.name],
            detail: <span className="figures">{both(reading)}</span>,
          })),
          {
            value: 'measured',
            label: 'I know its size',
            detail: `State how ${side === 'width' ? 'wide' : 'high'} the whole drawing is.`,
          },
        ]}
      />
      {choice.from === 'measured' && (
        <div className="max-w-xs">
          <NumberField
            label={side === 'width' ? 'The whole drawing is so wide' : 'The whole drawing is so high'}
            quantity="length"
            name="measuredMm"
            hint={`In either unit, such as ${system === 'mm' ? '120 mm' : '4 3/4 in'}`}
            value={choice.measuredMm}
            onChange={measure}
            error={message}
          />
        </div>
      )}
    </div>
  );
}
