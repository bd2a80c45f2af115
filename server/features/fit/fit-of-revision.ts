import type { Deps } from '#server/deps.ts';
import { bitsOfMember, machineOfMember } from '#server/features/bench/machine-of-member.ts';
import { requireRevision } from '#server/features/designs/require-revision.ts';
import { whichRecord } from '#server/features/takes/which-record.ts';
import type { FitReport } from '#shared/api/fit.ts';
import { fitReport } from '#shared/fit/fit-report.ts';

export interface FitQuestion {
  memberId: string;
  slug: string;
  number: string;
  machineId: string;
  recordId: string | undefined;
  units: 'mm' | 'in' | undefined;
  bitIds: readonly string[] | undefined;
  stockMm: string | undefined;
}

/** The fit report of a revision on the member's own bench, by the settings of one of its cut records. */
export async function fitOfRevision(deps: Deps, question: FitQuestion): Promise<FitReport> {
  const { revision } = await requireRevision(deps, question.slug, question.number);
  const machine = await machineOfMember(deps, question.memberId, question.machineId);
  const bits = await bitsOfMember(deps, question.memberId, question.bitIds);
  const cut = (await whichRecord(deps, revision.geometryHash, question.recordId))?.cut;
  const [lengthMm, widthMm, thicknessMm] = question.stockMm?.split('x').map(Number) ?? [];
  const stock =
    lengthMm === undefined || widthMm === undefined || thicknessMm === undefined
      ? undefined
      : { lengthMm, widthMm, thicknessMm };
  return fitReport({
    hullMm: revision.hullMm,
    bit: cut?.bit,
    settings: cut?.settings,
    stockThicknessMm: cut?.stockThicknessMm,
    runTimeS: cut?.runTimeS,
    machine,
    bits,
    stock,
    units: question.units,
  });
}
