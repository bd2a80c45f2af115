import { designsOf2025 } from './designs-2025.ts';
import { designsOfAutumn2026 } from './designs-2026-autumn.ts';
import { designsOfSpring2026 } from './designs-2026-spring.ts';
import type { SeedDesign } from './types.ts';

/** Every design of the demo club in the order it was published; its file is the sheet of the same key. */
export const designs: readonly SeedDesign[] = [
  ...designsOf2025,
  ...designsOfSpring2026,
  ...designsOfAutumn2026,
];
