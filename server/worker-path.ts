import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { projectRoot } from './project-root.ts';

/**
 * Where a worker thread starts. From the sources (development, tests) its TypeScript needs the loader;
 * the build makes each worker an entry of its own in dist/server, wherever this code's chunk lies.
 */
export function workerStart(source: string, built: string): URL {
  const here = import.meta.url;
  if (!new URL(here).pathname.endsWith('.ts')) {
    return pathToFileURL(join(projectRoot(), 'dist/server', built));
  }
  return startFromSource(new URL(source, here));
}

/** A worker thread whose file is TypeScript: a first module registers the loader, then imports it. */
export function startFromSource(file: URL): URL {
  const loader = new URL('./read-typescript.mjs', import.meta.url);
  const lines = `import ${JSON.stringify(loader.href)};await import(${JSON.stringify(file.href)});`;
  return new URL(`data:text/javascript,${encodeURIComponent(lines)}`);
}

export const analysisWorker = () => workerStart('./analysis/worker.ts', 'worker.js');
export const searchWorker = () => workerStart('./search/worker.ts', 'search-worker.js');
