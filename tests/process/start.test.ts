import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type ServerProcess, startServer } from '../../scripts/server-process.ts';

let dataDir: string;
let server: ServerProcess;
beforeAll(async () => {
  dataDir = mkdtempSync(join(tmpdir(), 'tallyloft-start-'));
  server = await startServer('index', { DATA_DIR: dataDir });
});
afterAll(() => rmSync(dataDir, { recursive: true, force: true }));

describe('the built server', () => {
  it('refuses a second server on the same folder with a sentence, and goes on itself', async () => {
    await expect(startServer('index', { DATA_DIR: dataDir })).rejects.toThrow(
      `${dataDir} is in use by process ${server.process.pid}. Stop that server, or set DATA_DIR to another folder.`,
    );
    expect((await fetch(`${server.url}/api/health`)).status).toBe(200);
  });

  it('names the variable of a wrong environment in one line', async () => {
    await expect(startServer('index', { DATA_DIR: dataDir, PORT: 'many' })).rejects.toThrow(
      /^the server ended with 1: PORT must be a whole number$/,
    );
  });

  it('does not seed a demo into a folder that is not a demo’s', async () => {
    const other = mkdtempSync(join(tmpdir(), 'tallyloft-other-'));
    writeFileSync(join(other, 'letter.txt'), 'dear club');
    await expect(startServer('demo', { DATA_DIR: other })).rejects.toThrow(
      /not empty and not a demo's folder/,
    );
    rmSync(other, { recursive: true, force: true });
  });

  it('answers unknown calls with a problem and unknown pages with the client', async () => {
    const call = await fetch(`${server.url}/api/nothing`);
    expect(call.status).toBe(404);
    expect(call.headers.get('content-type')).toContain('application/problem+json');
    const page = await fetch(`${server.url}/designs/anything`);
    expect(page.status).toBe(200);
    expect(await page.text()).toContain('<div id="root">');
  });

  it('stops with 0 when told', async () => {
    expect(await server.stop()).toBe(0);
  });
});
