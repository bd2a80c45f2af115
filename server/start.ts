import { createServer, type RequestListener, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Express } from 'express';
import type { Logger } from 'pino';
import { createAnalysis } from './analysis/pool.ts';
import { createApp } from './app.ts';
import { createAuth } from './auth.ts';
import { systemClock, uuidV7 } from './clock.ts';
import type { Config } from './config.ts';
import { lockDataDir } from './data-dir/lock.ts';
import { authSecret } from './data-dir/secret.ts';
import { openDatabase } from './db/client.ts';
import { ensureClub } from './db/ensure-club.ts';
import { migrate } from './db/migrate.ts';
import type { Deps } from './deps.ts';
import { searchDocuments } from './features/designs/search-document.ts';
import { plainErrorHandler } from './http/plain-error.ts';
import { outboxWorker } from './mail/outbox-worker.ts';
import { openMailTransport } from './mail/transport.ts';
import { inWorkerSearch } from './search/service.ts';
import { openObjectStore } from './storage/open.ts';
import { sweepPendingObjects } from './storage/sweeper.ts';

export interface Running {
  deps: Deps;
  url: string;
  close(): Promise<void>;
}

export interface StartHooks {
  serveClient(app: Express, server: Server): void | Promise<void>;
  /** The folder is ours alone now, and nothing in it is open yet. */
  afterLock?(): void;
  /** The parts are there; nothing is answered yet. */
  beforeServing?(deps: Deps): Promise<void>;
}

/** Brings the whole process up: folder lock, database, storage, search, application, listening. */
export async function start(config: Config, log: Logger, hooks: StartHooks): Promise<Running> {
  const undo: (() => Promise<void> | void)[] = [];
  const close = async () => {
    for (const step of undo.splice(0).reverse()) await step();
  };
  try {
    const lock = lockDataDir(config.dataDir);
    undo.push(() => lock.release());
    hooks.afterLock?.();
    const database = await openDatabase({ databaseUrl: config.databaseUrl, dataDir: config.dataDir });
    undo.push(() => database.close());
    await migrate(database);
    await ensureClub(database.db);
    const store = await openObjectStore(config.s3, config.dataDir);
    undo.push(() => store.close());
    const search = inWorkerSearch({ load: () => searchDocuments(database.db) });
    undo.push(() => search.close());
    const analysis = createAnalysis();
    undo.push(() => analysis.close());

    // The port is known only once it is bound (PORT=0), and links and trusted origins need it.
    let answer: RequestListener = stillStarting;
    const server = createServer((request, response) => answer(request, response));
    const port = await listen(server, config);
    undo.push(() => stopListening(server));
    const origins: [string, ...string[]] =
      config.appUrl === undefined
        ? [`http://localhost:${port}`, `http://127.0.0.1:${port}`]
        : [config.appUrl];
    const secret = authSecret(config.dataDir, config.authSecret);
    const auth = createAuth({
      db: database.db,
      secret,
      origins,
      ids: uuidV7,
    });
    const parts = { database, clock: systemClock, secret, origins, log };
    const mail = outboxWorker(parts, openMailTransport(config));
    const deps: Deps = {
      ...parts,
      store,
      search,
      analysis,
      auth,
      mail,
      ids: uuidV7,
      clubTimeZone: config.clubTimeZone,
      trustProxyHops: config.trustProxyHops,
    };
    await hooks.beforeServing?.(deps);
    await search.replaceAll(await searchDocuments(database.db));
    const app = createApp(deps);
    await hooks.serveClient(app, server);
    app.use(plainErrorHandler);
    answer = app;
    mail.start();
    undo.push(() => mail.stop());
    undo.push(everyHour(() => sweepPendingObjects(deps), log));
    const shownHost = config.host.includes(':') ? `[${config.host}]` : config.host;
    return { deps, url: `http://${shownHost}:${port}`, close };
  } catch (error) {
    await close();
    throw error;
  }
}

function listen(server: Server, config: Config): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(config.port, config.host, () => resolve((server.address() as AddressInfo).port));
  });
}

/** The port is ours, but nothing can be answered yet. */
const stillStarting: RequestListener = (_request, response) => {
  response.writeHead(503, { 'Retry-After': '2', 'Content-Type': 'text/plain; charset=utf-8' });
  response.end('Tallyloft is starting. Try again in a moment.\n');
};

/** How long an open request may hold up a stop. */
const longestFarewellMs = 10_000;

/** Open requests are finished; idle connections are closed at once, and those that never end after a while. */
function stopListening(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const deadline = setTimeout(() => server.closeAllConnections(), longestFarewellMs);
    server.close(() => {
      clearTimeout(deadline);
      resolve();
    });
    server.closeIdleConnections();
  });
}

function everyHour(work: () => Promise<unknown>, log: Logger): () => void {
  const run = () => void work().catch((error: unknown) => log.error({ err: error }, 'sweeping failed'));
  const timer = setInterval(run, 60 * 60 * 1000);
  run();
  return () => clearInterval(timer);
}
