import type { AnalysisResult, ReadOptions } from './result.ts';

export interface ReadRequest {
  readonly bytes: Uint8Array;
  readonly options: ReadOptions;
}

/** 'ready' comes once, when the worker has loaded: only then does a drawing's time begin to run. */
export type WorkerReport =
  | { readonly kind: 'ready' }
  | { readonly kind: 'result'; readonly result: AnalysisResult };
