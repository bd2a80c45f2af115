import { strFromU8, unzipSync } from 'fflate';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import type { Design } from '#shared/api/designs.ts';
import { readDrawing } from '#shared/drawing/read.ts';
import { cutOf } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { bytesOf } from './support/bytes-of.ts';
import { sharedDesign } from './support/share-design.ts';

/** With a byte order mark, line ends of another system and a comment: all of it must come back. */
const original =
  '\ufeff<?xml version="1.0"?>\r\n<!-- été -->\r\n<svg xmlns="http://www.w3.org/2000/svg" width="2in" height="1in" viewBox="0 0 2 1">\r\n<rect width="2" height="1"/></svg>\r\n';

let club: TestClub;
let wren: Person;
let tarn: Person;
let cutDesign: Design;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  const machine = await club.machine(wren);
  cutDesign = await sharedDesign(
    wren,
    { cut: cutOf(machine.id, { notes: 'Second pass slower.' }) },
    original,
  );
});
afterAll(() => club.close());

const packageOf = async ({ slug }: Design, query = '') => {
  const answer = await bytesOf(tarn.call('get', `/api/designs/${slug}/revisions/1/package.zip${query}`));
  expect(answer.status).toBe(200);
  return answer.body;
};
const filesOf = async (design: Design, query = '') => {
  const files = unzipSync(await packageOf(design, query));
  const text = (name: string) => strFromU8(files[name] ?? new Uint8Array());
  return { files, text, settings: JSON.parse(text('settings.json')) };
};

describe('a package', () => {
  it('has its files in their order', async () => {
    const { files } = await filesOf(cutDesign);
    expect(Object.keys(files)).toEqual([
      'drawing.svg',
      'original.svg',
      'settings.json',
      'LICENCE-AND-CREDITS.txt',
    ]);
  });

  it('has the same bytes each time', async () => {
    const first = await packageOf(cutDesign);
    // File times in a zip step by two seconds: seconds later they would differ if they were taken from the clock.
    vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + 5000 });
    const second = await packageOf(cutDesign).finally(() => vi.useRealTimers());
    expect(first.equals(second)).toBe(true);
  });

  it('has the file as it was shared, byte for byte', async () => {
    const { files } = await filesOf(cutDesign);
    expect(Buffer.from(files['original.svg'] ?? []).equals(Buffer.from(original))).toBe(true);
  });

  it('has the drawing in true millimetres, the same as drawing.svg alone', async () => {
    const { text } = await filesOf(cutDesign);
    const alone = await bytesOf(tarn.call('get', `/api/designs/${cutDesign.slug}/revisions/1/drawing.svg`));
    expect(text('drawing.svg')).toBe(alone.body.toString());
    const read = readDrawing(text('drawing.svg'));
    if (!read.ok) throw new Error(read.refusal.message);
    // 1 in = 25.4 mm (M: international yard and pound agreement, 1959).
    expect(read.drawing.widthMm).toBeCloseTo(50.8, 9);
    expect(read.drawing.heightMm).toBeCloseTo(25.4, 9);
  });

  it('has settings that the served schema describes, from the record of the cut', async () => {
    const { settings } = await filesOf(cutDesign);
    const served = await club.stranger.call('get', '/api/schemas/settings.json').expect(200);
    const schema = z.fromJSONSchema(served.body);
    expect(schema.safeParse(settings).error).toBeUndefined();
    expect(schema.safeParse({ ...settings, drawing: { widthMm: 'wide' } }).success).toBe(false);
    expect(settings.$schema).toBe('/api/schemas/settings.json');
    const { machineId: _machine, ...cut } = cutOf('', { notes: 'Second pass slower.' });
    expect(settings.record).toMatchObject({ ...cut, memberName: 'Wren', machineName: 'Shed router' });
    expect(settings.design).toEqual({
      title: cutDesign.title,
      drawingNumber: cutDesign.drawingNumber,
      revision: 1,
      geometryHash: cutDesign.revision.geometryHash,
      licence: 'CC-BY-SA-4.0',
    });
    expect(settings.advice.join(' ')).toMatch(/eye, ear and breathing protection.*emergency stop/);
  });

  it('names the licence and who drew it', async () => {
    const text = (await filesOf(cutDesign)).text('LICENCE-AND-CREDITS.txt');
    for (const words of [cutDesign.title, cutDesign.drawingNumber, 'Wren', 'CC-BY-SA-4.0', 'ShareAlike'])
      expect(text).toContain(words);
  });

  it('has no settings while nobody has cut the design', async () => {
    const { settings, text } = await filesOf(await sharedDesign(wren, { title: 'Uncut one' }));
    expect(settings.record).toBeUndefined();
    expect(text('LICENCE-AND-CREDITS.txt')).not.toContain('Settings recorded');
  });

  it('hands out settings of a failed cut only when that record is asked for', async () => {
    const machine = await club.machine(wren);
    const svg = original.replaceAll('2in', '3in');
    const design = await sharedDesign(
      wren,
      { title: 'Failed', cut: cutOf(machine.id, { outcome: 'failed' }) },
      svg,
    );
    expect((await filesOf(design)).settings.record).toBeUndefined();
    const asked = await filesOf(design, `?recordId=${design.cuts[0]?.id}`);
    expect(asked.settings.record).toMatchObject({ outcome: 'failed' });
  });
});
