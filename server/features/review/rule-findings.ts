import type { cut } from '#server/db/schema/index.ts';
import type { Finding } from '#shared/api/findings.ts';
import { checkSettings } from '#shared/rules/rules.ts';

type Told = Pick<
  typeof cut.$inferSelect,
  'bit' | 'bitMaxRpm' | 'materialId' | 'stockThicknessMm' | 'settings' | 'machine'
> & { overridePercent?: number | null };

/** What the rules say of the settings of a cut record, gravest first. */
export const findingsOf = ({ bitMaxRpm, overridePercent, ...cut }: Told): Finding[] =>
  checkSettings({ ...cut, bitMaxRpm: bitMaxRpm ?? undefined, overridePercent: overridePercent ?? undefined });
