import type { Transaction } from '#server/db/client.ts';
import { notice } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';

/** What a notice is about; the application shows each in its own way. */
export type NoticeKind =
  | 'flag-raised'
  | 'flag-decided'
  | 'withheld'
  | 'restored'
  | 'cut-recorded'
  | 'remixed';

export interface NewNotice {
  memberId: string;
  kind: NoticeKind;
  /** The whole of what the member reads. */
  sentence: string;
  designId?: string | undefined;
}

/** Tells a member something, in the transaction that caused it. */
export async function insertNotice(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  given: NewNotice,
): Promise<void> {
  await tx.insert(notice).values({
    id: deps.ids.next(),
    memberId: given.memberId,
    kind: given.kind,
    sentence: given.sentence,
    designId: given.designId ?? null,
    createdAt: deps.clock.now(),
    readAt: null,
  });
}
