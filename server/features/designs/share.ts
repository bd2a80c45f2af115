import type { Deps } from '#server/deps.ts';
import { earlierAnswer, type Repeatable } from '#server/idempotency.ts';
import type { Design, DesignDetails } from '#shared/api/designs.ts';
import { insertDesign } from './insert-design.ts';
import type { MachineRow } from './insert-first-cut.ts';
import { readSharedDrawing } from './read-shared-drawing.ts';
import { shareOnce } from './share-once.ts';

/** What a member sends when sharing: the drawing, the words, and the machine if it was cut. */
export interface Share<Details> {
  memberId: string;
  svgBytes: Buffer;
  details: Details;
  machineRow: MachineRow | null;
}

/** Publishes a design: read, store, one transaction, then the search learns of it. */
export async function shareDesign(
  deps: Deps,
  { memberId, svgBytes, details, machineRow }: Share<DesignDetails>,
  repeatable: Repeatable,
): Promise<Design> {
  const earlier = await earlierAnswer<Design>(deps, repeatable);
  if (earlier !== null) return earlier;
  const drawing = await readSharedDrawing(deps, svgBytes, {
    title: details.title,
    millimetresPerUnit: details.scale?.millimetresPerUnit,
  });
  return shareOnce(deps, repeatable, (tx) =>
    insertDesign(deps, tx, {
      memberId,
      details,
      machineRow,
      drawing,
      changeNote: 'first issue',
      parentRevisionId: null,
    }),
  );
}
