import { analysisWorker } from '#server/worker-path.ts';
import { DRAWING_LIMITS } from '#shared/drawing/limits.ts';
import { JobWorker } from './job-worker.ts';
import { tooMuchMemory, tooSlow } from './limit-refusals.ts';
import type { AnalysisResult, ReadOptions } from './result.ts';

export type { AnalysisResult, ReadDrawing, ReadOptions } from './result.ts';

/** Reads drawings off the event loop, one at a time, within limits of time and memory. */
export interface Analysis {
  /** Throws AnalysisBusy when the queue is full. */
  inspect(svgBytes: Buffer, options: ReadOptions): Promise<AnalysisResult>;
  close(): Promise<void>;
}

/** As many drawings wait as may: try again soon. */
export class AnalysisBusy extends Error {
  constructor() {
    super('Many drawings are being read just now. Try again in a few seconds.');
  }
}

export interface AnalysisLimits {
  /** Drawings that may wait beside the one being read. */
  readonly maxQueue?: number;
  readonly timeoutMs?: number;
  readonly memoryMb?: number;
  /** Another worker than the server's own, for tests. */
  readonly start?: URL;
}

const closedError = () => new Error('The server is stopping: no more drawings are read');

interface Job {
  readonly bytes: Buffer;
  readonly options: ReadOptions;
  readonly resolve: (result: AnalysisResult) => void;
  readonly reject: (error: Error) => void;
}

/** One worker thread, started with the first drawing and replaced whenever it had to be ended. */
export function createAnalysis({
  maxQueue = 16,
  timeoutMs = DRAWING_LIMITS.timeS * 1000,
  memoryMb = DRAWING_LIMITS.memoryMb,
  start = analysisWorker(),
}: AnalysisLimits = {}): Analysis {
  const queue: Job[] = [];
  let worker: JobWorker | null = null;
  let busy = false;
  let closed = false;

  async function drain(): Promise<void> {
    busy = true;
    for (let job = queue.shift(); job !== undefined; job = queue.shift()) {
      try {
        job.resolve(await run(job));
      } catch (error) {
        job.reject(error instanceof Error ? error : new Error(String(error)));
      }
    }
    busy = false;
  }

  async function run(job: Job): Promise<AnalysisResult> {
    if (worker === null || worker.hasEnded) worker = new JobWorker(start, memoryMb);
    const outcome = await worker.read(job.bytes, job.options, timeoutMs);
    if (outcome.kind === 'result') return outcome.result;
    await worker?.end();
    worker = null;
    if (outcome.kind === 'too-slow') return { ok: false, refusal: tooSlow(timeoutMs) };
    if (outcome.kind === 'out-of-memory') return { ok: false, refusal: tooMuchMemory(memoryMb) };
    throw closed ? closedError() : outcome.error;
  }

  return {
    inspect(bytes, options) {
      if (closed) return Promise.reject(closedError());
      if (busy && queue.length >= maxQueue) return Promise.reject(new AnalysisBusy());
      return new Promise((resolve, reject) => {
        queue.push({ bytes, options, resolve, reject });
        if (!busy) void drain();
      });
    },
    async close() {
      closed = true;
      for (const job of queue.splice(0)) job.reject(closedError());
      await worker?.end();
      worker = null;
    },
  };
}
