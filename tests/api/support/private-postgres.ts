import { execFileSync, spawn } from 'node:child_process';
import { once } from 'node:events';
import { chownSync, existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { type AddressInfo, createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Where Debian keeps the programs of a PostgreSQL server, one folder a version. */
const versionsFolder = '/usr/lib/postgresql';

/** Folder of the newest PostgreSQL server's programs, or null where none is installed. */
export function postgresPrograms(): string | null {
  const versions = existsSync(versionsFolder) ? readdirSync(versionsFolder) : [];
  const folders = versions
    .sort((a, b) => Number(b) - Number(a))
    .map((version) => join(versionsFolder, version, 'bin'));
  return folders.find((folder) => existsSync(join(folder, 'initdb'))) ?? null;
}

/** PostgreSQL refuses to run as root, so there it runs as Debian's user for it. */
function runAs(): { uid?: number; gid?: number } {
  if (process.getuid?.() !== 0) return {};
  const idOf = (flag: string) => Number(execFileSync('id', [flag, 'postgres'], { encoding: 'utf8' }));
  return { uid: idOf('-u'), gid: idOf('-g') };
}

async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const { port } = server.address() as AddressInfo;
  server.close();
  await once(server, 'close');
  return port;
}

export interface PrivatePostgres {
  /** Address of a new, empty database. */
  newDatabase(name: string): string;
  stop(): Promise<void>;
}

/** A PostgreSQL server of the test's own, on loopback, in a folder that goes with it. */
export async function privatePostgres(programs: string): Promise<PrivatePostgres> {
  const who = runAs();
  const folder = mkdtempSync(join(tmpdir(), 'tallyloft-postgres-'));
  if (who.uid !== undefined && who.gid !== undefined) chownSync(folder, who.uid, who.gid);
  const data = join(folder, 'data');
  const options = { ...who, cwd: folder, stdio: 'pipe' as const };
  execFileSync(
    join(programs, 'initdb'),
    ['-D', data, '-U', 'club', '-A', 'trust', '-E', 'UTF8', '--locale=C', '--no-sync'],
    options,
  );
  const port = await freePort();
  const settings = [
    'listen_addresses=127.0.0.1',
    `port=${port}`,
    `unix_socket_directories=${folder}`,
    'fsync=off',
  ];
  const server = spawn(
    join(programs, 'postgres'),
    ['-D', data, ...settings.flatMap((setting) => ['-c', setting])],
    options,
  );
  let said = '';
  await new Promise<void>((resolve, reject) => {
    server.stderr.on('data', (chunk: Buffer) => {
      said += chunk.toString();
      if (said.includes('ready to accept connections')) resolve();
    });
    server.once('error', reject);
    server.once('exit', (code) => reject(new Error(`PostgreSQL ended with code ${code}: ${said}`)));
  });
  return {
    newDatabase(name) {
      execFileSync(
        join(programs, 'createdb'),
        ['-h', '127.0.0.1', '-p', String(port), '-U', 'club', name],
        options,
      );
      return `postgresql://club@127.0.0.1:${port}/${name}`;
    },
    async stop() {
      const ended = once(server, 'exit');
      // Fast shutdown (PostgreSQL 15, 19.5): open connections are ended.
      server.kill('SIGINT');
      await ended;
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
