import { mkdtempSync, rmSync } from 'node:fs';
import { connect, type Socket } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { type ServerProcess, startServer } from '../../scripts/server-process.ts';

let dataDir: string;
let server: ServerProcess;
beforeEach(async () => {
  dataDir = mkdtempSync(join(tmpdir(), 'tallyloft-stop-'));
  server = await startServer('index', { DATA_DIR: dataDir });
});
afterEach(() => rmSync(dataDir, { recursive: true, force: true }));

/** A request whose body never comes. */
function halfARequest(): Promise<Socket> {
  const { hostname, port } = new URL(server.url);
  return new Promise((resolve) => {
    const socket = connect(Number(port), hostname, () => {
      socket.write(
        'POST /api/auth/sign-in/email HTTP/1.1\r\nHost: localhost\r\nContent-Type: application/json\r\nContent-Length: 100\r\n\r\n{"em',
        () => resolve(socket),
      );
    });
    socket.on('error', () => undefined);
  });
}

describe('stopping the server', () => {
  it('does not wait for ever for a request whose body never comes', async () => {
    const socket = await halfARequest();
    expect(await server.stop()).toBe(0);
    socket.destroy();
  }, 60_000);

  it('ends with 0 when the signal comes twice', async () => {
    const socket = await halfARequest();
    server.process.kill('SIGINT');
    server.process.kill('SIGINT');
    expect(await server.stop()).toBe(0);
    socket.destroy();
    // The folder was closed in order: the next server opens it.
    const next = await startServer('index', { DATA_DIR: dataDir });
    expect(await next.stop()).toBe(0);
  }, 60_000);
});
