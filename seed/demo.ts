import { serveBuiltClient } from '#server/client.ts';
import { user } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { run, StartRefused } from '#server/run.ts';
import { clubName, demoPassword, members } from './club/people.ts';
import { clearHalfSeeded, markSeeded, readDemoFolder } from './folder.ts';
import { seedClub } from './seed-club.ts';
import { seedEvents } from './seed-events.ts';
import { seededIds, setClock } from './seeded-ids.ts';

let dataDir = '';
let toBeSeeded = false;

await run({
  defaultDataDir: '.data/demo',
  serveClient: serveBuiltClient,
  check(config) {
    dataDir = config.dataDir;
    toBeSeeded = readDemoFolder(dataDir) === 'to be seeded';
  },
  afterLock: () => {
    if (toBeSeeded) clearHalfSeeded(dataDir);
  },
  async beforeServing(deps) {
    if (toBeSeeded) await seed(deps);
  },
  async afterListening() {
    const signIns = members.slice(0, 4).map(({ email, role }) => `  ${email}  (${role})`);
    return [`Sign in as one of the ${clubName}:`, ...signIns, `  password: ${demoPassword}`];
  },
});

async function seed(deps: Deps): Promise<void> {
  if ((await deps.database.db.$count(user)) > 0) {
    throw new StartRefused('The database at DATABASE_URL already has members: the demo needs an empty one.');
  }
  const clock = setClock(deps.clock.now());
  const seeding = { ...deps, clock, ids: seededIds(clock) };
  const club = await seedClub(seeding, clock);
  await seedEvents(seeding, clock, club);
  markSeeded(dataDir);
}
