import type { Transaction } from '#server/db/client.ts';
import type { Deps } from '#server/deps.ts';
import { refreshGeometry } from '#server/features/review/refresh-geometry.ts';
import { createOnce, type Repeatable } from '#server/idempotency.ts';
import type { Design } from '#shared/api/designs.ts';
import { presentDesign } from './present.ts';
import { designPage } from './queries.ts';

/** Writes what was shared, once, and answers with its design; after that the search learns of it. */
export async function shareOnce(
  deps: Deps,
  repeatable: Repeatable,
  write: (tx: Transaction) => Promise<{ slug: string }>,
): Promise<Design> {
  const published = await createOnce(deps, repeatable, async (tx) => {
    const { slug } = await write(tx);
    const page = await designPage(tx, slug, repeatable.memberId);
    if (page === null) throw new Error(`design ${slug} is missing in its own transaction`);
    return presentDesign(page);
  });
  // A cut that came along is evidence for every design of this geometry.
  await refreshGeometry(deps, {
    designId: published.id,
    geometryHash: published.revision.geometryHash,
  });
  return published;
}
