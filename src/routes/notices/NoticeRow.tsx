import { Link } from 'react-router-dom';
import type { Notice } from '#shared/api/notices.ts';
import { useReadNotice } from '../../api/notices.ts';
import { Button } from '../../components/Button.tsx';
import { sayAge } from '../../words/say-age.ts';

const kindWords: Readonly<Record<string, string>> = {
  'flag-raised': 'flagged',
  'flag-decided': 'flag decided',
  withheld: 'withheld',
  restored: 'restored',
  'cut-recorded': 'cut recorded',
  remixed: 'remixed',
};

/** One notice; opening what it speaks of marks it as read. */
export function NoticeRow({ notice }: { readonly notice: Notice }) {
  const { mutate, isPending } = useReadNotice();
  const isUnread = notice.readAt === undefined;
  const read = () => {
    if (isUnread) mutate(notice.id);
  };
  return (
    <li
      className={`grid grid-cols-[0.75rem_minmax(0,1fr)] gap-x-3 border-b border-rule py-3 ${isUnread ? 'bg-paper px-3' : 'px-3'}`}
    >
      <span
        aria-hidden="true"
        className={`mt-1.5 size-3 border border-layout ${isUnread ? 'bg-layout' : 'border-rule'}`}
      />
      <div className="min-w-0">
        <p className={isUnread ? 'font-semibold' : ''}>
          {isUnread && <span className="sr-only">Not read: </span>}
          {notice.designSlug === undefined ? (
            notice.sentence
          ) : (
            <Link
              to={`/designs/${notice.designSlug}`}
              onClick={read}
              className="underline underline-offset-4 hover:text-layout"
            >
              {notice.sentence}
            </Link>
          )}
        </p>
        <p className="flex flex-wrap items-center gap-x-4 text-sm leading-5 text-ink-soft">
          <span>{kindWords[notice.kind] ?? notice.kind}</span>
          <time dateTime={notice.createdAt}>{sayAge(notice.createdAt, new Date())} ago</time>
          {isUnread && (
            <Button look="quiet" className="-mx-2 -my-1 text-sm" disabled={isPending} onClick={read}>
              Mark as read
            </Button>
          )}
        </p>
      </div>
    </li>
  );
}
