import sharp, { type Region } from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cutPhoto, pendingObject, storedObject } from '#server/db/schema/index.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import { plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { bytesOf } from './support/bytes-of.ts';
import { attachPhoto, jpeg, type PhotoUpload, picture, pngBomb } from './support/photo-files.ts';
import { recorded } from './support/record-cut.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let slug: string;
let cut: CutRecord;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  slug = (await sharedDesign(wren, {}, plateSvg())).slug;
  cut = await recorded(club, tarn, slug);
});
afterAll(() => club.close());

async function stored() {
  const { db } = club.deps.database;
  return {
    photos: await db.$count(cutPhoto),
    storedObjects: await db.$count(storedObject),
    pendingObjects: await db.$count(pendingObject),
  };
}

const readBack = (id: string) => bytesOf(wren.call('get', `/api/photos/${id}`).expect(200));
/** Mean brightness, 0 to 255, of a part of a picture. */
async function brightness(bytes: Buffer, part: Region): Promise<number> {
  const raw = await sharp(bytes).extract(part).greyscale().raw().toBuffer();
  return raw.reduce((sum, value) => sum + value, 0) / raw.length;
}

describe('a photo of a cut', () => {
  it('loses place, time and camera, and is turned upright', async () => {
    // Orientation 6 (TIFF tag 274): the camera was held upright, so the picture is to be turned by 90° clockwise.
    const bytes = await picture(400, 200)
      .withExif({
        IFD0: { Make: 'Acme', Model: 'Pocket', Artist: 'Somebody' },
        IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '52/1 12/1 30/1' },
      })
      .withMetadata({ orientation: 6 })
      .jpeg()
      .toBuffer();
    const sent = await sharp(bytes).metadata();
    expect(sent.orientation).toBe(6);
    expect(sent.exif?.toString('latin1')).toContain('Acme');
    // The pointer to the GPS directory is tag 0x8825, a LONG (type 4) of count 1 (Exif 3.0, 4.6.3), in either byte order.
    const gps = /8825000400000001|2588040001000000/;
    expect(sent.exif?.toString('hex')).toMatch(gps);
    const made = await attachPhoto(tarn, cut.id, bytes).expect(201);
    expect(made.body).toEqual({ id: expect.any(String), widthPx: 200, heightPx: 400 });
    const { body, headers } = await readBack(made.body.id);
    const kept = await sharp(body).metadata();
    expect(kept).toMatchObject({ format: 'webp', width: 200, height: 400 });
    for (const part of ['exif', 'xmp', 'iptc', 'icc', 'orientation'] as const)
      expect(kept[part]).toBeUndefined();
    for (const told of ['Acme', 'Somebody', 'EXIF']) expect(body.toString('latin1')).not.toContain(told);
    expect(body.toString('hex')).not.toMatch(gps);
    // What was left, and dark, is on top after the turn.
    expect(await brightness(body, { left: 0, top: 0, width: 200, height: 180 })).toBeLessThan(60);
    expect(await brightness(body, { left: 0, top: 220, width: 200, height: 180 })).toBeGreaterThan(200);
    expect(headers).toMatchObject({
      'content-type': 'image/webp',
      'content-disposition': 'inline; filename="cut.webp"',
      'content-security-policy': "default-src 'none'",
      'x-content-type-options': 'nosniff',
    });
    expect(headers['cache-control']).toMatch(/^private,/);
    const read = await wren.call('get', `/api/cuts/${cut.id}`).expect(200);
    expect(read.body.photos).toEqual([made.body]);
  });

  it('is made small enough for a page, and never larger than it was', async () => {
    const large = await attachPhoto(tarn, cut.id, await jpeg(4096, 3072)).expect(201);
    expect(large.body).toMatchObject({ widthPx: 2048, heightPx: 1536 });
    const small = await attachPhoto(tarn, cut.id, await jpeg(64, 32)).expect(201);
    expect(small.body).toMatchObject({ widthPx: 64, heightPx: 32 });
  });

  it('may be PNG or WebP, whatever its name says', async () => {
    const png = await picture(90, 60).png().toBuffer();
    const webp = await picture(90, 60).webp().toBuffer();
    for (const bytes of [png, webp]) {
      const made = await attachPhoto(tarn, cut.id, bytes, { fileName: 'x.txt', contentType: 'text/plain' });
      expect(made.status).toBe(201);
      expect((await sharp((await readBack(made.body.id)).body).metadata()).format).toBe('webp');
    }
  });

  it('sent twice with one key is there once', async () => {
    const own = await recorded(club, tarn, slug);
    const bytes = await jpeg();
    const first = await attachPhoto(tarn, own.id, bytes, { key: 'photo-1' }).expect(201);
    const before = await stored();
    const second = await attachPhoto(tarn, own.id, bytes, { key: 'photo-1' }).expect(201);
    expect(second.body).toEqual(first.body);
    expect(await stored()).toEqual(before);
  });

  it('is one of at most eight, also when they come at once', async () => {
    const own = await recorded(club, tarn, slug);
    const bytes = await jpeg();
    const answers = await Promise.all(Array.from({ length: 10 }, () => attachPhoto(tarn, own.id, bytes)));
    expect(answers.map(({ status }) => status).sort()).toEqual([...Array(8).fill(201), 409, 409]);
    expect((await wren.call('get', `/api/cuts/${own.id}`)).body.photos).toHaveLength(8);
    const full = await attachPhoto(tarn, own.id, bytes).expect(409);
    expect(full.body.detail).toContain('8 photos');
  });
});

