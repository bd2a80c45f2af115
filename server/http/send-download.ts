import type { Request, Response } from 'express';
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
  const range = rangeOf(response.req, bytes.length);
  if (range === 'outside') {
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
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  if (range === 'whole') {
    response.send(buffer);
    return;
  }
  response.status(206).set('Content-Range', `bytes ${range.start}-${range.end}/${bytes.length}`);
  response.send(buffer.subarray(range.start, range.end + 1));
}

/** The one range of bytes asked for; several, or other units, get the whole file (RFC 9110, 14.2). */
function rangeOf(request: Request, sizeBytes: number): { start: number; end: number } | 'whole' | 'outside' {
  const ranges = request.range(sizeBytes);
  if (ranges === -1) return 'outside';
  if (!Array.isArray(ranges) || ranges.type !== 'bytes') return 'whole';
  const [range] = ranges;
  return range === undefined || ranges.length > 1 ? 'whole' : range;
}

/**
 * Whether an answer carries the file from its beginning: not when only its size is asked for, and not when a
 * broken download goes on from further in.
 */
export function sendsFirstByte(request: Request, sizeBytes: number): boolean {
  if (request.method === 'HEAD') return false;
  const range = rangeOf(request, sizeBytes);
  return range === 'whole' || (range !== 'outside' && range.start === 0);
}
