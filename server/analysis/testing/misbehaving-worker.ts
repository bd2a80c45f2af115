import { parentPort } from 'node:worker_threads';
import type { ReadRequest, WorkerReport } from '#server/analysis/messages.ts';
import { readBytes } from '#server/analysis/read.ts';

// The worker of the pool's tests: it reads drawings like the server's own, but the title can ask for trouble.
const port = parentPort;
if (port === null) throw new Error('misbehaving-worker.ts runs only as a worker thread');
const report = (message: WorkerReport) => port.postMessage(message);

const trouble: Record<string, () => void> = {
  'never end': () => {
    for (;;);
  },
  'eat memory': () => {
    for (const eaten: number[][] = []; ; ) eaten.push(new Array(10_000).fill(eaten.length + 0.5));
  },
  crash: () => {
    throw new Error('the worker crashed on purpose');
  },
  exit: () => {
    process.exit(3);
  },
};

port.on('message', ({ bytes, options }: ReadRequest) => {
  trouble[options.title ?? '']?.();
  report({ kind: 'result', result: readBytes(bytes, options) });
});
report({ kind: 'ready' });
