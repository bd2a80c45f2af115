import { crc32, deflateSync } from 'node:zlib';
import sharp, { type Sharp } from 'sharp';
import type supertest from 'supertest';
import type { Person } from '../../support/test-club.ts';

/** A plain picture: left half dark, right half light, so that turning it shows. */
export function picture(widthPx: number, heightPx: number): Sharp {
  const half = Math.floor(widthPx / 2);
  const light = { create: { width: half, height: heightPx, channels: 3 as const, background: '#f0f0f0' } };
  return sharp({
    create: { width: widthPx, height: heightPx, channels: 3, background: '#101010' },
  }).composite([{ input: light, left: widthPx - half, top: 0 }]);
}

export const jpeg = (widthPx = 120, heightPx = 80): Promise<Buffer> =>
  picture(widthPx, heightPx).jpeg().toBuffer();

/** A chunk of a PNG file (PNG specification, third edition, 5.3): length, type, data, CRC of type and data. */
function pngChunk(type: string, data: Buffer): Buffer {
  const typeAndData = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const length = Buffer.alloc(4);
  length.writeUInt32BE(data.length);
  const crc = Buffer.alloc(4);
  crc.writeUInt32BE(crc32(typeAndData));
  return Buffer.concat([length, typeAndData, crc]);
}

/** A valid PNG of one grey, one bit a pixel: large to unpack, tiny to send. */
export function pngBomb(sidePx: number): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(sidePx, 0);
  header.writeUInt32BE(sidePx, 4);
  // Bit depth 1, greyscale; compression, filter and interlace methods 0.
  header[8] = 1;
  const rowBytes = 1 + Math.ceil(sidePx / 8);
  const pixels = deflateSync(Buffer.alloc(rowBytes * sidePx), { level: 9 });
  return Buffer.concat([
    Buffer.from('\x89PNG\r\n\x1a\n', 'latin1'),
    pngChunk('IHDR', header),
    pngChunk('IDAT', pixels),
    pngChunk('IEND', Buffer.alloc(0)),
  ]);
}

/** The request that adds a photo, as a browser's form sends it. */
export function attachPhoto(
  person: Person,
  cutId: string,
  bytes: Buffer,
  { fileName = 'cut.jpg', contentType = 'image/jpeg', key }: PhotoUpload = {},
): supertest.Test {
  const request = person.call('post', `/api/cuts/${cutId}/photos`);
  if (key !== undefined) request.set('Idempotency-Key', key);
  return request.attach('file', bytes, { filename: fileName, contentType });
}

export interface PhotoUpload {
  fileName?: string;
  contentType?: string;
  key?: string;
}
