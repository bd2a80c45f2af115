import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { hashPassword } from 'better-auth/crypto';
import type { Express } from 'express';
import { pino } from 'pino';
import { createAnalysis } from '#server/analysis/pool.ts';
import { createApp } from '#server/app.ts';
import { createAuth } from '#server/auth.ts';
import { systemClock, uuidV7 } from '#server/clock.ts';
import { openDatabase } from '#server/db/client.ts';
import { ensureClub } from '#server/db/ensure-club.ts';
import { migrate } from '#server/db/migrate.ts';
import type { Deps } from '#server/deps.ts';
import { searchDocuments } from '#server/features/designs/search-document.ts';
import { createMember } from '#server/features/people/invitations.ts';
import { inWorkerSearch } from '#server/search/service.ts';
import { openObjectStore } from '#server/storage/open.ts';
import { insertDesigns } from './insert-designs.ts';

export interface BigClub {
  deps: Deps;
  listen(app: Express): Promise<{ url: string; close(): Promise<void> }>;
  /** The application, signed in over HTTP. */
  app: Express;
  signIn(url: string): Promise<Record<string, string>>;
  close(): Promise<void>;
}

const origin = 'http://localhost:4870';
const member = { email: 'bench@club.example', password: 'twelve letters at least' };

/** A club with many designs in a database in memory, as the server runs it. */
export async function bigClub(designCount: number): Promise<BigClub> {
  const folder = mkdtempSync(join(tmpdir(), 'tallyloft-bench-'));
  const database = await openDatabase({});
  await migrate(database);
  await ensureClub(database.db);
  const store = await openObjectStore(undefined, folder);
  const analysis = createAnalysis();
  const search = inWorkerSearch({ load: () => searchDocuments(database.db) });
  const secret = 'a secret of the benchmarks, long enough';
  const origins: [string, ...string[]] = [origin];
  const auth = createAuth({ db: database.db, secret, origins, ids: uuidV7 });
  const deps: Deps = {
    database,
    store,
    search,
    analysis,
    auth,
    secret,
    clubTimeZone: 'UTC',
    clock: systemClock,
    ids: uuidV7,
    log: pino({ level: 'error' }, pino.destination(2)),
    mail: { nudge: () => undefined },
    trustProxyHops: 0,
    origins,
  };
  const passwordHash = await hashPassword(member.password);
  const ownerId = await database.db.transaction((tx) =>
    createMember(deps, tx, { name: 'Bench', email: member.email, role: 'member', passwordHash }),
  );
  await insertDesigns(deps, ownerId, designCount);
  await search.replaceAll(await searchDocuments(database.db));
  return {
    deps,
    app: createApp(deps),
    listen,
    signIn,
    async close() {
      await search.close();
      await analysis.close();
      await store.close();
      await database.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

async function listen(app: Express): Promise<{ url: string; close(): Promise<void> }> {
  const server = createServer(app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  return {
    url: `http://127.0.0.1:${port}`,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}

async function signIn(url: string): Promise<Record<string, string>> {
  const answer = await fetch(`${url}/api/auth/sign-in/email`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', Origin: origin },
    body: JSON.stringify(member),
  });
  return { Cookie: answer.headers.getSetCookie()[0]?.split(';')[0] ?? '', Origin: origin };
}
