import type { ReadDrawing } from '#server/analysis/pool.ts';
import type { Deps } from '#server/deps.ts';
import { readUpload } from '#server/features/drawings/read.ts';
import { ProblemError } from '#server/http/problem.ts';
import { type StoredDrawing, storeDrawing } from './store-drawing.ts';

/** A drawing that was read and lies in the object store; no row points at it yet. */
export interface SharedDrawing {
  read: ReadDrawing;
  stored: StoredDrawing;
}

/** Reads a drawing whose size is certain, and stores it; everything that can be refused is refused first. */
export async function readSharedDrawing(
  deps: Deps,
  svgBytes: Buffer,
  { title, millimetresPerUnit }: { title: string; millimetresPerUnit: number | undefined },
): Promise<SharedDrawing> {
  const read = await readUpload(deps, svgBytes, {
    title,
    ...(millimetresPerUnit === undefined ? {} : { millimetresPerUnit }),
  });
  if (!read.inspection.units.confirmed) {
    throw new ProblemError(
      422,
      'drawing.scale-not-confirmed',
      'The file does not say how large it is. State one measured size, or choose among the readings, so that nobody cuts it at the wrong size.',
      {
        errors: [{ path: 'scale.millimetresPerUnit', message: 'State the size of the drawing' }],
      },
    );
  }
  return { read, stored: await storeDrawing(deps, svgBytes, read) };
}
