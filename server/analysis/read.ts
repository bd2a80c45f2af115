import { writeCleanSvg } from '#shared/drawing/clean-svg.ts';
import { geometryText } from '#shared/drawing/geometry-text.ts';
import { readDrawing } from '#shared/drawing/read.ts';
import { simplifiedOutline } from '#shared/drawing/simplified-outline.ts';
import type { Drawing } from '#shared/drawing/types.ts';
import { fileText } from './file-text.ts';
import { toInspection } from './inspection.ts';
import type { AnalysisResult, ReadDrawing, ReadOptions } from './result.ts';

const outlineBytes = 4096;

/** Reads an uploaded file in the calling thread; nothing is kept of its markup. */
export function readBytes(bytes: Uint8Array, { title, millimetresPerUnit }: ReadOptions): AnalysisResult {
  const file = fileText(bytes);
  if (!file.ok) return file;
  const result = readDrawing(file.text, millimetresPerUnit === undefined ? {} : { millimetresPerUnit });
  if (!result.ok) return result;
  return { ok: true, read: workOut(result.drawing, title ?? 'Drawing') };
}

function workOut(drawing: Drawing, title: string): ReadDrawing {
  const { minX, maxY } = drawing.boundsMm;
  return {
    inspection: toInspection(drawing),
    outline: simplifiedOutline(drawing, outlineBytes),
    // The corner nearest the operator, at the left: y runs down on the page.
    cleanSvg: writeCleanSvg(drawing, { title, originMark: { x: minX, y: maxY } }),
    geometryText: geometryText(drawing),
  };
}
