import { createHash } from 'node:crypto';
import { v7 } from 'uuid';
import type { Clock, IdSource } from '#server/clock.ts';

/** A clock that the seeding sets to the date of each event. */
export interface SetClock extends Clock {
  set(now: Date): void;
}

export function setClock(start: Date): SetClock {
  let current = start;
  return {
    now: () => current,
    set: (now) => {
      current = now;
    },
  };
}

/** UUIDv7 from the seeding's clock and a counter: the same demo has the same ids. */
export function seededIds(clock: Clock): IdSource {
  let count = 0;
  return {
    next: () => {
      count += 1;
      const random = createHash('sha256').update(`millrace ${count}`).digest().subarray(0, 16);
      return v7({ msecs: clock.now().getTime(), seq: count, random });
    },
  };
}
