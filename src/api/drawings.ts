import type { Inspection } from '#shared/api/drawings.ts';
import { upload } from './upload.ts';

interface Inspect {
  readonly file: File;
  /** The scale the member stated, when the file does not say. */
  readonly millimetresPerUnit?: number | undefined;
  readonly onProgress?: (share: number) => void;
  readonly signal?: AbortSignal;
}

/** Reads a drawing without saving it. */
export const inspectDrawing = ({ file, millimetresPerUnit, ...rest }: Inspect): Promise<Inspection> =>
  upload<Inspection>('/api/drawings/inspect', {
    file,
    fileName: file.name,
    ...(millimetresPerUnit === undefined
      ? {}
      : { parts: { millimetresPerUnit: JSON.stringify(millimetresPerUnit) } }),
    ...rest,
  });
