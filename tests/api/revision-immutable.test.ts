import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { rowsOf } from '#server/db/rows.ts';
import { type TestClub, testClub } from '../support/test-club.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
beforeAll(async () => {
  club = await testClub();
  await sharedDesign(await club.person('Wren'));
});
afterAll(() => club.close());

const rows = async (table: string) =>
  rowsOf(await club.deps.database.db.execute(sql`select * from ${sql.identifier(table)} order by 1`));

// Past the application: whoever holds the database's own prompt is refused too.
describe.each([
  ['revision', 'licence', "'CC0-1.0'"],
  ['revision_geometry', 'geometry', "'{}'"],
  ['audit_entry', 'action', "'nothing.happened'"],
])('the rows of %s', (table, column, value) => {
  it.each([
    `update ${table} set ${column} = ${value}`,
    `update ${table} set ${column} = ${column} where false`,
    `delete from ${table}`,
    `truncate ${table} cascade`,
  ])('never change: %s', async (statement) => {
    const before = await rows(table);
    expect(before.length).toBeGreaterThan(0);
    const refused = await club.deps.database.db.execute(sql.raw(statement)).then(
      () => null,
      (error: { cause?: { code?: string; message?: string } }) => error.cause,
    );
    // restrict_violation, SQLSTATE 23001 (PostgreSQL, appendix A)
    expect(refused?.code).toBe('23001');
    expect(refused?.message).toContain('never change');
    expect(await rows(table)).toEqual(before);
  });
});

describe('a design with a revision', () => {
  it('is not deleted in the database: its revision points at it', async () => {
    const { db } = club.deps.database;
    const refused = await db.execute(sql`delete from design`).catch((error: Error) => error);
    expect(refused).toBeInstanceOf(Error);
    expect(await rows('design')).toHaveLength(1);
  });
});
