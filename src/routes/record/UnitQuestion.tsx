import type { MeasuredSize } from '#shared/api/cuts.ts';
import { formatLength } from '#shared/units/length.ts';
import { Button } from '../../components/Button.tsx';
import { useUnits } from '../../units/units-context.tsx';
import { type Conversion, conversionOf } from './unit-doubt.ts';

interface UnitQuestionProps {
  readonly size: MeasuredSize;
  readonly onAsTyped: () => void;
  readonly onConvert: (conversion: Conversion) => void;
}

/** Asked at its row: 3.94 beside 100 mm drawn may be right, and is more often inches. */
export function UnitQuestion({ size, onAsTyped, onConvert }: UnitQuestionProps) {
  const { system } = useUnits();
  const say = (mm: number) => formatLength(mm, system, { digits: 2, trim: true });
  const conversion = conversionOf(size, system);
  return (
    <div role="alert" className="space-y-2 border-2 border-ochre bg-paper p-3">
      <p>
        <strong className="text-ochre-ink">Which unit?</strong> {say(size.drawnMm)} drawn and{' '}
        {say(size.measuredMm)} measured lie far apart.
      </p>
      <div className="flex flex-wrap gap-2">
        <Button onClick={onAsTyped}>Yes, {system === 'mm' ? 'millimetres' : 'inches'}</Button>
        <Button onClick={() => onConvert(conversion)}>
          It was {conversion.unit}: convert to {say(conversion.sizeMm)}
        </Button>
      </div>
    </div>
  );
}
