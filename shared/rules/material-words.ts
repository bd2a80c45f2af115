import type { MaterialFamily } from '../api/vocabulary.ts';

/** Families as a sentence names them. */
export const materialWords: Readonly<Record<MaterialFamily, string>> = {
  softwood: 'softwood',
  hardwood: 'hardwood',
  plywood: 'plywood',
  mdf: 'MDF',
  acrylic: 'acrylic',
  'soft-plastic': 'soft plastic',
  aluminium: 'aluminium',
};
