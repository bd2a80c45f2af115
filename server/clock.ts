import { v7 } from 'uuid';

/** Time and ids are passed in, so that the demo and the tests decide them. */
export interface Clock {
  now(): Date;
}

export interface IdSource {
  next(): string;
}

export const systemClock: Clock = { now: () => new Date() };
export const uuidV7: IdSource = { next: () => v7() };
