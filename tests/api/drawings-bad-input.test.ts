import { gzipSync } from 'node:zlib';
import type supertest from 'supertest';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { detailsOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { attachDrawing, share, type Upload } from './support/share-design.ts';
import { storedThings } from './support/stored-things.ts';

const page = (inside: string) =>
  `<svg xmlns="http://www.w3.org/2000/svg" width="100mm" height="60mm" viewBox="0 0 100 60">${inside}</svg>`;
const box = '<rect x="10" y="10" width="40" height="20" fill="none" stroke="black"/>';
const nested = (levels: number) => page(`${'<g>'.repeat(levels)}${box}${'</g>'.repeat(levels)}`);
/** Ten copies of ten copies, twelve times over. */
const useBomb = page(
  `<defs><g id="n0">${box}</g>${Array.from(
    { length: 12 },
    (_, level) => `<g id="n${level + 1}">${`<use href="#n${level}"/>`.repeat(10)}</g>`,
  ).join('')}</defs><use href="#n12"/>`,
);
const elevenMb = page(`<desc>${'x'.repeat(11 * 1024 * 1024)}</desc>${box}`);
const barelyOver = page(`<desc>${'x'.repeat(10 * 1024 * 1024)}</desc>${box}`);
const png = Buffer.from('89504e470d0a1a0a0000000d49484452', 'hex');

const refused: [what: string, upload: Upload, status: number, sentence: RegExp][] = [
  ['not an SVG', { svg: 'G21 G90\nG0 X0 Y0' }, 422, /not an SVG/],
  ['HTML', { svg: '<!DOCTYPE html><html><body><svg/></body></html>' }, 422, /HTML/],
  ['broken XML', { svg: `${page(box).slice(0, -6)}</g></svg>` }, 422, /well-formed.*line 1/],
  ['an empty file', { svg: '' }, 422, /empty/],
  ['a drawing without shapes', { svg: page('<g id="nothing"/>') }, 422, /no shapes/],
  ['a file of 11 MB', { svg: elevenMb }, 413, /10 MB/],
  ['a file just over 10 MB', { svg: barelyOver }, 413, /10 MB/],
  [
    'ENTITY declarations',
    { svg: `<!DOCTYPE svg [<!ENTITY a "aaaa"><!ENTITY b "&a;&a;&a;">]>${page(`<desc>&b;</desc>${box}`)}` },
    422,
    /ENTITY/,
  ],
  [
    'an ENTITY that reads a file of ours',
    { svg: `<!DOCTYPE svg [<!ENTITY x SYSTEM "file:///etc/passwd">]>${page(`<desc>&x;</desc>${box}`)}` },
    422,
    /ENTITY/,
  ],
  ['5 000 nested groups', { svg: nested(5000) }, 422, /64 levels/],
  ['a use bomb', { svg: useBomb }, 422, /copies/],
  ['a use loop', { svg: page('<g id="a"><use href="#a"/></g>') }, 422, /contains itself/],
  ['coordinates beyond a million', { svg: page('<path d="M0 0H1000001"/>') }, 422, /1,000,000 mm/],
  ['a number that is not finite', { svg: page('<path d="M0 0L1e999 5"/>') }, 422, /not finite/],
  ['a PNG', { svg: png, fileName: 'plate.png', contentType: 'image/png' }, 415, /PNG/],
  ['a PNG that is named SVG', { svg: png }, 415, /PNG/],
  ['an svgz', { svg: gzipSync(page(box)), fileName: 'plate.svgz' }, 415, /svgz/],
];

const accepted: [what: string, svg: string, warning: string][] = [
  ['an error in the middle of a path', page(`${box}<path d="M0 0h9v9h-9zM1 1 x 2"/>`), 'path-error'],
  ['a script', page(`<script>alert(1)</script>${box}`), 'script'],
  ['an external reference', page(`${box}<use href="http://127.0.0.1:9/a.svg#x"/>`), 'external-reference'],
  ['text', page(`${box}<text x="5" y="5">Top</text>`), 'text-not-outlines'],
  ['an image', page(`${box}<image href="data:image/png;base64,AA" width="5" height="5"/>`), 'image-left-out'],
  [
    'a plain DOCTYPE',
    `<!DOCTYPE svg PUBLIC "-//W3C//DTD SVG 1.1//EN" "http://www.w3.org/Graphics/SVG/1.1/DTD/svg11.dtd">${page(box)}`,
    'doctype-dropped',
  ],
];

let club: TestClub;
let wren: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
});
afterEach(() => vi.restoreAllMocks());
afterAll(() => club.close());

