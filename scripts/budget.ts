import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';

// JavaScript that a page loads before it can be used, gzipped, against its budget (computation.md, Speed and size).

interface Chunk {
  file: string;
  isEntry?: boolean;
  imports?: string[];
}

const client = 'dist/client';
const smallKb = 150;
const anyKb = 240;
const small = ['src/routes/sign-in.tsx', 'src/routes/loft.tsx'];

const manifestPath = join(client, '.vite/manifest.json');
if (!existsSync(manifestPath)) throw new Error('The client is not built: run npm run build first.');
const manifest = JSON.parse(readFileSync(manifestPath, 'utf8')) as Record<string, Chunk>;
const entry = Object.keys(manifest).find((key) => manifest[key]?.isEntry);
const pages = Object.keys(manifest).filter((key) => /^src\/routes\/[^/]+\.tsx$/.test(key));

function filesOf(key: string, files: Set<string>): Set<string> {
  const chunk = manifest[key];
  if (chunk === undefined) throw new Error(`the budget names ${key}, which the build does not have`);
  if (files.has(chunk.file)) return files;
  files.add(chunk.file);
  for (const imported of chunk.imports ?? []) filesOf(imported, files);
  return files;
}

const sizeKb = (file: string) => gzipSync(readFileSync(join(client, file))).length / 1000;

if (entry === undefined) throw new Error('the build has no entry');
for (const page of small)
  if (!pages.includes(page)) throw new Error(`the budget names ${page}, which the build does not have`);

let over = 0;
for (const page of pages) {
  const files = filesOf(page, filesOf(entry, new Set()));
  const kb = [...files].filter((file) => file.endsWith('.js')).reduce((sum, file) => sum + sizeKb(file), 0);
  const budgetKb = small.includes(page) ? smallKb : anyKb;
  if (kb > budgetKb) over += 1;
  process.stdout.write(
    `${kb > budgetKb ? 'OVER' : 'ok  '} ${kb.toFixed(1).padStart(6)} of ${budgetKb} kB  ${page}\n`,
  );
}
process.exit(over === 0 ? 0 : 1);
