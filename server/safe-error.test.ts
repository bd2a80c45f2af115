import { DrizzleQueryError } from 'drizzle-orm';
import { expect, it } from 'vitest';
import { safeError } from './safe-error.ts';

it('keeps the values of a failed query out of the log, and says which query and why', () => {
  const cause = Object.assign(new Error('connection refused'), { code: 'ECONNREFUSED' });
  const error = new DrizzleQueryError('select * from session where token = $1', ['the-secret-token'], cause);
  expect(error.message).toContain('the-secret-token');
  const told = JSON.stringify(safeError(error));
  expect(told).not.toContain('the-secret-token');
  expect(told).toContain('select * from session');
  expect(told).toContain('ECONNREFUSED');
});
