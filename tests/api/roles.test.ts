import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { type EndpointName, endpointNames, everyCall } from './support/every-call.ts';

// What each kind of caller gets for a good request about things that belong to the owner. Written from the
// contract ("who") and the issue: another member's machine is 404, a foreign design's edit 403.

const callers = ['stranger', 'suspended', 'member', 'owner', 'moderator', 'administrator'] as const;
type Expected = readonly [number, number, number, number, number, number];

const open = (status: number): Expected => [status, status, status, status, status, status];
const anyMember = (status: number): Expected => [401, 401, status, status, status, status];
const ownerOnly = (status: number): Expected => [401, 401, 404, status, 404, 404];
/** Everybody sees it, the owner alone may do this: not even a moderator in their name. */
const ownerAlone = (status: number): Expected => [401, 401, 403, status, 403, 403];
const ownerOrModerator = (status: number): Expected => [401, 401, 403, status, status, status];
const moderators = (status: number): Expected => [401, 401, 403, 403, status, status];
/** Everybody may read it; only who made it may add to it. */
const makerOnly = (status: number): Expected => [401, 401, 403, status, 403, 403];
const administrators = (status: number): Expected => [401, 401, 403, 403, 403, status];

const expected: Record<EndpointName, Expected> = {
  health: open(200),
  openapi: open(200),
  settingsSchema: open(200),
  me: anyMember(200),
  listMembers: administrators(200),
  changeMember: administrators(200),
  listInvitations: administrators(200),
  invite: administrators(201),
  lookUpInvitation: open(200),
  acceptInvitation: open(201),
  listNotices: anyMember(200),
  readNotice: ownerOnly(204),
  listMachines: anyMember(200),
  addMachine: anyMember(201),
  changeMachine: ownerOnly(200),
  removeMachine: ownerOnly(204),
  listBits: anyMember(200),
  addBit: anyMember(201),
  changeBit: ownerOnly(200),
  removeBit: ownerOnly(204),
  listStock: anyMember(200),
  addStock: anyMember(201),
  changeStock: ownerOnly(200),
  removeStock: ownerOnly(204),
  inspectDrawing: anyMember(200),
  shareDesign: anyMember(201),
  listDesigns: anyMember(200),
  getDesign: anyMember(200),
  changeDesign: ownerOrModerator(200),
  withdrawDesign: ownerOrModerator(204),
  getGeometry: anyMember(200),
  takeDrawing: anyMember(200),
  takePackage: anyMember(200),
  fit: ownerOnly(200),
  shareRevision: ownerAlone(201),
  shareRemix: anyMember(201),
  listCuts: anyMember(200),
  recordCut: anyMember(201),
  getCut: anyMember(200),
  correctCut: makerOnly(200),
  noteInService: makerOnly(201),
  addPhoto: makerOnly(201),
  getPhoto: anyMember(200),
  cutLog: anyMember(200),
  cutLogCsv: anyMember(200),
  raiseFlag: anyMember(201),
  listFlags: moderators(200),
  decideFlag: moderators(200),
  audit: moderators(200),
};

let club: TestClub;
let people: Record<(typeof callers)[number], Person>;
let calls: Awaited<ReturnType<typeof everyCall>>;

beforeAll(async () => {
  club = await testClub();
  const administrator = await club.person('Ada', 'administrator');
  const owner = await club.person('Wren');
  const suspended = await club.person('Reed');
  people = {
    stranger: club.stranger,
    suspended,
    member: await club.person('Tarn'),
    owner,
    moderator: await club.person('Moss', 'moderator'),
    administrator,
  };
  calls = await everyCall(club, owner, administrator);
  await administrator
    .call('patch', `/api/members/${suspended.id}`)
    .send({ suspended: true, version: 1 })
    .expect(200);
});
afterAll(() => club.close());

describe('who may do what', () => {
  it('is decided here for every endpoint of the contract', () => {
    expect(Object.keys(expected).sort()).toEqual([...endpointNames].sort());
    expect([...calls.named].sort()).toEqual([...endpointNames].sort());
  });

  it.each(endpointNames)('%s', async (name) => {
    const got: Record<string, number> = {};
    for (const caller of callers) {
      const answer = await calls.call(name, people[caller]);
      got[caller] = answer.status;
      if (answer.status < 400) continue;
      expect(answer.headers['content-type']).toContain('application/problem+json');
      expect(answer.body).toMatchObject({ status: answer.status, detail: expect.stringMatching(/\w+.*\.$/) });
    }
    expect(got).toEqual(Object.fromEntries(callers.map((caller, place) => [caller, expected[name][place]])));
  });
});
