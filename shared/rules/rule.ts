import type { Machine } from '../api/bench.ts';
import type { BitUsed, Settings } from '../api/cuts.ts';
import type { Finding } from '../api/findings.ts';
import type { Material } from '../api/vocabulary.ts';

/** What is known of settings when rules look at them. */
export interface SettingsContext {
  readonly bit: BitUsed;
  /** The greatest speed marked on the bit, in rev/min; absent when it is not known. */
  readonly bitMaxRpm?: number | undefined;
  readonly materialId: Material;
  readonly stockThicknessMm: number;
  readonly settings: Settings;
  /** Feed override that the member ended with; absent: the feed as set. */
  readonly overridePercent?: number | undefined;
  readonly machine?: Omit<Machine, 'version' | 'createdAt'> | undefined;
}

/** One safety rule. It holds no state: the same context always gives the same findings. */
export interface Rule {
  /** Never renamed: flags and records of them carry it. */
  readonly id: string;
  readonly title: string;
  /** A publication, or `commonPractice`. */
  readonly source: string;
  readonly check: (context: SettingsContext) => Finding[];
}

export const commonPractice = 'common practice, no published source';

/** Whether a value is past a limit; a millionth of it is the noise of double arithmetic. */
export const isPast = (value: number, limit: number): boolean => value > limit * (1 + 1e-6);

/** A finding in the name of its rule. */
export const findingOf = (
  rule: Pick<Rule, 'id' | 'title' | 'source'>,
  said: Pick<Finding, 'level' | 'sentence' | 'advice' | 'figures'> & { readonly source?: string },
): Finding => ({ ruleId: rule.id, title: rule.title, source: rule.source, ...said });
