import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

interface RevisionRow {
  readonly number: number;
  readonly changeNote: string;
  readonly by: string;
  /** ISO 8601. */
  readonly createdAt: string;
  /** Where that revision is drawn, unless it is the one on this sheet. */
  readonly href?: string | undefined;
}

interface TitleBlockProps {
  readonly title: string;
  readonly drawingNumber: string;
  readonly revisionNumber: number;
  readonly createdAt: string;
  /** From the sheet around it. */
  readonly scale: string;
  readonly drawnBy: string;
  readonly lastCutBy: string | null;
  /** The material the standing is for; null while uncut. */
  readonly standingIn: string | null;
  readonly standing: string;
  readonly licence: string;
  readonly from?: string | undefined;
  readonly revisions: readonly RevisionRow[];
}

const day = new Intl.DateTimeFormat('en-GB', {
  day: '2-digit',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
});

interface CellProps {
  readonly label: string;
  readonly wide: string;
  readonly children: ReactNode;
}

function Cell({ label, wide, children }: CellProps) {
  return (
    <div className={`min-w-0 border-t border-l border-ink px-2 pt-0.5 pb-1 ${wide}`}>
      <dt className="label-narrow text-[0.6875rem] text-ink-soft">{label}</dt>
      <dd className="figures text-[0.8125rem] leading-5 wrap-anywhere">{children}</dd>
    </div>
  );
}

/** The fields of ISO 7200 that mean something here, with the revisions above, newest first. */
export function TitleBlock(block: TitleBlockProps) {
  const revisions = [...block.revisions].sort((left, right) => right.number - left.number);
  return (
    <div className="w-full border-r border-b border-ink bg-paper">
      <table className="figures w-full border-l border-ink text-xs leading-5">
        <caption className="sr-only">Revisions, newest first</caption>
        <thead className="sr-only">
          <tr>
            <th scope="col">Revision</th>
            <th scope="col">Change</th>
            <th scope="col">By</th>
            <th scope="col">Date</th>
          </tr>
        </thead>
        <tbody>
          {revisions.map((revision) => (
            <tr key={revision.number} className="border-t border-ink align-top">
              <td className="w-8 px-2">
                {revision.href === undefined ? (
                  revision.number
                ) : (
                  <Link
                    to={revision.href}
                    aria-label={`Revision ${revision.number}: show its drawing`}
                    className="text-layout underline underline-offset-2"
                  >
                    {revision.number}
                  </Link>
                )}
              </td>
              <td className="px-1 wrap-anywhere">{revision.changeNote}</td>
              <td className="px-2">{revision.by}</td>
              <td className="px-2 text-right whitespace-nowrap">
                {day.format(new Date(revision.createdAt))}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <dl className="grid grid-cols-6">
        <div className="col-span-6 min-w-0 border-t border-l border-ink px-2 pt-0.5 pb-1 sm:col-span-4">
          <dt className="label-narrow text-[0.6875rem] text-ink-soft">Title</dt>
          <dd className="text-lg leading-6 font-bold tracking-tight">{block.title}</dd>
        </div>
        <Cell label="Drawing number" wide="col-span-3 sm:col-span-2">
          {block.drawingNumber} / {block.revisionNumber}
        </Cell>
        <Cell label="Drawn by" wide="col-span-3 sm:col-span-2">
          {block.drawnBy}
        </Cell>
        <Cell label="Last cut by" wide="col-span-3 sm:col-span-2">
          {block.lastCutBy ?? 'nobody yet'}
        </Cell>
        <Cell label="Scale" wide="col-span-3 sm:col-span-2">
          {block.scale}
        </Cell>
        <Cell
          label={block.standingIn === null ? 'Standing' : `Standing in ${block.standingIn}`}
          wide="col-span-3 sm:col-span-2"
        >
          {block.standing}
        </Cell>
        <Cell label="Date" wide="col-span-3 sm:col-span-2">
          {day.format(new Date(block.createdAt))}
        </Cell>
        <Cell
          label="Licence"
          wide={block.from === undefined ? 'col-span-6 sm:col-span-2' : 'col-span-3 sm:col-span-2'}
        >
          {block.licence}
        </Cell>
        {block.from !== undefined && (
          <Cell label="From" wide="col-span-3 sm:col-span-6">
            {block.from}
          </Cell>
        )}
      </dl>
    </div>
  );
}
