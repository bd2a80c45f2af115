import { existsSync } from 'node:fs';
import { join } from 'node:path';
import express, { type Express } from 'express';
import { projectRoot } from './project-root.ts';

/** Serves the built client: hashed files for ever, the page itself always fresh. */
export function serveBuiltClient(app: Express): void {
  const folder = join(projectRoot(), 'dist/client');
  const page = join(folder, 'index.html');
  if (!existsSync(page)) throw new Error('The client is not built: run npm run build first.');
  app.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', fallthrough: false }),
  );
  app.use(express.static(folder, { index: false, maxAge: '1h' }));
  app.get('/{*path}', (_request, response) => {
    response.set('Cache-Control', 'no-cache').sendFile(page);
  });
}
