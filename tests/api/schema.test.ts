import { getAuthTables } from 'better-auth/db';
import { sql } from 'drizzle-orm';
import { getTableConfig, PgTable } from 'drizzle-orm/pg-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { rowsOf } from '#server/db/rows.ts';
import * as tables from '#server/db/schema/index.ts';
import { type TestClub, testClub } from '../support/test-club.ts';

let club: TestClub;
beforeAll(async () => {
  club = await testClub();
});
afterAll(() => club.close());

const { user, session, account, verification } = tables;
const own = { user, session, account, verification };
const authTables = Object.keys(own) as (keyof typeof own)[];
const dataTypes: Record<string, string> = {
  string: 'string',
  date: 'date',
  boolean: 'boolean',
  number: 'number',
};

describe('the tables of the sign-in library', () => {
  it('are those that it asks for', () => {
    expect(Object.keys(getAuthTables(club.deps.auth.options)).sort()).toEqual([...authTables].sort());
  });

  it.each(authTables)('%s has the library’s fields, and those alone', (name) => {
    const wanted = getAuthTables(club.deps.auth.options)[name];
    const table: Record<string, unknown> = own[name] as never;
    const columns = new Map(
      getTableConfig(own[name]).columns.map((column) => [
        Object.keys(table).find((key) => table[key] === column) ?? column.name,
        column,
      ]),
    );
    const fields = Object.entries(wanted?.fields ?? {});
    expect(fields.length).toBeGreaterThan(3);
    expect([...columns.keys()].sort()).toEqual(['id', ...fields.map(([field]) => field)].sort());
    for (const [field, { type, required, unique, references }] of fields) {
      const column = columns.get(field);
      const what = `${name}.${field}`;
      expect(column?.dataType, what).toBe(dataTypes[String(type)] ?? String(type));
      expect(column?.notNull, what).toBe(required !== false);
      expect(column?.isUnique ?? false, what).toBe(unique ?? false);
      if (references === undefined) continue;
      const key = getTableConfig(own[name]).foreignKeys.find(({ reference }) =>
        reference().columns.some((part) => part === column),
      );
      expect(getTableConfig(key?.reference().foreignTable as PgTable).name, what).toBe(references.model);
      expect(key?.onDelete, what).toBe(references.onDelete);
    }
  });
});

describe('the migrations', () => {
  it('make the tables that the program reads', async () => {
    const made = rowsOf<{ table: string; column: string; nullable: string }>(
      await club.deps.database.db.execute(sql`
        select table_name as "table", column_name as "column", is_nullable as nullable
        from information_schema.columns where table_schema = 'public'`),
    ).map(({ table, column, nullable }) => `${table}.${column} ${nullable === 'YES' ? 'null' : 'not null'}`);
    const read = (Object.values(tables) as unknown[])
      .filter((value) => value instanceof PgTable)
      .flatMap((table) => {
        const { name, columns } = getTableConfig(table);
        return columns.map((column) => `${name}.${column.name} ${column.notNull ? 'not null' : 'null'}`);
      });
    expect(read.length).toBeGreaterThan(100);
    expect(made.sort()).toEqual(read.sort());
  });
});
