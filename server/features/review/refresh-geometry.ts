import { sql } from 'drizzle-orm';
import { revision } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { refreshSearch } from '#server/features/designs/search-document.ts';

/** Tells the search of a design, and of every other one for which the same records are evidence. */
export async function refreshGeometry(
  deps: Deps,
  { designId, geometryHash }: { designId: string; geometryHash: string },
): Promise<void> {
  const rows = await deps.database.db
    .selectDistinct({ designId: revision.designId })
    .from(revision)
    .where(sql`${revision.geometryHash} = ${geometryHash}`);
  const ids = new Set([designId, ...rows.map((row) => row.designId)]);
  for (const id of ids) await refreshSearch(deps, id);
}
