import { desc } from 'drizzle-orm';
import { pino } from 'pino';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { createApp } from '#server/app.ts';
import { take } from '#server/db/schema/index.ts';
import { readDrawing } from '#shared/drawing/read.ts';
import { cutOf, plateSvg } from '../support/samples.ts';
import { type Person, signIn, type TestClub, testClub } from '../support/test-club.ts';
import { bytesOf } from './support/bytes-of.ts';
import { sharedDesign } from './support/share-design.ts';
import { takeCount } from './support/stored-things.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let at: string;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  const machine = await club.machine(wren);
  at = `/api/designs/${(await sharedDesign(wren, { cut: cutOf(machine.id) })).slug}/revisions/1`;
});
afterAll(() => club.close());

const newestTake = async () =>
  (await club.deps.database.db.select().from(take).orderBy(desc(take.takenAt)).limit(1))[0];

describe.each([
  ['drawing.svg', 'drawing', 'image/svg+xml'],
  ['package.zip', 'package', 'application/zip'],
] as const)('%s', (file, what, contentType) => {
  it('is a take of the member who asks, with the machine it is for', async () => {
    const machine = await club.machine(tarn);
    const before = await takeCount(club);
    await tarn.call('get', `${at}/${file}?machineId=${machine.id}`).expect(200);
    expect(await takeCount(club)).toBe(before + 1);
    expect(await newestTake()).toMatchObject({ memberId: tarn.id, what, machineId: machine.id });
  });

  it('leaves only after its take is written', async () => {
    const app = createApp({ ...club.deps, log: pino({ level: 'silent' }) });
    const cookie = await signIn(app, tarn.email);
    const insert = vi.spyOn(club.deps.database.db, 'insert').mockImplementation(() => {
      throw new Error('the disk is full');
    });
    const answer = await supertest(app).get(`${at}/${file}`).set('Cookie', cookie);
    insert.mockRestore();
    expect(answer.status).toBe(500);
    expect(answer.text).not.toMatch(/disk is full|<svg/);
    expect(answer.headers['content-disposition']).toBeUndefined();
  });

  it('comes as an attachment that no browser opens or runs', async () => {
    const { headers } = await tarn.call('get', `${at}/${file}`).expect(200);
    expect(headers['content-type']).toContain(contentType);
    expect(headers['content-disposition']).toMatch(
      new RegExp(`^attachment; filename="TL-\\d{4}-rev1-square-corner-stop\\.${file.slice(-3)}"$`),
    );
    expect(headers['content-security-policy']).toBe("default-src 'none'; sandbox");
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['cache-control']).toBe('no-store');
  });

  it('is not taken by asking for its size or for a part of it', async () => {
    const whole = (await bytesOf(tarn.call('get', `${at}/${file}`))).body;
    const before = await takeCount(club);
    const head = await tarn.call('head', `${at}/${file}`).expect(200);
    expect(Number(head.headers['content-length'])).toBe(whole.length);
    expect(head.headers['accept-ranges']).toBe('bytes');
    for (const [range, start, end] of [
      ['bytes=10-29', 10, 30],
      ['bytes=100-', 100, whole.length],
      ['bytes=-7', whole.length - 7, whole.length],
    ] as const) {
      const part = await bytesOf(tarn.call('get', `${at}/${file}`).set('Range', range)).then(
        (answer) => answer,
      );
      expect(part.status, range).toBe(206);
      expect(part.headers['content-range']).toBe(`bytes ${start}-${end - 1}/${whole.length}`);
      expect(part.body.equals(whole.subarray(start, end)), range).toBe(true);
    }
    const outside = await tarn.call('get', `${at}/${file}`).set('Range', `bytes=${whole.length}-`);
    expect(outside.status).toBe(416);
    expect(outside.headers['content-type']).toContain('application/problem+json');
    expect(outside.headers['content-range']).toBe(`bytes */${whole.length}`);
    expect(await takeCount(club)).toBe(before);
  });

  it.each(['bytes=0-', 'bytes=0-1,5-6', 'lines=1-2', 'nonsense'])(
    'is taken when a range has its first byte (%s), so that a recall reaches the member',
    async (range) => {
      const before = await takeCount(club);
      await bytesOf(tarn.call('get', `${at}/${file}`).set('Range', range));
      expect(await takeCount(club)).toBe(before + 1);
    },
  );

  it('is refused without a take for what is not there or not the member’s', async () => {
    const before = await takeCount(club);
    const wrens = await club.machine(wren);
    const nobodys = 'ffffffff-ffff-7fff-bfff-ffffffffffff';
    for (const [path, status] of [
      [`${at}/${file}?machineId=${wrens.id}`, 404],
      [`${at}/${file}?recordId=${nobodys}`, 404],
      [`${at}/${file}?recordId=newest`, 400],
      [`${at}/${file}?colour=blue`, 400],
      [`${at.replace(/1$/, '2')}/${file}`, 404],
      [`${at.replace(/1$/, '1e0')}/${file}`, 404],
      [`/api/designs/none/revisions/1/${file}`, 404],
    ] as const)
      expect((await tarn.call('get', path)).status, path).toBe(status);
    expect(await takeCount(club)).toBe(before);
  });

  it('of a withdrawn design is withheld with the reason, and is no take', async () => {
    const { slug, title } = await sharedDesign(wren, { title: `Withdrawn ${what}` });
    await wren.call('delete', `/api/designs/${slug}`).expect(204);
    const before = await takeCount(club);
    const answer = await tarn.call('get', `/api/designs/${slug}/revisions/1/${file}`).expect(403);
    expect(answer.body).toMatchObject({ type: 'design.withdrawn', status: 403 });
    expect(answer.body.detail).toContain(title);
    expect(answer.body.detail).toMatch(/was withdrawn on \d{4}-\d{2}-\d{2}/);
    expect(await takeCount(club)).toBe(before);
  });
});

