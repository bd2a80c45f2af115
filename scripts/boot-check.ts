import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startServer } from './server-process.ts';

// The built server, as a club would start it: it says it listens, answers for its health, and stops when told.
const dataDir = mkdtempSync(join(tmpdir(), 'tallyloft-boot-'));
const server = await startServer('index', { DATA_DIR: dataDir });
const answer = await fetch(`${server.url}/api/health`);
const health = await answer.text();
const page = await (await fetch(server.url)).text();
const code = await server.stop();
rmSync(dataDir, { recursive: true, force: true });
const good =
  answer.status === 200 && health.includes('"status":"ok"') && page.includes('<div id="root">') && code === 0;
process.stdout.write(`${health}\nstopped with ${code}\n`);
process.exit(good ? 0 : 1);
