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
