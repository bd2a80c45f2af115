import { benchEndpoints } from './endpoints/bench.ts';
import { cutsEndpoints } from './endpoints/cuts.ts';
import { designsEndpoints } from './endpoints/designs.ts';
import { peopleEndpoints } from './endpoints/people.ts';
import { reviewEndpoints } from './endpoints/review.ts';
import { systemEndpoints } from './endpoints/system.ts';

/** Every call of the contract that this version answers. */
export const endpoints = {
  ...systemEndpoints,
  ...peopleEndpoints,
  ...benchEndpoints,
  ...designsEndpoints,
  ...cutsEndpoints,
  ...reviewEndpoints,
};
