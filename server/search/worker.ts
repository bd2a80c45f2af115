import { parentPort } from 'node:worker_threads';
import { answerCall } from './answer-call.ts';
import { BadCursor } from './document.ts';
import { SearchIndex } from './index.ts';
import type { NumberedCall, SearchReply } from './messages.ts';

const port = parentPort;
if (port === null) throw new Error('worker.ts runs only as a worker thread');
const index = new SearchIndex();

port.on('message', ({ number, call }: NumberedCall) => {
  port.postMessage(reply(number, () => answerCall(index, call)));
});

function reply(number: number, answer: () => ReturnType<typeof answerCall>): SearchReply {
  try {
    return { kind: 'done', number, answer: answer() };
  } catch (error) {
    if (error instanceof BadCursor) return { kind: 'bad-cursor', number };
    return { kind: 'failed', number, message: error instanceof Error ? error.message : String(error) };
  }
}
