import type { Request, RequestHandler } from 'express';
import multer from 'multer';
import { ProblemError } from './problem.ts';

/** The greatest drawing that is read; said on the page before anything is sent. */
export const maxUploadBytes = 10 * 1024 * 1024;

const parse = multer({
  storage: multer.memoryStorage(),
  defParamCharset: 'utf8',
  limits: { fileSize: maxUploadBytes, files: 1, fields: 4, fieldSize: 64 * 1024, parts: 6 },
}).single('file');

const brokenForm = () =>
  new ProblemError(400, 'body.broken-form', 'The form broke off or cannot be read. Send the drawing again.');

/** Reads a multipart body with one drawing in `file`; refuses early when the length already says too much. */
export const uploadOfOneDrawing: RequestHandler = (request, response, next) => {
  if (!request.is('multipart/form-data')) {
    throw new ProblemError(
      415,
      'body.not-multipart',
      'Send the drawing as multipart/form-data, in the part “file”.',
    );
  }
  if (Number(request.get('Content-Length') ?? 0) > maxUploadBytes + 256 * 1024) {
    throw new ProblemError(
      413,
      'drawing.too-large',
      'The file is larger than 10 MB. Save it with fewer points, or split it into several drawings.',
      {},
    );
  }
  parse(request, response, (error: unknown) => {
    // Nothing but the request is read here, so an error that is no limit is a form that cannot be read.
    if (error && !(error instanceof multer.MulterError)) next(brokenForm());
    else next(error);
  });
};

/** First bytes of the files that are most often picked by mistake. */
const otherTypes: { name: string; starts: number[] }[] = [
  { name: 'a PNG picture', starts: [0x89, 0x50, 0x4e, 0x47] },
  { name: 'a JPEG picture', starts: [0xff, 0xd8, 0xff] },
  { name: 'a GIF picture', starts: [0x47, 0x49, 0x46, 0x38] },
  { name: 'a PDF', starts: [0x25, 0x50, 0x44, 0x46] },
  { name: 'a zip archive', starts: [0x50, 0x4b, 0x03, 0x04] },
  { name: 'a compressed SVG (svgz)', starts: [0x1f, 0x8b] },
];

/** The drawing of the request, or a 4xx that says what came instead. */
export function uploadedDrawing(request: Request): Buffer {
  const file = request.file;
  if (file === undefined)
    throw new ProblemError(400, 'drawing.missing', 'Send an SVG file in the part “file”.');
  const other = otherTypes.find(({ starts }) => starts.every((byte, place) => file.buffer[place] === byte));
  if (other !== undefined) {
    throw new ProblemError(
      415,
      'drawing.wrong-type',
      `This is ${other.name}, not an SVG drawing. Export it as plain SVG and share that.`,
    );
  }
  return file.buffer;
}

/** A text part that carries JSON. */
export function jsonPart(request: Request, name: string): unknown {
  const text = (request.body as Record<string, unknown> | undefined)?.[name];
  if (text === undefined) return undefined;
  try {
    return JSON.parse(String(text)) as unknown;
  } catch {
    throw new ProblemError(400, 'body.not-json', `The part “${name}” is not valid JSON.`);
  }
}
