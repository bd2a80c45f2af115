import type { Response } from 'express';
import { ProblemError } from './problem.ts';

/**
 * Sends bytes as an attachment that no browser opens or runs. One Range is honoured, so that a broken
 * download can go on where it stopped.
 */
export function sendDownload(
  response: Response,
  bytes: Uint8Array,
  fileName: string,
  contentType: string,
): void {
  const ranges = response.req.range(bytes.length);
  if (ranges === -1) {
    response.set('Content-Range', `bytes */${bytes.length}`);
    throw new ProblemError(416, 'range.outside', `The file has ${bytes.length} bytes; none were asked for.`);
  }
  response.set({
    'Content-Type': contentType,
    'Content-Disposition': `attachment; filename="${fileName}"`,
    'Content-Security-Policy': "default-src 'none'; sandbox",
    'X-Content-Type-Options': 'nosniff',
    'Cache-Control': 'no-store',
    'Accept-Ranges': 'bytes',
  });
  const range = Array.isArray(ranges) && ranges.length === 1 ? ranges[0] : undefined;
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  if (range === undefined) {
    response.send(buffer);
    return;
  }
  response.status(206).set('Content-Range', `bytes ${range.start}-${range.end}/${bytes.length}`);
  response.send(buffer.subarray(range.start, range.end + 1));
}
