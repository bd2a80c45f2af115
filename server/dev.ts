import { createServer } from 'vite';
import { firstAdministratorLink } from './features/people/first-administrator.ts';
import { projectRoot } from './project-root.ts';
import { run } from './run.ts';

await run({
  defaultDataDir: '.data/dev',
  async serveClient(app, server) {
    const vite = await createServer({
      root: projectRoot(),
      appType: 'spa',
      server: { middlewareMode: true, hmr: { server } },
    });
    app.use(vite.middlewares);
  },
  async afterListening(deps) {
    const link = await firstAdministratorLink(deps);
    return link === null ? [] : [`Open this link once to become the first administrator: ${link}`];
  },
});
