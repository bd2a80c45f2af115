import { serveBuiltClient } from './client.ts';
import { firstAdministratorLink } from './features/people/first-administrator.ts';
import { run } from './run.ts';

await run({
  defaultDataDir: '.data/club',
  serveClient: serveBuiltClient,
  async afterListening(deps) {
    const link = await firstAdministratorLink(deps);
    return link === null ? [] : [`Open this link once to become the first administrator: ${link}`];
  },
});
