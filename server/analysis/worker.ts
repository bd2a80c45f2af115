import { parentPort } from 'node:worker_threads';
import type { ReadRequest, WorkerReport } from './messages.ts';
import { readBytes } from './read.ts';

const port = parentPort;
if (port === null) throw new Error('worker.ts runs only as a worker thread');
const report = (message: WorkerReport) => port.postMessage(message);

port.on('message', ({ bytes, options }: ReadRequest) => {
  report({ kind: 'result', result: readBytes(bytes, options) });
});
report({ kind: 'ready' });