describe('the taken drawing', () => {
  it('is in true millimetres: read again it has the size of the original', async () => {
    const svg = (await bytesOf(tarn.call('get', `${at}/drawing.svg`))).body.toString();
    const again = readDrawing(svg);
    if (!again.ok) throw new Error(again.refusal.message);
    expect(again.drawing.units.confirmed).toBe(true);
    expect(again.drawing.widthMm).toBeCloseTo(120, 9);
    expect(again.drawing.heightMm).toBeCloseTo(80, 9);
    // Plate with corners of 5 mm, and a hole of 3 mm radius: sides, four quarter turns, and a circle.
    expect(again.drawing.lengthMm).toBeCloseTo(2 * (110 + 70) + 2 * Math.PI * 5 + 2 * Math.PI * 3, 6);
    expect(again.drawing.layers.map(({ name }) => name)).toEqual(['outside', 'hole']);
  });

  it('is what the screen shows: the same paths as the geometry', async () => {
    const svg = (await bytesOf(tarn.call('get', `${at}/drawing.svg`))).body.toString();
    const { body } = await tarn.call('get', `${at}/geometry`).expect(200);
    const paths = [...svg.matchAll(/<path d="([^"]+)"/g)].map(([, data]) => data);
    const shown = body.shapes.map(({ pathData }: { pathData: string }) => pathData);
    expect(shown).toHaveLength(2);
    // The last one is the origin mark.
    expect(paths.slice(0, -1)).toEqual(shown);
    expect(svg).toContain('<title>origin</title>');
  });

  it('carries no script, style or markup of the file', async () => {
    const hostile = plateSvg()
      .replace(
        '<g id="outside">',
        '<script>alert("s")</script><style>@import "http://127.0.0.1:9/s.css";</style><g id="outside" onclick="alert(1)" data-x="alert(1)">',
      )
      .replace('id="hole"', 'id="&lt;/title&gt;&lt;script&gt;hole&lt;/script&gt;"')
      .replace('</svg>', '<foreignObject><iframe src="javascript:alert(1)"/></foreignObject></svg>');
    const { slug } = await sharedDesign(
      wren,
      { title: '</title><script>t</script>', summary: '<img onerror=x>' },
      hostile,
    );
    const revision = `/api/designs/${slug}/revisions/1`;
    const svg = (await bytesOf(tarn.call('get', `${revision}/drawing.svg`))).body.toString();
    expect(svg).not.toMatch(/alert|<script|onclick|@import|iframe|foreignObject|127\.0\.0\.1|javascript:/);
    expect(readDrawing(svg).ok).toBe(true);
    const geometry = await tarn.call('get', `${revision}/geometry`).expect(200);
    const drawn = geometry.body.shapes.map(({ pathData }: { pathData: string }) => pathData);
    expect(drawn.join('')).toMatch(/^[-\d.eMLHVCSQTAZmlhvcsqtaz ,]+$/);
    expect(geometry.text).not.toMatch(/alert|onclick|@import|iframe|javascript:/);
  });
});
