import { newIdempotencyKey } from '../../api/request.ts';
import { keep, readKept } from '../../kept/kept.ts';
import type { RecordValues } from './record-values.ts';

export interface RecordDraft {
  readonly values: RecordValues;
  /** One a draft: a second try is the same record. */
  readonly idempotencyKey: string;
}

interface DraftOf {
  readonly memberId: string;
  readonly slug: string;
  readonly revision: number;
}

/** A draft for each member and each revision: its settings belong to that drawing. */
const nameOf = ({ memberId, slug, revision }: DraftOf): string =>
  `record-draft.${memberId}.${slug}.${revision}`;

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const part = (value: unknown): Record<string, unknown> => (isRecord(value) ? value : {});

/** The kept draft over the values to begin with, so that a draft of an older form still opens. */
export const readRecordDraft = (of: DraftOf, start: RecordValues): RecordDraft & { isKept: boolean } => {
  try {
    // What could not be read as a number was kept as null: it is missing.
    const kept: unknown = JSON.parse(readKept(nameOf(of)) ?? 'null', (_key, value) => value ?? undefined);
    if (isRecord(kept) && isRecord(kept['values']) && typeof kept['idempotencyKey'] === 'string') {
      const values = kept['values'];
      return {
        values: {
          ...start,
          ...values,
          bit: { ...start.bit, ...part(values['bit']) },
          settings: part(values['settings']),
          wentWrong: Array.isArray(values['wentWrong']) ? values['wentWrong'].map(String) : [],
          measured: Array.isArray(values['measured']) ? values['measured'].map(part) : [],
        },
        idempotencyKey: kept['idempotencyKey'],
        isKept: true,
      };
    }
  } catch {
    // A spoilt draft is none.
  }
  return { values: start, idempotencyKey: newIdempotencyKey(), isKept: false };
};

export const keepRecordDraft = (of: DraftOf, draft: RecordDraft): void =>
  keep(nameOf(of), JSON.stringify(draft));

export const forgetRecordDraft = (of: DraftOf): void => keep(nameOf(of), null);
