import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { StartRefused } from '#server/run.ts';

/** What a demo folder says of itself; a seeding that was cut short is done again from the start. */
export type DemoFolder = 'to be seeded' | 'seeded';

const markOf = (dataDir: string) => join(dataDir, 'demo.json');

/** Looks at the folder: empty or a demo's, else refused, so that no real club is seeded over. */
export function readDemoFolder(dataDir: string): DemoFolder {
  const mark = markOf(dataDir);
  if (existsSync(mark))
    return JSON.parse(readFileSync(mark, 'utf8')).seeded === true ? 'seeded' : 'to be seeded';
  if (existsSync(dataDir) && readdirSync(dataDir).length > 0) {
    throw new StartRefused(
      `${dataDir} is not empty and not a demo's folder. Set DATA_DIR to an empty or new folder.`,
    );
  }
  mkdirSync(dataDir, { recursive: true });
  writeFileSync(mark, JSON.stringify({ seeded: false }));
  return 'to be seeded';
}

/** Clears what an interrupted seeding left; only ever called on a folder that carries the demo's mark. */
export function clearHalfSeeded(dataDir: string): void {
  for (const name of ['database', 'objects', 'outbox'])
    rmSync(join(dataDir, name), { recursive: true, force: true });
}

export function markSeeded(dataDir: string): void {
  writeFileSync(markOf(dataDir), JSON.stringify({ seeded: true }));
}
