import { parentPort } from 'node:worker_threads';
import type { NumberedCall } from '#server/search/messages.ts';
import '#server/search/worker.ts';

// The worker of the search's tests: the server's own, but a search for these words ends it.
parentPort?.prependListener('message', ({ call }: NumberedCall) => {
  if (call.kind === 'search' && call.query.q === 'end the worker') process.exit(3);
});
