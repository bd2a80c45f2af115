import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { flag } from '#server/db/schema/index.ts';
import type { Design } from '#shared/api/designs.ts';
import { cutOf, detailsOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { share, sharedDesign, shareRemix, shareRevision } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let machineId: string;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  machineId = (await club.machine(wren)).id;
});
afterAll(() => club.close());

let widthMm = 60;
/** Evidence is for a geometry, so each design here has one of its own. */
const freshSvg = () => {
  widthMm += 1;
  return plateSvg(widthMm);
};
const flagsOf = async ({ id }: Design) =>
  (await club.deps.database.db.select().from(flag)).filter((row) => row.designId === id);
/** In acrylic, 16 000 rev/min and two flutes: 60 mm/min is 0.0019 mm a tooth (C), a thirteenth of the usual least. */
const rubbing = () =>
  cutOf(machineId, { materialId: 'acrylic', settings: { ...cutOf('').settings, feedMmPerMin: 60 } });

describe('settings that come with a shared drawing', () => {
  it('say what the rules find, on the page and to everybody', async () => {
    const { slug } = await sharedDesign(wren, { cut: rubbing() }, freshSvg());
    const design = (await tarn.call('get', `/api/designs/${slug}`).expect(200)).body as Design;
    expect(design.cuts[0]?.findings).toMatchObject([{ ruleId: 'chip-load', level: 'do-not-cut' }]);
    expect(design.cuts[0]?.findings[0]?.sentence).toContain('rubs');
  });

  it('find nothing where there is nothing, and flag nothing', async () => {
    const design = await sharedDesign(wren, { cut: cutOf(machineId) }, freshSvg());
    expect(design.cuts[0]?.findings).toEqual([]);
    expect(await flagsOf(design)).toEqual([]);
  });

  it('a caution is said and calls no moderator', async () => {
    // 3.5 mm with a bit of 3.175 in MDF: over the cap of one diameter, under twice it.
    const settings = { ...cutOf('').settings, depthOfCutMm: 3.5 };
    const design = await sharedDesign(wren, { cut: cutOf(machineId, { settings }) }, freshSvg());
    expect(design.cuts[0]?.findings).toMatchObject([{ ruleId: 'depth-of-cut', level: 'caution' }]);
    expect(await flagsOf(design)).toEqual([]);
  });

  it('are flagged by the rule itself with a share, a revision and a remix, once each', async () => {
    const shared = await sharedDesign(wren, { cut: rubbing() }, freshSvg());
    const revisedOne = await sharedDesign(wren, {}, freshSvg());
    const revised = (
      await shareRevision(wren, revisedOne.slug, { cut: rubbing() }, { svg: freshSvg() }).expect(201)
    ).body as Design;
    const remix = (await shareRemix(wren, shared.slug, { cut: rubbing() }, { svg: freshSvg() }).expect(201))
      .body as Design;
    for (const design of [shared, revised, remix]) {
      expect(await flagsOf(design)).toMatchObject([
        {
          raisedBy: null,
          isOpen: true,
          level: 'do-not-cut',
          cutId: design.cuts[0]?.id,
          finding: { ruleId: 'chip-load', source: 'common practice, no published source' },
        },
      ]);
    }
  });

  it('of a hazardous material are kept by their true name and flagged', async () => {
    const design = await sharedDesign(wren, { cut: cutOf(machineId, { materialId: 'pvc' }) }, freshSvg());
    expect(design.cuts[0]).toMatchObject({
      materialId: 'pvc',
      materialFamily: null,
      findings: [{ ruleId: 'hazardous-material', level: 'do-not-cut' }],
    });
    expect(await flagsOf(design)).toMatchObject([{ finding: { ruleId: 'hazardous-material' } }]);
    expect(design.standing).toEqual([]);
  });

  it('wait for a moderator: they are not handed out meanwhile', async () => {
    const design = await sharedDesign(wren, { cut: rubbing() }, freshSvg());
    expect(design.cuts[0]?.settingsWithheld?.reason).toContain('rubs');
    const path = `/api/designs/${design.slug}/revisions/1/package.zip?recordId=${design.cuts[0]?.id}`;
    const refused = await tarn.call('get', path).expect(403);
    expect(refused.body.detail).toContain('rubs');
  });

  it('a repeated request raises no second flag', async () => {
    const details = detailsOf({ title: 'Flagged once', cut: rubbing() });
    const upload = { key: 'flagged-once', svg: freshSvg() };
    const first = (await share(wren, details, upload).expect(201)).body as Design;
    await share(wren, details, upload).expect(201);
    expect(await flagsOf(first)).toHaveLength(1);
  });
});
