/** One row of the table: what was measured, against what, and what it must reach. */
export interface Row {
  name: string;
  value: number;
  unit: string;
  /** The comparison of the same run, and the greatest ratio or value allowed. */
  against: string;
  limit: number;
  reached: boolean;
}

/** Times in ms of `runs` calls after `warmUps` that do not count, sorted. */
export async function timesMs(work: () => unknown, runs: number, warmUps = 3): Promise<number[]> {
  for (let run = 0; run < warmUps; run += 1) await work();
  const times: number[] = [];
  for (let run = 0; run < runs; run += 1) {
    const startedMs = performance.now();
    await work();
    times.push(performance.now() - startedMs);
  }
  return times.sort((a, b) => a - b);
}

/** The value below which `share` of the sorted times lie. */
export const percentile = (sorted: readonly number[], share: number): number =>
  sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? Number.NaN;

export const median = (sorted: readonly number[]): number => percentile(sorted, 0.5);