describe('what is no photo', () => {
  const halfOfJpeg = async () => {
    const whole = await jpeg(400, 300);
    return whole.subarray(0, whole.length / 2);
  };
  const heic = Buffer.concat([Buffer.from([0, 0, 0, 24]), Buffer.from('ftypheic\0\0\0\0mif1heic', 'latin1')]);
  const refused: [what: string, bytes: () => Buffer | Promise<Buffer>, status: number, sentence: RegExp][] = [
    ['an SVG named JPEG', () => Buffer.from(plateSvg()), 415, /not a photo/],
    ['a script', () => Buffer.from('<script>alert(1)</script>'), 415, /not a photo/],
    ['a GIF', () => Buffer.from('GIF89a\x01\0\x01\0', 'latin1'), 415, /not a photo/],
    ['a HEIC', () => heic, 415, /HEIC.*JPEG/],
    ['an empty file', () => Buffer.alloc(0), 415, /not a photo/],
    [
      'the first bytes of a JPEG alone',
      () => Buffer.from([0xff, 0xd8, 0xff, 0xe0]),
      422,
      /cannot be decoded/,
    ],
    ['a JPEG that breaks off', halfOfJpeg, 422, /breaks off/],
    ['a PNG of 40 000 × 40 000', () => pngBomb(40_000), 422, /40000 × 40000 pixels/],
    ['30 MB', () => Buffer.alloc(30 * 1024 * 1024, 0xff), 413, /20 MB/],
    ['a byte over 20 MB', () => Buffer.alloc(20 * 1024 * 1024 + 1, 0xff), 413, /20 MB/],
  ];

  it.each(refused)(
    '%s is refused with a sentence, and nothing is stored',
    async (_what, bytes, status, sentence) => {
      const own = await recorded(club, tarn, slug);
      const before = await stored();
      const startedMs = performance.now();
      const answer = await attachPhoto(tarn, own.id, await bytes());
      expect({ status: answer.status, detail: answer.body.detail }).toEqual({
        status,
        detail: expect.stringMatching(sentence),
      });
      expect(await stored()).toEqual(before);
      expect(performance.now() - startedMs).toBeLessThan(10_000);
    },
  );

  it('the bomb is a PNG that would unpack, so that its size alone is what is refused', async () => {
    const small = pngBomb(400);
    expect(await sharp(small).metadata()).toMatchObject({ format: 'png', width: 400, height: 400 });
    expect(pngBomb(40_000).length).toBeLessThan(400_000);
    const options: PhotoUpload = { fileName: 'plate.png', contentType: 'image/png' };
    await attachPhoto(tarn, (await recorded(club, tarn, slug)).id, small, options).expect(201);
  });

  it('no file, no form, no such record, another member’s record', async () => {
    const own = await recorded(club, tarn, slug);
    const before = await stored();
    const at = `/api/cuts/${own.id}/photos`;
    const none = await tarn.call('post', at).field('words', 'x').expect(400);
    expect(none.body.detail).toContain('photo');
    await tarn.call('post', at).send({ file: 'x' }).expect(415);
    await attachPhoto(tarn, 'none', await jpeg()).expect(404);
    await attachPhoto(tarn, slug, await jpeg()).expect(404);
    await attachPhoto(wren, own.id, await jpeg()).expect(403);
    await wren.call('get', '/api/photos/none').expect(404);
    await wren.call('get', `/api/photos/${own.id}`).expect(404);
    await club.stranger.call('get', `/api/photos/${own.id}`).expect(401);
    expect(await stored()).toEqual(before);
  });
});
