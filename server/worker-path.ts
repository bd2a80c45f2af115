import { createRequire } from 'node:module';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { projectRoot } from './project-root.ts';

export interface WorkerStart {
  readonly file: URL;
  readonly execArgv: string[];
}

/**
 * Where a worker thread starts. From the sources (development, tests) its TypeScript needs the loader;
 * the build makes each worker an entry of its own in dist/server, wherever this code's chunk lies.
 */
export function workerStart(source: string, built: string): WorkerStart {
  const here = import.meta.url;
  if (!new URL(here).pathname.endsWith('.ts')) {
    return { file: pathToFileURL(join(projectRoot(), 'dist/server', built)), execArgv: [] };
  }
  return startFromSource(new URL(source, here));
}

/** A worker thread whose file is TypeScript. */
export function startFromSource(file: URL): WorkerStart {
  const loader = createRequire(fileURLToPath(import.meta.url)).resolve('tsx');
  return { file, execArgv: ['--import', pathToFileURL(loader).href] };
}

export const analysisWorker = () => workerStart('./analysis/worker.ts', 'worker.js');
export const searchWorker = () => workerStart('./search/worker.ts', 'search-worker.js');
