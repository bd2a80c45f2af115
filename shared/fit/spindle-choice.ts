import type { Spindle } from '#shared/api/bench.ts';

export interface SpindleChoice {
  /** The speed to run, in rev/min. */
  readonly rpm: number;
  /** Number of the dial position, from 1, on a machine with a dial. */
  readonly dialPosition?: number;
}

/**
 * The speed a spindle can run nearest to the wanted one, no faster than the bit's mark allows; null
 * when even its slowest speed is over the mark.
 */
export const nearestSpeed = (
  spindle: Spindle,
  wantedRpm: number,
  bitMaxRpm: number | undefined,
): SpindleChoice | null => {
  const markRpm = bitMaxRpm ?? Number.POSITIVE_INFINITY;
  if (spindle.kind === 'range') {
    if (spindle.minRpm > markRpm) return null;
    return { rpm: Math.min(Math.max(wantedRpm, spindle.minRpm), spindle.maxRpm, markRpm) };
  }
  let nearest: SpindleChoice | null = null;
  for (const [at, rpm] of spindle.positionsRpm.entries()) {
    if (rpm > markRpm) continue;
    const off = Math.abs(rpm - wantedRpm);
    const best = nearest === null ? Number.POSITIVE_INFINITY : Math.abs(nearest.rpm - wantedRpm);
    // Of two equally near, the slower is the safer start.
    if (off < best || (off === best && nearest !== null && rpm < nearest.rpm)) {
      nearest = { rpm, dialPosition: at + 1 };
    }
  }
  return nearest;
};

/** The slowest speed of a spindle, in rev/min. */
export const slowestRpm = (spindle: Spindle): number =>
  spindle.kind === 'range' ? spindle.minRpm : Math.min(...spindle.positionsRpm);
