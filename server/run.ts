import { type Logger, pino } from 'pino';
import { type Config, ConfigError, readConfig } from './config.ts';
import { DataDirBusy } from './data-dir/lock.ts';
import { DatabaseTooNew } from './db/migrate.ts';
import type { Deps } from './deps.ts';
import { safeError } from './safe-error.ts';
import { type Running, type StartHooks, start } from './start.ts';

/** Problems a person at the console can mend: told in one line, without a stack. */
export class StartRefused extends Error {}
const mendable = [ConfigError, DataDirBusy, DatabaseTooNew, StartRefused];

export interface Entry extends StartHooks {
  defaultDataDir: string;
  check?(config: Config): void;
  afterListening?(deps: Deps): Promise<string[]>;
}

/** The life of a server process: start, say so, stop on a signal. */
export async function run(entry: Entry): Promise<void> {
  // Logs go to standard error: standard output carries the plain lines that scripts wait for.
  const log = pino(
    { level: process.env['LOG_LEVEL'] ?? 'warn', serializers: { err: safeError } },
    pino.destination(2),
  );
  let running: Running | undefined;
  let isStopping = false;
  // Signals come in twos (a terminal's, and the one npm passes on): the first one stops, the rest change nothing.
  const stop = () => {
    if (isStopping) return;
    isStopping = true;
    if (running !== undefined) void endWith(running, log);
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
  const config = readOrFail(entry);
  running = await start(config, log, entry).catch(failIfMendable);
  if (isStopping) return endWith(running, log);
  const lines = (await entry.afterListening?.(running.deps)) ?? [];
  for (const line of lines) process.stdout.write(`${line}\n`);
  process.stdout.write(`Tallyloft is listening on ${running.url}\n`);
}

async function endWith(running: Running, log: Logger): Promise<void> {
  try {
    await running.close();
    process.exit(0);
  } catch (error) {
    log.error({ err: error }, 'closing failed');
    process.exit(1);
  }
}

function readOrFail(entry: Entry): Config {
  try {
    const config = readConfig(process.env, entry.defaultDataDir);
    entry.check?.(config);
    return config;
  } catch (error) {
    return failIfMendable(error);
  }
}

function failIfMendable(error: unknown): never {
  const { code, port } = error as { code?: string; port?: number };
  if (code === 'EADDRINUSE') fail(`Port ${port} is in use. Set PORT to another one, or to 0 for a free one.`);
  if (mendable.some((kind) => error instanceof kind)) fail((error as Error).message);
  throw error;
}

function fail(sentence: string): never {
  process.stderr.write(`${sentence}\n`);
  process.exit(1);
}
