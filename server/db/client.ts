import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { drizzle as drizzlePostgres } from 'drizzle-orm/node-postgres';
import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core';
import { drizzle as drizzlePglite } from 'drizzle-orm/pglite';
import { Pool } from 'pg';
import * as schema from './schema/index.ts';

export type Database = PgDatabase<PgQueryResultHKT, typeof schema>;
/** What runs inside a transaction. With PGlite's one connection, a query outside it would wait for ever. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];
export type Queries = Database | Transaction;

export interface OpenDatabase {
  db: Database;
  kind: 'pglite' | 'postgres';
  close(): Promise<void>;
}

/** PGlite in a folder (or in memory without one), or PostgreSQL at a URL. */
export async function openDatabase(where: {
  databaseUrl?: string | undefined;
  dataDir?: string;
}): Promise<OpenDatabase> {
  if (where.databaseUrl !== undefined) {
    const pool = new Pool({ connectionString: where.databaseUrl, max: 10 });
    // An idle connection that breaks must not end the process; the next query opens a new one.
    pool.on('error', () => undefined);
    return { db: drizzlePostgres(pool, { schema }), kind: 'postgres', close: () => pool.end() };
  }
  if (where.dataDir !== undefined) mkdirSync(where.dataDir, { recursive: true });
  const client =
    where.dataDir === undefined
      ? await PGlite.create()
      : await PGlite.create(join(where.dataDir, 'database'));
  return openPglite(client);
}

export function openPglite(client: PGlite): OpenDatabase {
  return { db: drizzlePglite(client, { schema }), kind: 'pglite', close: () => client.close() };
}
