import type { Request, RequestHandler } from 'express';
import multer from 'multer';
import type { Endpoint } from '#shared/api/endpoint.ts';
import { ProblemError } from './problem.ts';

type UploadKind = NonNullable<Endpoint['multipart']>['file'];

interface UploadRules {
  /** What the part is called in a sentence. */
  readonly called: string;
  readonly mostMb: number;
  /** What to do with a file that is too large. */
  readonly smaller: string;
}

const mb = 1024 * 1024;

/** The greatest files that are read; said on the page before anything is sent. */
const uploadRules: Readonly<Record<UploadKind, UploadRules>> = {
  drawing: {
    called: 'drawing',
    mostMb: 10,
    smaller: 'Save it with fewer points, or split it into several drawings.',
  },
  photo: { called: 'photo', mostMb: 20, smaller: 'Save it smaller, or as JPEG.' },
};

const tooLarge = (kind: UploadKind) =>
  new ProblemError(
    413,
    `${kind}.too-large`,
    `The file is larger than ${uploadRules[kind].mostMb} MB. ${uploadRules[kind].smaller}`,
  );

const brokenForm = (kind: UploadKind) =>
  new ProblemError(
    400,
    'body.broken-form',
    `The form broke off or cannot be read. Send the ${uploadRules[kind].called} again.`,
  );

/** Reads a multipart body with one file in `file`; refuses early when the length already says too much. */
function uploadOfOne(kind: UploadKind): RequestHandler {
  const { called, mostMb } = uploadRules[kind];
  const parse = multer({
    storage: multer.memoryStorage(),
    defParamCharset: 'utf8',
    limits: { fileSize: mostMb * mb, files: 1, fields: 4, fieldSize: 64 * 1024, parts: 6 },
  }).single('file');
  return (request, response, next) => {
    if (!request.is('multipart/form-data')) {
      throw new ProblemError(
        415,
        'body.not-multipart',
        `Send the ${called} as multipart/form-data, in the part “file”.`,
      );
    }
    if (Number(request.get('Content-Length') ?? 0) > mostMb * mb + 256 * 1024) throw tooLarge(kind);
    parse(request, response, (error: unknown) => {
      if (error instanceof multer.MulterError)
        next(error.code === 'LIMIT_FILE_SIZE' ? tooLarge(kind) : error);
      // Nothing but the request is read here, so an error that is no limit is a form that cannot be read.
      else next(error ? brokenForm(kind) : undefined);
    });
  };
}

const readers: Readonly<Record<UploadKind, RequestHandler>> = {
  drawing: uploadOfOne('drawing'),
  photo: uploadOfOne('photo'),
};

/** Reads the multipart body of a call that takes a drawing or a photo. */
export const uploadOf = (kind: UploadKind): RequestHandler => readers[kind];

/** The bytes of the file that came, or a 400 that says what to send. */
export function uploadedFile(request: Request, kind: UploadKind): Buffer {
  const file = request.file;
  if (file !== undefined) return file.buffer;
  const what = kind === 'drawing' ? 'an SVG file' : 'a photo';
  throw new ProblemError(400, `${kind}.missing`, `Send ${what} in the part “file”.`);
}

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
  const bytes = uploadedFile(request, 'drawing');
  const other = otherTypes.find(({ starts }) => starts.every((byte, place) => bytes[place] === byte));
  if (other !== undefined) {
    throw new ProblemError(
      415,
      'drawing.wrong-type',
      `This is ${other.name}, not an SVG drawing. Export it as plain SVG and share that.`,
    );
  }
  return bytes;
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
