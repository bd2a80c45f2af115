import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import type { TestProject } from 'vitest/node';
import { openPglite } from '#server/db/client.ts';
import { ensureClub } from '#server/db/ensure-club.ts';
import { migrate } from '#server/db/migrate.ts';

declare module 'vitest' {
  export interface ProvidedContext {
    migratedDatabase: string;
  }
}

/** Migrates one database for the whole run; every test file starts from a copy of it. */
export default async function setup(project: TestProject): Promise<() => void> {
  const folder = mkdtempSync(join(tmpdir(), 'tallyloft-tests-'));
  const client = await PGlite.create();
  const database = openPglite(client);
  await migrate(database);
  await ensureClub(database.db);
  const dump = await client.dumpDataDir('none');
  await database.close();
  const file = join(folder, 'migrated.tar');
  writeFileSync(file, Buffer.from(await dump.arrayBuffer()));
  project.provide('migratedDatabase', file);
  return () => rmSync(folder, { recursive: true, force: true });
}
