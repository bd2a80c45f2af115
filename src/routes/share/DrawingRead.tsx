import { useMemo } from 'react';
import type { Machine } from '#shared/api/bench.ts';
import type { Inspection } from '#shared/api/drawings.ts';
import { fitsBed } from '#shared/fit/fits-bed.ts';
import { formatSize } from '#shared/units/length.ts';
import { BedDrawing } from '../../components/BedDrawing.tsx';
import { Button } from '../../components/Button.tsx';
import { useUnits } from '../../units/units-context.tsx';
import { DrawingNotes } from '../design/DrawingNotes.tsx';
import { LayerTable } from '../design/LayerTable.tsx';

interface DrawingReadProps {
  readonly inspection: Inspection;
  readonly fileName: string;
  readonly machine: Machine | null;
  readonly isRescaling: boolean;
  readonly onOther: () => void;
}

const scaleWords = ({ source, confirmed }: Inspection['units']): string => {
  if (source === 'stated') return 'At the scale you stated.';
  return confirmed
    ? `The file states its size in ${source}.`
    : 'This is the reading at 96 units an inch, until you say how large it is.';
};

const lies = (turnDeg: number | null): string => {
  if (turnDeg === null) return 'too large for its bed';
  return turnDeg === 0 ? 'as drawn' : `turned ${Math.round(turnDeg)}°`;
};

/** What was read: its size in both units, the part on my bed, its layers and notes. */
export function DrawingRead({ inspection, fileName, machine, isRescaling, onOther }: DrawingReadProps) {
  const { system } = useUnits();
  const { geometry, widthMm, heightMm, boundsMm, shapeCount, units, layers, warnings } = inspection;
  const pathData = useMemo(() => geometry.shapes.map((shape) => shape.pathData).join(''), [geometry]);
  const turnDeg = machine === null ? 0 : fitsBed(geometry.hullMm, undefined, machine).turnDeg;
  const other = system === 'mm' ? 'in' : 'mm';
  return (
    <div className="space-y-6" aria-busy={isRescaling}>
      <div className="grid gap-6 lg:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        <figure className="min-w-0 self-start border border-ink bg-film">
          <BedDrawing
            pathData={pathData}
            boundsMm={boundsMm}
            hullMm={geometry.hullMm}
            bed={machine}
            turnDeg={turnDeg ?? 0}
            label={`${fileName}, ${formatSize([widthMm, heightMm], system)}`}
          />
          <figcaption className="border-t border-ink bg-paper px-3 py-1.5 text-sm">
            {machine === null
              ? 'Add a machine to see it on your bed'
              : `On ${machine.name}, ${lies(turnDeg)}`}
          </figcaption>
        </figure>
        <div className="min-w-0 space-y-4">
          <div role="status">
            <p className="label-narrow text-ink-soft">Size as read</p>
            <p className="figures text-2xl leading-9 font-bold">{formatSize([widthMm, heightMm], system)}</p>
            <p className="figures text-ink-soft">
              {formatSize([widthMm, heightMm], other, { fractions: false })}
            </p>
            <p className="mt-2">{isRescaling ? 'Reading it again at this scale.' : scaleWords(units)}</p>
          </div>
          <p className="flex flex-wrap items-center gap-x-4 gap-y-2">
            <span className="figures min-w-0 text-sm wrap-anywhere">
              {fileName}, {shapeCount === 1 ? '1 shape' : `${shapeCount} shapes`}
            </span>
            <Button onClick={onOther}>Choose another file</Button>
          </p>
          <LayerTable layers={layers} />
        </div>
      </div>
      <DrawingNotes warnings={warnings} />
    </div>
  );
}
