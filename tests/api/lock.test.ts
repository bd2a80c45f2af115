import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { DataDirBusy, lockDataDir } from '#server/data-dir/lock.ts';
import { projectRoot } from '#server/project-root.ts';

let folder: string;
let children: ChildProcess[] = [];
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'tallyloft-lock-'));
});
afterEach(() => {
  for (const child of children) child.kill('SIGKILL');
  children = [];
  rmSync(folder, { recursive: true, force: true });
});

/** Another process that takes the folder and keeps it until it is ended. */
async function otherServer(): Promise<ChildProcess> {
  const lines = `
    const { lockDataDir } = await import('./server/data-dir/lock.ts');
    try { lockDataDir(${JSON.stringify(folder)}); console.log('locked'); }
    catch (error) { console.log(error.constructor.name + ': ' + error.message); }
    process.stdin.resume();`;
  const child = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', lines], {
    cwd: projectRoot(),
    stdio: ['pipe', 'pipe', 'inherit'],
  });
  children.push(child);
  return child;
}

const firstLine = async (child: ChildProcess) => {
  if (child.stdout === null) throw new Error('no output is read');
  const [chunk] = (await once(child.stdout, 'data')) as [Buffer];
  return chunk.toString().trim();
};

const refusal = (): string => {
  try {
    lockDataDir(folder);
  } catch (error) {
    expect(error).toBeInstanceOf(DataDirBusy);
    return (error as DataDirBusy).message;
  }
  return 'it was taken';
};

describe('the folder of a club', () => {
  it('is refused to a second process with a sentence, and taken over when the first was killed', async () => {
    const child = await otherServer();
    expect(await firstLine(child)).toBe('locked');
    const message = refusal();
    expect(message).toContain(folder);
    expect(message).toContain(`process ${child.pid}`);
    expect(message).toContain('DATA_DIR');
    const ended = once(child, 'exit');
    child.kill('SIGKILL');
    await ended;
    expect(existsSync(join(folder, 'lock'))).toBe(true);
    const lock = lockDataDir(folder);
    expect(JSON.parse(readFileSync(join(folder, 'lock'), 'utf8'))).toMatchObject({ pid: process.pid });
    lock.release();
  });

  it('taken here is refused to another process', async () => {
    const lock = lockDataDir(folder);
    expect(await firstLine(await otherServer())).toMatch(
      new RegExp(`^DataDirBusy: .*in use by process ${process.pid}\\.`),
    );
    lock.release();
  });

  it('is free again after its release, with nothing left behind', () => {
    const lock = lockDataDir(folder);
    expect(refusal()).toContain('in use');
    lock.release();
    expect(readdirSync(folder)).toEqual([]);
    lockDataDir(folder).release();
  });

  it('is taken over from a process whose number was given to another one since', () => {
    writeFileSync(join(folder, 'lock'), JSON.stringify({ pid: process.pid, start: '1' }));
    const lock = lockDataDir(folder);
    expect(readdirSync(folder)).toEqual(['lock']);
    lock.release();
  });

  it.each(['', '{"pid":', 'null'])('is taken over when the lock holds “%s”, as after a power cut', (text) => {
    writeFileSync(join(folder, 'lock'), text);
    lockDataDir(folder).release();
    expect(readdirSync(folder)).toEqual([]);
  });

  it('is made when it is not there yet', () => {
    const deeper = join(folder, 'a', 'b');
    lockDataDir(deeper).release();
    expect(existsSync(deeper)).toBe(true);
  });
});
