import type { CutRecord } from '#shared/api/cuts.ts';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import type { Person } from '../../support/test-club.ts';

/** A moderator flags a record and decides on it in one step. */
export async function decideOn(
  moderator: Person,
  { design, revision, id }: Pick<CutRecord, 'design' | 'revision' | 'id'>,
  action: DecisionAction,
  reason: string,
): Promise<void> {
  await moderator
    .call('post', '/api/flags')
    .send({ designSlug: design.slug, revision, recordId: id, reason, decision: { action, reason } })
    .expect(201);
}
