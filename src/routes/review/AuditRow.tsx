import type { AuditList } from '#shared/api/flags.ts';
import { sayMoment } from '../../words/say-moment.ts';

interface AuditRowProps {
  readonly entry: AuditList['items'][number];
  readonly actor: string;
}

const sayDetail = (value: unknown): string => (typeof value === 'string' ? value : JSON.stringify(value));

/** One entry of the log, with the head of its hash. */
export function AuditRow({ entry, actor }: AuditRowProps) {
  const { number, at, action, subject, detail, hash } = entry;
  const details = Object.entries(detail);
  return (
    <li className="grid gap-x-4 gap-y-1 border-b border-rule py-2.5 sm:grid-cols-[4rem_minmax(0,1fr)_auto]">
      <span className="figures text-sm text-ink-soft">{number}</span>
      <div className="min-w-0">
        <p>
          <strong className="figures text-sm">{action}</strong> by {actor}
        </p>
        <p className="figures text-xs leading-5 wrap-anywhere text-ink-soft">{subject}</p>
        {details.length > 0 && (
          <dl className="flex flex-wrap gap-x-4 text-sm leading-5">
            {details.map(([name, value]) => (
              <div key={name} className="flex min-w-0 flex-wrap gap-x-1.5">
                <dt className="text-ink-soft">{name}</dt>
                <dd className="min-w-0 wrap-anywhere">{sayDetail(value)}</dd>
              </div>
            ))}
          </dl>
        )}
      </div>
      <p className="figures text-xs leading-5 text-ink-soft sm:text-right">
        <time dateTime={at}>{sayMoment(at)}</time>
        <br />
        <span className="sr-only">hash begins </span>
        {hash.slice(0, 12)}
      </p>
    </li>
  );
}
