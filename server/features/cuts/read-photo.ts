import sharp from 'sharp';
import { ProblemError } from '#server/http/problem.ts';

/** More than any camera of a phone that is not for print; less than a picture made to fill the memory. */
const mostPixels = 64_000_000;
const longSidePx = 2048;
const mostSeconds = 20;

/** First bytes of the kinds of picture that are read: nothing else reaches a decoder. */
const kinds: { starts: (bytes: Buffer) => boolean }[] = [
  { starts: (bytes) => bytes.subarray(0, 3).equals(Buffer.from([0xff, 0xd8, 0xff])) },
  { starts: (bytes) => bytes.subarray(0, 8).equals(Buffer.from('\x89PNG\r\n\x1a\n', 'latin1')) },
  {
    starts: (bytes) =>
      bytes.toString('latin1', 0, 4) === 'RIFF' && bytes.toString('latin1', 8, 12) === 'WEBP',
  },
];
/** ISO base media files say at byte 4 that they are one; phones keep HEIC and AVIF pictures in them. */
const isHeif = (bytes: Buffer) => /^ftyp(hei|hev|mif|msf|avi)/.test(bytes.toString('latin1', 4, 12));

const notAPhoto = (bytes: Buffer) =>
  new ProblemError(
    415,
    'photo.wrong-type',
    isHeif(bytes)
      ? 'This is a HEIC or AVIF picture, which is not read here. Set the camera to JPEG (“most compatible”), or export it as JPEG.'
      : 'This is not a photo that is read here. Send a JPEG, PNG or WebP picture.',
  );

const broken = () =>
  new ProblemError(
    422,
    'photo.broken',
    'This photo breaks off or cannot be decoded. Save it again as JPEG, and send that.',
  );

export interface ReadPhoto {
  /** WebP without any metadata: no place, time or camera. */
  webp: Buffer;
  widthPx: number;
  heightPx: number;
}

/** Decodes a photo, turns it upright, makes it small enough for a page and leaves out everything but the picture. */
export async function readPhoto(bytes: Buffer): Promise<ReadPhoto> {
  if (!kinds.some(({ starts }) => starts(bytes))) throw notAPhoto(bytes);
  await refuseTooManyPixels(bytes);
  try {
    const { data, info } = await sharp(bytes, { limitInputPixels: mostPixels, failOn: 'error' })
      .timeout({ seconds: mostSeconds })
      .autoOrient()
      .resize({ width: longSidePx, height: longSidePx, fit: 'inside', withoutEnlargement: true })
      .webp({ quality: 80 })
      .toBuffer({ resolveWithObject: true });
    return { webp: data, widthPx: info.width, heightPx: info.height };
  } catch {
    throw broken();
  }
}

/** A small file can say that it is a huge picture: its header is read before anything is unpacked. */
async function refuseTooManyPixels(bytes: Buffer): Promise<void> {
  const header = await sharp(bytes, { limitInputPixels: false })
    .metadata()
    .catch(() => {
      throw broken();
    });
  if (header.width * header.height <= mostPixels) return;
  throw new ProblemError(
    422,
    'photo.too-many-pixels',
    `This picture says that it is ${header.width} × ${header.height} pixels, more than ${mostPixels / 1e6} million in all. Send it at the size the camera made it, or smaller.`,
  );
}
