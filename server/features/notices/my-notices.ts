import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { isUuid } from '#server/db/is-uuid.ts';
import { design, notice } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { NoticeList } from '#shared/api/notices.ts';

const mostShown = 100;

/** A member's notices, unread warnings first and then the newest, and how many of all are unread. */
export async function listNotices(deps: Deps, memberId: string): Promise<NoticeList> {
  const { db } = deps.database;
  const mine = eq(notice.memberId, memberId);
  const rows = await db
    .select({ notice, slug: design.slug })
    .from(notice)
    .leftJoin(design, eq(design.id, notice.designId))
    .where(mine)
    // What is dangerous and unread is never pushed off the list by what is only news.
    .orderBy(
      sql`(${notice.kind} = 'withheld' and ${notice.readAt} is null) desc`,
      desc(notice.createdAt),
      desc(notice.id),
    )
    .limit(mostShown);
  return {
    items: rows.map(({ notice: { id, kind, sentence, createdAt, readAt }, slug }) => ({
      id,
      kind,
      sentence,
      createdAt: createdAt.toISOString(),
      ...(slug === null ? {} : { designSlug: slug }),
      ...(readAt === null ? {} : { readAt: readAt.toISOString() }),
    })),
    total: await db.$count(notice, mine),
    nextCursor: null,
    unread: await db.$count(notice, and(mine, isNull(notice.readAt))),
  };
}

/** Marks a notice of the member's own as read; the first time counts. */
export async function readNotice(deps: Deps, memberId: string, id: string): Promise<void> {
  const { db } = deps.database;
  const mine = isUuid(id) ? and(eq(notice.id, id), eq(notice.memberId, memberId)) : undefined;
  const count = mine === undefined ? 0 : await db.$count(notice, mine);
  if (count === 0) throw new ProblemError(404, 'notice.not-found', 'There is no such notice of yours.');
  await db
    .update(notice)
    .set({ readAt: deps.clock.now() })
    .where(and(mine, isNull(notice.readAt)));
}
