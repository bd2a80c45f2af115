import { Link } from 'react-router-dom';
import type { DesignListItem } from '#shared/api/designs.ts';
import type { FitResult, MaterialFamily } from '#shared/api/vocabulary.ts';
import { formatDuration } from '#shared/units/duration.ts';
import { formatLength, formatSize } from '#shared/units/length.ts';
import type { Bed } from '../drawing/bed-view.ts';
import { shownStanding } from '../evidence/shown-standing.ts';
import { useUnits } from '../units/units-context.tsx';
import { BedDrawing } from './BedDrawing.tsx';
import { FitMark } from './FitMark.tsx';
import { fitInk } from './fit-ink.ts';
import { Tally } from './Tally.tsx';
import { WithheldCorner } from './WithheldCorner.tsx';

interface BedCardProps {
  readonly item: DesignListItem;
  readonly machine: Bed | null;
  readonly fit: {
    readonly result: FitResult;
    readonly sentence: string;
    readonly turnDeg?: number | null;
  } | null;
  readonly href: string;
  /** The material of the viewer's filter: its standing is shown. */
  readonly material?: MaterialFamily | undefined;
}

/** A design in a list, drawn to scale on the bed of the machine in use. */
export function BedCard({ item, machine, fit, href, material }: BedCardProps) {
  const { system } = useUnits();
  const { drawing } = item.revision;
  const trim = { digits: system === 'mm' ? 3 : 1, trim: true } as const;
  const size = formatSize([drawing.widthMm, drawing.heightMm], system, { trim: true });
  const facts =
    item.cut === undefined
      ? [size]
      : [
          `${formatLength(item.cut.bitMm, system, trim)} bit`,
          formatDuration(item.cut.runTimeS),
          `${formatLength(item.cut.stockThicknessMm, system, { trim: true })} stock`,
        ];
  return (
    <article className="relative flex min-w-0 flex-col border border-ink focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-layout hover:outline-2 hover:outline-layout">
      <div className="relative border-b border-ink bg-film">
        {item.withheld !== undefined && <WithheldCorner />}
        <BedDrawing
          pathData={item.outline}
          boundsMm={drawing.boundsMm}
          hullMm={item.hullMm}
          bed={machine}
          turnDeg={fit?.turnDeg ?? 0}
          label={`${item.title}, ${size}`}
        />
      </div>
      <div className="flex flex-1 flex-col gap-1 bg-paper px-4 pt-2 pb-3">
        <div className="flex items-baseline justify-between gap-2">
          <h2 className="min-w-0 text-[0.9375rem] leading-6 text-wrap">
            <Link to={href} className="after:absolute after:inset-0 focus-visible:outline-none">
              {item.title}
            </Link>
          </h2>
          <span className="figures shrink-0 text-[0.6875rem] text-ink-soft">
            {item.drawingNumber} · rev {item.revision.number}
          </span>
        </div>
        {item.withheld === undefined ? (
          <Tally standing={shownStanding(item.standing, material)} />
        ) : (
          <p className="line-clamp-2">
            <strong className="font-semibold text-brick">withheld</strong>: {item.withheld.reason}
          </p>
        )}
        <p className="figures text-[0.8125rem] leading-6">{facts.join(' · ')}</p>
        {fit !== null && (
          <p className={`mt-auto flex gap-2 pt-1 text-sm leading-5 font-semibold ${fitInk[fit.result]}`}>
            <span className="pt-1">
              <FitMark result={fit.result} />
            </span>
            {fit.sentence}
          </p>
        )}
      </div>
    </article>
  );
}
