import { join } from 'node:path';
import { sql } from 'drizzle-orm';
import { readMigrationFiles } from 'drizzle-orm/migrator';
import { migrate as migratePostgres } from 'drizzle-orm/node-postgres/migrator';
import { migrate as migratePglite } from 'drizzle-orm/pglite/migrator';
import { projectRoot } from '#server/project-root.ts';
import type { OpenDatabase } from './client.ts';
import { rowsOf } from './rows.ts';

/** The database was written by a newer program than this one. */
export class DatabaseTooNew extends Error {}

/** Any number of ours; every process of this program asks for the same lock before it migrates. */
const migrationLock = 7_140_213;

/** Brings the database up to this program's schema; forward only. */
export async function migrate(database: OpenDatabase): Promise<void> {
  const migrationsFolder = join(projectRoot(), 'drizzle');
  await refuseNewer(database, migrationsFolder);
  if (database.kind === 'pglite') {
    await migratePglite(database.db as never, { migrationsFolder });
    return;
  }
  await database.db.transaction(async (tx) => {
    await tx.execute(sql`select pg_advisory_xact_lock(${migrationLock})`);
    await migratePostgres(tx as never, { migrationsFolder });
  });
}

async function refuseNewer(database: OpenDatabase, migrationsFolder: string): Promise<void> {
  const table = await database.db.execute(sql`select to_regclass('drizzle.__drizzle_migrations') as name`);
  if (rowsOf<{ name: string | null }>(table)[0]?.name == null) return;
  const applied = await database.db.execute(
    sql`select max(created_at)::text as newest from drizzle.__drizzle_migrations`,
  );
  const newestApplied = Number(rowsOf<{ newest: string | null }>(applied)[0]?.newest ?? 0);
  const newestKnown = Math.max(...readMigrationFiles({ migrationsFolder }).map((file) => file.folderMillis));
  if (newestApplied > newestKnown) {
    throw new DatabaseTooNew(
      'The database was written by a newer Tallyloft than this one. Start the newer program, or restore a backup.',
    );
  }
}
