import type supertest from 'supertest';
import type { Flag } from '#shared/api/flags.ts';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import type { Person } from '../../support/test-club.ts';

/** A flag that must be raised. */
export async function flagged(person: Person, designSlug: string, more: object = {}): Promise<Flag> {
  const body = { designSlug, reason: 'The hole is off.', ...more };
  return (await person.call('post', '/api/flags').send(body).expect(201)).body as Flag;
}

/** The request that decides a flag as it was when it was last seen. */
export const decide = (
  person: Person,
  { id, version }: Pick<Flag, 'id' | 'version'>,
  action: DecisionAction,
  reason = 'Looked at by eye.',
): supertest.Test => person.call('post', `/api/flags/${id}/decision`).send({ action, reason, version });

/** A decision that must succeed; the flag as it is then. */
export async function decided(
  person: Person,
  flag: Pick<Flag, 'id' | 'version'>,
  action: DecisionAction,
  reason?: string,
): Promise<Flag> {
  return (await decide(person, flag, action, reason).expect(200)).body as Flag;
}
