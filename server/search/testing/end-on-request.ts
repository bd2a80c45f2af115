import { parentPort } from 'node:worker_threads';
import type { NumberedCall } from '#server/search/messages.ts';

parentPort?.on('message', ({ call }: NumberedCall) => {
  if (call.kind === 'search' && call.query.q === 'end the worker') process.exit(3);
});
