import type { cut } from '#server/db/schema/index.ts';
import type { Standing } from '#shared/api/designs.ts';
import { type MaterialFamily, materialFamilies } from '#shared/api/vocabulary.ts';
import { standingOf } from '#shared/evidence/standing.ts';
import type { EvidenceRecord } from '#shared/evidence/votes.ts';

type Cut = Pick<typeof cut.$inferSelect, 'memberId' | 'createdAt' | 'outcome' | 'materialId'>;

const evidenceOf = (row: Cut): EvidenceRecord => ({
  memberId: row.memberId,
  recordedAt: row.createdAt.toISOString(),
  outcome: row.outcome,
  wentWrong: [],
});

/** The standing of one geometry in each material family that it was cut in. */
export function standingsOf(cuts: readonly Cut[], uploaderId: string): Standing[] {
  const used = new Set(cuts.map((row) => row.materialId));
  return materialFamilies
    .filter((material: MaterialFamily) => used.has(material))
    .map((material) => {
      const records = cuts.filter((row) => row.materialId === material).map(evidenceOf);
      const { word, votesFor, votesAgainst, low, high } = standingOf(records, uploaderId);
      return { material, word, votesFor, votesAgainst, low, high };
    });
}
