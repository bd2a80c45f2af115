import { newIdempotencyKey } from '../../api/request.ts';
import { keep, readKept } from '../../kept/kept.ts';
import { keepFile } from '../../kept/kept-file.ts';
import type { ShareMode } from './share-mode.ts';
import type { ShareValues } from './share-values.ts';

export interface Draft {
  readonly values: ShareValues;
  /** One a draft: a second try is the same share. */
  readonly idempotencyKey: string;
}

/** Each member of a shared computer has drafts of their own, one for each thing that is shared. */
export const draftName = (memberId: string, mode: ShareMode): string => {
  const name = `share-draft.${memberId}`;
  if (mode.kind === 'new') return name;
  return mode.kind === 'revision'
    ? `${name}.revision.${mode.slug}`
    : `${name}.remix.${mode.slug}.${mode.revision}`;
};

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

/** The kept values over those that the form begins with, so that a draft of an older form still opens. */
const completed = (kept: Record<string, unknown>, start: ShareValues): ShareValues => {
  const cut = isRecord(kept['cut']) ? kept['cut'] : {};
  const part = (value: unknown) => (isRecord(value) ? value : {});
  return {
    ...start,
    ...kept,
    tags: Array.isArray(kept['tags']) ? kept['tags'].map(String) : [],
    scale: part(kept['scale']),
    cut: {
      ...start.cut,
      ...cut,
      bit: { ...start.cut.bit, ...part(cut['bit']) },
      settings: part(cut['settings']),
    },
  };
};

/** The draft under this name, or a new one. */
export const readDraft = (name: string, start: ShareValues): Draft => {
  const text = readKept(name);
  try {
    // What could not be read as a number was kept as null: it is missing.
    const kept: unknown = JSON.parse(text ?? 'null', (_key, value) => value ?? undefined);
    if (isRecord(kept) && isRecord(kept['values']) && typeof kept['idempotencyKey'] === 'string') {
      return { values: completed(kept['values'], start), idempotencyKey: kept['idempotencyKey'] };
    }
  } catch {
    // A spoilt draft is none.
  }
  return { values: start, idempotencyKey: newIdempotencyKey() };
};

export const keepDraft = (name: string, draft: Draft): void => keep(name, JSON.stringify(draft));

/** After publishing, or when the member starts afresh. */
export const forgetDraft = async (name: string): Promise<void> => {
  keep(name, null);
  await keepFile(name, null);
};
