import { newIdempotencyKey } from '../../api/request.ts';
import { keep, readKept } from '../../kept/kept.ts';
import { keepFile } from '../../kept/kept-file.ts';
import { emptyShare, type ShareValues } from './share-values.ts';

export interface Draft {
  readonly values: ShareValues;
  /** One a draft: a second try is the same share. */
  readonly idempotencyKey: string;
}

/** Each member of a shared computer has a draft of their own. */
export const draftName = (memberId: string): string => `share-draft.${memberId}`;

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

/** The kept values over the empty ones, so that a draft of an older form still opens. */
const completed = (kept: Record<string, unknown>): ShareValues => {
  const cut = isRecord(kept['cut']) ? kept['cut'] : {};
  const part = (value: unknown) => (isRecord(value) ? value : {});
  return {
    ...emptyShare,
    ...kept,
    tags: Array.isArray(kept['tags']) ? kept['tags'].map(String) : [],
    scale: part(kept['scale']),
    cut: {
      ...emptyShare.cut,
      ...cut,
      bit: { ...emptyShare.cut.bit, ...part(cut['bit']) },
      settings: part(cut['settings']),
    },
  };
};

/** The draft of this member, or a new one. */
export const readDraft = (memberId: string): Draft => {
  const text = readKept(draftName(memberId));
  try {
    // What could not be read as a number was kept as null: it is missing.
    const kept: unknown = JSON.parse(text ?? 'null', (_key, value) => value ?? undefined);
    if (isRecord(kept) && isRecord(kept['values']) && typeof kept['idempotencyKey'] === 'string') {
      return { values: completed(kept['values']), idempotencyKey: kept['idempotencyKey'] };
    }
  } catch {
    // A spoilt draft is none.
  }
  return { values: emptyShare, idempotencyKey: newIdempotencyKey() };
};

export const keepDraft = (memberId: string, draft: Draft): void =>
  keep(draftName(memberId), JSON.stringify(draft));

/** After publishing, or when the member starts afresh. */
export const forgetDraft = async (memberId: string): Promise<void> => {
  keep(draftName(memberId), null);
  await keepFile(draftName(memberId), null);
};
