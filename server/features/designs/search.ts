import type { Deps } from '#server/deps.ts';
import { machineOfMember } from '#server/features/bench/machine-of-member.ts';
import { ProblemError } from '#server/http/problem.ts';
import { BadCursor } from '#server/search/document.ts';
import type { DesignList, DesignQuery } from '#shared/api/designs.ts';
import { presentListItem } from './present.ts';
import { newestRevisions } from './queries.ts';
import { evidenceOfMany } from './search-document.ts';

const pageSize = 24;

/** One page of the loft: the search picks and counts, the database has what the cards show. */
export async function searchDesigns(deps: Deps, memberId: string, query: DesignQuery): Promise<DesignList> {
  const machine =
    query.machineId === undefined ? undefined : await machineOfMember(deps, memberId, query.machineId);
  const given = {
    q: query.q,
    kind: query.kind,
    material: query.material,
    bitMm: query.bitMm,
    standing: query.standing,
    maxMinutes: query.maxMinutes,
    fits: query.fits === undefined ? undefined : true,
    machine,
    cursor: query.cursor,
  };
  const asked = Object.fromEntries(
    Object.entries(given).filter(([, value]) => value !== undefined),
  ) as Partial<{ [Name in keyof typeof given]: NonNullable<(typeof given)[Name]> }>;
  const sort = query.sort ?? (query.q === undefined || query.q.trim() === '' ? 'newest' : 'match');
  const found = await deps.search.search({ ...asked, sort, limit: pageSize }).catch((error: unknown) => {
    if (error instanceof BadCursor)
      throw new ProblemError(
        400,
        'cursor.bad',
        'This cursor is not one of ours. Start again from the first page.',
      );
    throw error;
  });
  const { db } = deps.database;
  const rows = found.ids.length === 0 ? [] : await newestRevisions(db, found.ids);
  const evidence = await evidenceOfMany(db, rows);
  const byId = new Map(rows.map((row) => [row.design.id, row]));
  const items = found.ids.flatMap((id) => {
    const row = byId.get(id);
    return row === undefined || row.design.withdrawnAt !== null
      ? []
      : [presentListItem(row, evidence.of(row))];
  });
  return { items, total: found.total, nextCursor: found.nextCursor, facets: found.facets };
}
