import type { DrawingRefusal } from '#shared/drawing/types.ts';

export const tooSlow = (timeoutMs: number): DrawingRefusal => ({
  code: 'too-slow',
  message: `The drawing took longer to read than the limit of ${timeoutMs / 1000} s. Simplify the paths or split the drawing.`,
});

export const tooMuchMemory = (memoryMb: number): DrawingRefusal => ({
  code: 'too-much-memory',
  message: `The drawing needs more memory to read than the limit of ${memoryMb} MB. Simplify the paths or split the drawing.`,
});
