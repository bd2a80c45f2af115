import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { mayBeDefault } from '#shared/evidence/default-settings.ts';

export interface Evidence {
  /** Records of this very geometry, newest first: their settings may be taken along. */
  readonly ofThis: readonly CutRecord[];
  /** Records of revisions that were drawn otherwise. */
  readonly ofOthers: readonly CutRecord[];
}

/** Revisions that share their geometry share their evidence (product.md, Standing). */
export const evidenceOf = ({ cuts, revision, revisions }: Design): Evidence => {
  const same = new Set(
    revisions
      .filter(({ geometryHash }) => geometryHash === revision.geometryHash)
      .map(({ number }) => number),
  );
  return {
    ofThis: cuts.filter((cut) => same.has(cut.revision)),
    ofOthers: cuts.filter((cut) => !same.has(cut.revision)),
  };
};

/** The record asked for, else the newest clean one that nothing speaks against, as the server chooses; null when there is none. */
export const chosenRecord = (records: readonly CutRecord[], recordId: string | null): CutRecord | null =>
  records.find(({ id }) => id === recordId) ??
  records.find(
    ({ outcome, wentWrong, inService, hazardsSettled, settingsWithheld }) =>
      settingsWithheld === undefined &&
      mayBeDefault({
        outcome,
        wentWrong,
        hazardsSettled,
        ...(inService === undefined ? {} : { inService: inService.result }),
      }),
  ) ??
  null;
