import { Resvg } from '@resvg/resvg-js';
import { parseSync } from 'svgson';
import { readDrawing } from '#shared/drawing/read.ts';
import { bigDrawing } from './big-drawing.ts';
import { median, type Row, timesMs } from './measure.ts';

const boxWithResvg = (svg: string) => new Resvg(svg, { font: { loadSystemFonts: false } }).getBBox();

/** Reading and boxing a drawing, beside resvg parsing the same text and svgson building its tree. */
export async function drawingRows(): Promise<Row[]> {
  const { svg } = bigDrawing(1_000_000);
  const read = readDrawing(svg);
  if (!read.ok) throw new Error(read.refusal.message);
  const resvgMs = median(await timesMs(() => boxWithResvg(svg), 9));
  const svgsonMs = median(await timesMs(() => parseSync(svg), 9));
  const wholeMs = median(await timesMs(() => readDrawing(svg), 9));

  const limitBytes = 4_000_000;
  const large = bigDrawing(limitBytes).svg;
  const largeRead = readDrawing(large);
  if (!largeRead.ok) throw new Error(largeRead.refusal.message);
  const largeMs = median(await timesMs(() => readDrawing(large), 3, 1));
  const segments = read.drawing.segmentCount;
  return [
    row(
      `read and bound 1 MB (${segments} segments), whole`,
      wholeMs / resvgMs,
      `resvg ${resvgMs.toFixed(1)} ms, ours ${wholeMs.toFixed(1)} ms, svgson alone ${svgsonMs.toFixed(1)} ms`,
      14,
    ),
    row(
      'the same, 4 MB (near the limit of segments)',
      largeMs / wholeMs,
      `1 MB ${wholeMs.toFixed(1)} ms, 4 MB ${largeMs.toFixed(1)} ms`,
      8,
    ),
  ];
}

const row = (name: string, ratio: number, against: string, limit: number): Row => ({
  name,
  value: ratio,
  unit: '×',
  against,
  limit,
  reached: ratio <= limit,
});