const calls = {
  inspect: (upload: Upload) => attachDrawing(wren.call('post', '/api/drawings/inspect'), upload),
  share: (upload: Upload) => share(wren, detailsOf(), upload),
};

/** A refusal: a problem document with a sentence, and neither a row nor an object more than before. */
async function expectRefused(request: () => supertest.Test, status: number, sentence: RegExp) {
  const before = await storedThings(club);
  const put = vi.spyOn(club.deps.store, 'put');
  const answer = await request();
  expect(answer.status).toBe(status);
  expect(answer.headers['content-type']).toContain('application/problem+json');
  expect(answer.body.status).toBe(status);
  expect(answer.body.detail).toMatch(sentence);
  expect(answer.body.detail).not.toMatch(/[<>]|\bat .*\.ts/);
  expect(put.mock.calls.map(([key]) => key)).toEqual([]);
  put.mockRestore();
  expect(await storedThings(club)).toEqual(before);
  return answer;
}

describe.each(['inspect', 'share'] as const)('%s', (name) => {
  it.each(refused)('refuses %s', async (_what, upload, status, sentence) => {
    await expectRefused(() => calls[name](upload), status, sentence);
  });

  const path = name === 'inspect' ? '/api/drawings/inspect' : '/api/designs';

  it('refuses a form without a file', async () => {
    const details = JSON.stringify(detailsOf());
    await expectRefused(() => wren.call('post', path).field('details', details), 400, /part “file”/);
  });

  it('refuses a drawing that is not sent as a form', async () => {
    const raw = () => wren.call('post', path).set('Content-Type', 'image/svg+xml').send(plateSvg());
    await expectRefused(raw, 415, /multipart/);
  });

  it('refuses two files, and a file in another part', async () => {
    await expectRefused(() => attachDrawing(calls[name]({})), 400, /one file/i);
    const elsewhere = () => wren.call('post', path).attach('drawing', Buffer.from(plateSvg()), 'a.svg');
    await expectRefused(elsewhere, 400, /part “file”/);
  });

  it('refuses a form that breaks off', async () => {
    const broken = () =>
      wren
        .call('post', path)
        .set('Content-Type', 'multipart/form-data; boundary=b')
        .send('--b\r\nContent-Disposition: form-data; name="file"; filename="a.svg"\r\n\r\n<svg');
    await expectRefused(broken, 400, /\w/);
  });

  it.each(accepted)('accepts %s and says what was left out', async (_what, svg, warning) => {
    const { status, body } = await calls[name]({ svg });
    expect(status).toBe(name === 'inspect' ? 200 : 201);
    const drawing = name === 'inspect' ? body : body.revision.drawing;
    expect(drawing.warnings.map(({ code }: { code: string }) => code)).toContain(warning);
    expect(drawing.shapeCount).toBeGreaterThan(0);
  });
});

describe('a drawing that does not say how large it is', () => {
  const unsized = `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 100 60">${box}</svg>`;

  it('is read with a question, and shared only with an answer', async () => {
    const read = await calls.inspect({ svg: unsized }).expect(200);
    expect(read.body.units.confirmed).toBe(false);
    expect(read.body.scaleReadings.length).toBeGreaterThan(1);
    const refusal = await expectRefused(() => calls.share({ svg: unsized }), 422, /how large/);
    expect(refusal.body.errors).toMatchObject([{ path: 'scale.millimetresPerUnit' }]);
    const details = detailsOf({ scale: { millimetresPerUnit: 0.5 } });
    const { body } = await share(wren, details, { svg: unsized }).expect(201);
    expect(body.revision.drawing.units.confirmed).toBe(true);
    // The box is 40 × 20 units.
    expect(body.revision.drawing.widthMm).toBeCloseTo(20, 9);
    expect(body.revision.drawing.heightMm).toBeCloseTo(10, 9);
  });

  it('is inspected at a stated scale, and not at one that is none', async () => {
    const at = (scale: string) => calls.inspect({ svg: unsized }).field('millimetresPerUnit', scale);
    const { body } = await at('25.4').expect(200);
    expect(body.widthMm).toBeCloseTo(40 * 25.4, 9);
    await expectRefused(() => at('0'), 422, /more than 0/);
    await expectRefused(() => at('-1'), 422, /more than 0/);
    await expectRefused(() => at('"25.4"'), 422, /number/);
    await expectRefused(() => at('wide'), 400, /JSON/);
  });
});
