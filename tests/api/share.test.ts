import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Design } from '#shared/api/designs.ts';
import { cutOf, detailsOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';

let club: TestClub;
let wren: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
});
afterAll(() => club.close());

const share = (person: Person, svg: string, details: unknown, key = 'k') =>
  person
    .call('post', '/api/designs')
    .set('Idempotency-Key', `${key}-${Math.abs(svg.length)}`)
    .field('details', JSON.stringify(details))
    .attach('file', Buffer.from(svg), { filename: 'plate.svg', contentType: 'image/svg+xml' });

describe('sharing a design', () => {
  it('publishes revision 1 with the settings that worked', async () => {
    const machine = await club.machine(wren);
    const answer = await share(wren, plateSvg(), detailsOf({ cut: cutOf(machine.id) })).expect(201);
    const design = answer.body as Design;
    expect(design.drawingNumber).toMatch(/^TL-\d{4}$/);
    expect(design.slug).toBe('square-corner-stop');
    expect(design.revision.drawing.widthMm).toBeCloseTo(120, 6);
    expect(design.standing).toMatchObject([
      { material: 'mdf', word: 'cut-once', votesFor: 1, votesAgainst: 0 },
    ]);
    const fit = await wren
      .call('get', `/api/designs/${design.slug}/revisions/1/fit?machineId=${machine.id}`)
      .expect(200);
    expect(fit.body.checks.find((check: { id: string }) => check.id === 'bed').result).toBe('fits');
    const zip = await wren.call('get', `/api/designs/${design.slug}/revisions/1/package.zip`).expect(200);
    expect(zip.headers['content-disposition']).toContain('attachment');
    const found = await wren.call('get', '/api/designs?q=corner').expect(200);
    expect(found.body.items.map((item: Design) => item.slug)).toContain(design.slug);
  });
});
