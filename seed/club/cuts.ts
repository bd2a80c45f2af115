import { cutsOf2025 } from './cuts-2025.ts';
import { cutsOfAutumn2026 } from './cuts-2026-autumn.ts';
import { cutsOfSpring2026 } from './cuts-2026-spring.ts';
import type { SeedCut } from './types.ts';

/** Cut records that came after each design's first cut, oldest first. */
export const cuts: readonly SeedCut[] = [...cutsOf2025, ...cutsOfSpring2026, ...cutsOfAutumn2026];
