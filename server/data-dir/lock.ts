import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** The folder is in use by another process, or cannot be locked: a sentence for the person at the console. */
export class DataDirBusy extends Error {}

/**
 * When a process started, in clock ticks since boot (proc(5), field 22): a process id alone may have been
 * given to another process since. Empty where /proc does not exist.
 */
function startOf(pid: number): string {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19] ?? '';
  } catch {
    return '';
  }
}

function isRunning(owner: { pid: number; start: string }): boolean {
  try {
    process.kill(owner.pid, 0);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ESRCH') return false;
  }
  return owner.start === '' || owner.start === startOf(owner.pid);
}

/**
 * Takes the folder for this process. PGlite does not refuse a second opener and then loses rows silently,
 * so the lock is ours: a file linked into place (atomic), taken over only from a process that is gone.
 */
export function lockDataDir(dataDir: string): { release(): void } {
  mkdirSync(dataDir, { recursive: true });
  const lockPath = join(dataDir, 'lock');
  const mine = join(dataDir, `lock.${process.pid}.${startOf(process.pid)}`);
  writeFileSync(mine, JSON.stringify({ pid: process.pid, start: startOf(process.pid) }));
  try {
    for (let attempt = 0; attempt < 5; attempt += 1) {
      try {
        linkSync(mine, lockPath);
        return { release: () => rmSync(lockPath, { force: true }) };
      } catch (error) {
        if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
      }
      takeAwayStaleLock(lockPath, mine, dataDir);
    }
    throw new DataDirBusy(`${dataDir} could not be locked: other processes keep starting on it`);
  } finally {
    rmSync(mine, { force: true });
  }
}

/** Null when the lock names no process: it is written whole, so what is not whole was lost in a power cut. */
function ownerIn(text: string): { pid: number; start: string } | null {
  try {
    const { pid, start } = JSON.parse(text) as { pid: unknown; start: unknown };
    return typeof pid === 'number' && typeof start === 'string' ? { pid, start } : null;
  } catch {
    return null;
  }
}

function takeAwayStaleLock(lockPath: string, mine: string, dataDir: string): void {
  let text: string;
  try {
    text = readFileSync(lockPath, 'utf8');
  } catch {
    return; // released in the meantime
  }
  const owner = ownerIn(text);
  if (owner !== null && isRunning(owner)) {
    throw new DataDirBusy(
      `${dataDir} is in use by process ${owner.pid}. Stop that server, or set DATA_DIR to another folder.`,
    );
  }
  const aside = `${mine}.stale`;
  try {
    renameSync(lockPath, aside);
  } catch {
    return; // another starter was faster
  }
  // Between reading and renaming, a faster starter may have put its own lock there: give it back.
  if (readFileSync(aside, 'utf8') !== text) linkSync(aside, lockPath);
  rmSync(aside, { force: true });
}
