import type { Transaction } from '#server/db/client.ts';
import type { cut } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { hazardFlag } from '#server/features/review/hazard-flag.ts';
import { raiseRuleFlags } from '#server/features/review/raise-rule-flags.ts';
import { findingsOf } from '#server/features/review/rule-findings.ts';
import { isHazard } from '#shared/evidence/went-wrong.ts';

type CutNow = Parameters<typeof findingsOf>[0] &
  Pick<typeof cut.$inferSelect, 'id' | 'revisionId' | 'wentWrong'>;

/** Flags what the rules will not have in the settings of a record, and the hazards that it reports. */
export async function judgeCut(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  designId: string,
  now: CutNow,
): Promise<void> {
  const {
    id: cutId,
    revisionId,
    bit,
    bitMaxRpm,
    materialId,
    stockThicknessMm,
    settings,
    overridePercent,
    machine,
  } = now;
  const target = { designId, revisionId, cutId };
  const findings = findingsOf({
    bit,
    bitMaxRpm,
    materialId,
    stockThicknessMm,
    settings,
    overridePercent: overridePercent ?? null,
    machine,
  });
  await raiseRuleFlags(deps, tx, { ...target, findings });
  await hazardFlag(deps, tx, { ...target, hazards: now.wentWrong.filter(isHazard) });
}
