import { Link } from 'react-router-dom';
import type { CutRecord } from '#shared/api/cuts.ts';
import { formatDuration } from '#shared/units/duration.ts';
import { useUnits } from '../../units/units-context.tsx';
import { sayBitUsed } from '../../words/say-bit-used.ts';
import { sayCutDay } from '../../words/say-cut-day.ts';
import { HowItCameOut } from './HowItCameOut.tsx';
import { sayStock } from './say-stock.ts';

interface LogCardProps {
  readonly record: CutRecord;
  readonly withMember: boolean;
}

/** A row of the log where there is no room for a table. */
export function LogCard({ record, withMember }: LogCardProps) {
  const { system } = useUnits();
  const { design, revision, member, machine, bit, runTimeS, cutOn } = record;
  return (
    <article className="border border-rule bg-paper p-3">
      <h2 className="text-base leading-6">
        <Link
          to={`/designs/${design.slug}#record-${record.id}`}
          className="text-layout underline underline-offset-4"
        >
          {design.title}, rev. {revision}
        </Link>
      </h2>
      <p>
        <HowItCameOut record={record} />
      </p>
      <p className="text-sm leading-5 text-ink-soft">
        {[sayCutDay(cutOn), ...(withMember ? [member.name] : []), machine.name].join(', ')}
        <br />
        {sayBitUsed(bit, system)}; {sayStock(record, system)}; {formatDuration(runTimeS)}
      </p>
    </article>
  );
}
