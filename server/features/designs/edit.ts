import { and, eq, isNull, sql } from 'drizzle-orm';
import { appendAudit } from '#server/audit/append.ts';
import { design } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { SignedIn } from '#server/http/session.ts';
import type { Design, DesignChange } from '#shared/api/designs.ts';
import { mayEditDesign } from './policy.ts';
import { presentDesign } from './present.ts';
import { designBySlug, designPage } from './queries.ts';
import { refreshSearch } from './search-document.ts';

export const designNotFound = () =>
  new ProblemError(404, 'design.not-found', 'There is no design at this address. It may have been mistyped.');

export async function getDesign(deps: Deps, slug: string, readerId: string): Promise<Design> {
  const page = await designPage(deps.database.db, slug, readerId);
  if (page === null) throw designNotFound();
  return presentDesign(page);
}

async function editable(deps: Deps, member: SignedIn, slug: string) {
  const row = await designBySlug(deps.database.db, slug);
  if (row === null) throw designNotFound();
  if (!mayEditDesign(member, row))
    throw new ProblemError(
      403,
      'design.not-yours',
      'Only the member who shared this design, or a moderator, may change it.',
    );
  return row;
}

/** Changes the words of a design; its revisions stay as they are. */
export async function changeDesign(
  deps: Deps,
  member: SignedIn,
  slug: string,
  change: DesignChange,
): Promise<Design> {
  const row = await editable(deps, member, slug);
  const { version, title, summary, kind, tags } = change;
  const words = {
    title: title ?? row.title,
    summary: summary ?? row.summary,
    kind: kind ?? row.kind,
    tags: tags ?? row.tags,
  };
  const now = deps.clock.now();
  const changed = await deps.database.db.transaction(async (tx) => {
    const [updated] = await tx
      .update(design)
      .set({ ...words, version: version + 1, updatedAt: now })
      .where(and(eq(design.id, row.id), eq(design.version, version)))
      .returning({ id: design.id });
    if (updated === undefined) return false;
    await appendAudit(tx, {
      at: now,
      actorId: member.id,
      action: 'design.edited',
      subject: `design:${row.id}`,
      detail: { version: version + 1 },
    });
    return true;
  });
  const current = await getDesign(deps, slug, member.id);
  if (!changed) {
    throw new ProblemError(
      409,
      'design.changed',
      'This design was changed in the meantime. Look at it as it is now, then change it again.',
      { current },
    );
  }
  await refreshSearch(deps, row.id);
  return current;
}

/** Takes a design out of the loft. Nothing is erased: records, takes and remixes still point at it. */
export async function withdrawDesign(deps: Deps, member: SignedIn, slug: string): Promise<void> {
  const row = await editable(deps, member, slug);
  const now = deps.clock.now();
  await deps.database.db.transaction(async (tx) => {
    const [updated] = await tx
      .update(design)
      .set({ withdrawnAt: now, version: sql`${design.version} + 1`, updatedAt: now })
      .where(and(eq(design.id, row.id), isNull(design.withdrawnAt)))
      .returning({ id: design.id });
    if (updated === undefined) return;
    await appendAudit(tx, {
      at: now,
      actorId: member.id,
      action: 'design.withdrawn',
      subject: `design:${row.id}`,
      detail: {},
    });
  });
  await refreshSearch(deps, row.id);
}
