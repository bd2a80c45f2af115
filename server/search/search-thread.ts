import { Worker } from 'node:worker_threads';
import { searchWorker } from '#server/worker-path.ts';
import { BadCursor, type SearchAnswer, type SearchDocument } from './document.ts';
import type { NumberedCall, SearchCall, SearchReply } from './messages.ts';

export interface SearchThreadOptions {
  /** Every document afresh, asked for when a crashed worker was replaced. */
  readonly load: () => Promise<readonly SearchDocument[]>;
  /** Another worker than the server's own, for tests. */
  readonly start?: URL;
}

interface Waiting {
  readonly call: SearchCall;
  readonly resolve: (answer: SearchAnswer | null) => void;
  readonly reject: (error: Error) => void;
  /** A call that was under way in two crashes is not tried again: it may be their cause. */
  crashes: number;
}

/** What the first message to a replaced worker is numbered: nobody waits for it. */
const refill = 0;

/** The worker thread that holds the index: numbers the calls, and replaces and refills it after a crash. */
export class SearchThread {
  readonly #load: SearchThreadOptions['load'];
  readonly #start: URL;
  /** In the order of asking: the first is the one that the worker is at. */
  readonly #waiting = new Map<number, Waiting>();
  /** Null after a crash, until the next call needs one. */
  #worker: Worker | null;
  #nextNumber = refill + 1;
  #refilling = false;
  #closed = false;

  constructor({ load, start = searchWorker() }: SearchThreadOptions) {
    this.#load = load;
    this.#start = start;
    this.#worker = this.#open();
    this.#worker.unref();
  }

  call(call: SearchCall): Promise<SearchAnswer | null> {
    if (this.#closed) return Promise.reject(closedError());
    return new Promise((resolve, reject) => {
      const number = this.#nextNumber++;
      this.#waiting.set(number, { call, resolve, reject, crashes: 0 });
      if (this.#worker !== null) this.#send(this.#worker, number, call);
      else void this.#replace();
    });
  }

  async close(): Promise<void> {
    this.#closed = true;
    this.#rejectAll(closedError());
    await this.#worker?.terminate();
  }

  #open(): Worker {
    const worker = new Worker(this.#start, { execArgv: [] });
    let cause = new Error('The search worker ended');
    worker.on('error', (error: Error) => {
      cause = error;
    });
    worker.on('message', (reply: SearchReply) => this.#settle(worker, reply));
    worker.on('exit', () => this.#afterCrash(cause));
    return worker;
  }

  #afterCrash(cause: Error): void {
    this.#worker = null;
    const [atWork] = this.#waiting;
    if (this.#closed || atWork === undefined) return;
    const [number, waiting] = atWork;
    waiting.crashes++;
    if (waiting.crashes > 1) {
      this.#waiting.delete(number);
      waiting.reject(cause);
    }
    if (this.#waiting.size > 0) void this.#replace();
  }

  /** A new worker gets every document first, then the calls that are still open, in their order. */
  async #replace(): Promise<void> {
    if (this.#refilling) return;
    this.#refilling = true;
    try {
      const documents = await this.#load();
      if (this.#closed) return;
      const worker = this.#open();
      this.#worker = worker;
      this.#send(worker, refill, { kind: 'replaceAll', documents });
      for (const [number, { call }] of this.#waiting) this.#send(worker, number, call);
    } catch (error) {
      this.#rejectAll(error instanceof Error ? error : new Error(String(error)));
    } finally {
      this.#refilling = false;
    }
  }

  #send(worker: Worker, number: number, call: SearchCall): void {
    // Only a worker that is waited for keeps the process alive.
    worker.ref();
    const message: NumberedCall = { number, call };
    worker.postMessage(message);
  }

  #settle(worker: Worker, reply: SearchReply): void {
    if (reply.number === refill) {
      if (reply.kind !== 'failed') return;
      this.#rejectAll(new Error(`The search index could not be refilled: ${reply.message}`));
      void worker.terminate();
      return;
    }
    const waiting = this.#waiting.get(reply.number);
    this.#waiting.delete(reply.number);
    if (this.#waiting.size === 0) worker.unref();
    if (reply.kind === 'done') waiting?.resolve(reply.answer);
    else if (reply.kind === 'bad-cursor') waiting?.reject(new BadCursor());
    else waiting?.reject(new Error(reply.message));
  }

  #rejectAll(error: Error): void {
    for (const { reject } of this.#waiting.values()) reject(error);
    this.#waiting.clear();
  }
}

const closedError = () => new Error('The server is stopping: no more searches are answered');
