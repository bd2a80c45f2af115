import type { FieldProblem } from '../../components/ErrorSummary.tsx';
import type { DrawingState } from './use-drawing.ts';

/**
 * What keeps the drawing from being published, or null. What is published must be what was shown: a
 * stated scale counts only once the drawing was read at it.
 */
export const drawingProblem = (state: DrawingState, statedScale: number | undefined): FieldProblem | null => {
  const say = (message: string): FieldProblem => ({ path: 'drawing', label: 'Drawing', message });
  const scale = (message: string): FieldProblem => ({
    path: 'scaleFrom',
    label: 'Scale of the drawing',
    message,
  });
  switch (state.phase) {
    case 'none':
      return say('Choose the SVG file');
    case 'sending':
      return say('It is still being read: wait a moment');
    case 'refused':
      return say('The file could not be read: mend it, or choose another');
    case 'read':
      if (state.isRescaling) return say('It is being read at the new scale: wait a moment');
      if (state.asFiled.units.confirmed) return null;
      if (statedScale === undefined) {
        return scale('Choose a reading, or state how wide the drawing is');
      }
      return state.shownScale === statedScale ? null : scale('It was not read at this scale: try again');
  }
};
