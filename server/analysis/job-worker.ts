import { Worker } from 'node:worker_threads';
import type { ReadRequest, WorkerReport } from './messages.ts';
import type { AnalysisResult, ReadOptions } from './result.ts';

export type JobOutcome =
  | { readonly kind: 'result'; readonly result: AnalysisResult }
  | { readonly kind: 'too-slow' }
  | { readonly kind: 'out-of-memory' }
  | { readonly kind: 'crashed'; readonly error: Error };

/** A worker thread that reads one drawing at a time. Every outcome but a result means: end it. */
export class JobWorker {
  readonly #worker: Worker;
  readonly #ready: Promise<void>;
  #markReady: () => void = () => {};
  #settle: (outcome: JobOutcome) => void = () => {};
  #ended: JobOutcome | null = null;

  constructor(file: URL, memoryMb: number) {
    this.#ready = new Promise((resolve) => {
      this.#markReady = resolve;
    });
    this.#worker = new Worker(file, { execArgv: [], resourceLimits: { maxOldGenerationSizeMb: memoryMb } });
    this.#worker.on('message', (report: WorkerReport) => {
      if (report.kind === 'ready') this.#markReady();
      else this.#settle({ kind: 'result', result: report.result });
    });
    this.#worker.on('error', (error: Error & { code?: string }) =>
      this.#over(
        error.code === 'ERR_WORKER_OUT_OF_MEMORY' ? { kind: 'out-of-memory' } : { kind: 'crashed', error },
      ),
    );
    this.#worker.on('exit', (code) =>
      this.#over({
        kind: 'crashed',
        error: new Error(`The worker that reads drawings ended with code ${code}`),
      }),
    );
    // An idle worker must not keep the process alive.
    this.#worker.unref();
  }

  get hasEnded(): boolean {
    return this.#ended !== null;
  }

  /** The time runs from when the worker has loaded, so that the first drawing is not short of it. */
  async read(bytes: Buffer, options: ReadOptions, timeoutMs: number): Promise<JobOutcome> {
    if (this.#ended !== null) return this.#ended;
    let timer: NodeJS.Timeout | undefined;
    const outcome = new Promise<JobOutcome>((resolve) => {
      this.#settle = resolve;
    });
    this.#worker.ref();
    void this.#ready.then(() => {
      if (this.#ended !== null) return;
      timer = setTimeout(() => this.#settle({ kind: 'too-slow' }), timeoutMs);
      // Copied, because a pooled Buffer would send along the whole pool that it lies in.
      const copy = new Uint8Array(bytes);
      const request: ReadRequest = { bytes: copy, options };
      this.#worker.postMessage(request, [copy.buffer]);
    });
    try {
      return await outcome;
    } finally {
      clearTimeout(timer);
      this.#worker.unref();
    }
  }

  async end(): Promise<void> {
    await this.#worker.terminate();
  }

  #over(outcome: JobOutcome): void {
    this.#ended ??= outcome;
    this.#settle(this.#ended);
  }
}
