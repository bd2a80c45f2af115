import type { FieldProblem } from '../../components/ErrorSummary.tsx';
import type { DrawingState } from './use-drawing.ts';

/** What keeps the drawing from being published, or null. */
export const drawingProblem = (state: DrawingState): FieldProblem | null => {
  const say = (message: string): FieldProblem => ({ path: 'drawing', label: 'Drawing', message });
  switch (state.phase) {
    case 'none':
      return say('Choose the SVG file');
    case 'sending':
      return say('It is still being read: wait a moment');
    case 'refused':
      return say('The file could not be read: mend it, or choose another');
    case 'read':
      if (state.isRescaling) return say('It is being read at the new scale: wait a moment');
      return state.shown.units.confirmed
        ? null
        : {
            path: 'scaleFrom',
            label: 'Scale of the drawing',
            message: 'Choose a reading, or state how wide the drawing is',
          };
  }
};
