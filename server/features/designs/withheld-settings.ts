import type { CutRow } from '#server/features/cuts/records.ts';
import type { Availabilities } from '#server/features/review/decisions.ts';
import { sameSettings } from '#shared/evidence/same-settings.ts';

export interface WithheldSettings {
  readonly reason: string;
  /** No moderator withheld them: they wait for a decision on a finding. */
  readonly waits: boolean;
}

/**
 * Why the settings of a record are not handed out: they are withheld themselves, or a moderator withheld the same
 * settings of another record of this geometry in this material, whoever recorded them.
 */
export function withheldSettings(
  row: CutRow,
  rows: readonly CutRow[],
  availabilities: Availabilities,
): WithheldSettings | null {
  const own = heldBack(row, availabilities);
  if (own !== null && !own.waits) return own;
  for (const other of rows) {
    const held = heldBack(other, availabilities);
    if (held === null || held.waits || !isAlike(row, other)) continue;
    return held;
  }
  return own;
}

function heldBack({ design, cut }: CutRow, availabilities: Availabilities): WithheldSettings | null {
  const { settings, waiting } = availabilities.of(design.id);
  const held = settings.get(cut.id);
  return held === undefined ? null : { reason: held.reason, waits: waiting.has(cut.id) };
}

const isAlike = (a: CutRow, b: CutRow): boolean =>
  a.geometryHash === b.geometryHash && a.cut.materialId === b.cut.materialId && sameSettings(a.cut, b.cut);
