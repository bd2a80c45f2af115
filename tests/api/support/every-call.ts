import type { Response } from 'supertest';
import { insertNotice } from '#server/features/notices/insert-notice.ts';
import { createMember } from '#server/features/people/invitations.ts';
import type { Design } from '#shared/api/designs.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import type { Flag } from '#shared/api/flags.ts';
import type { NoticeList } from '#shared/api/notices.ts';
import type { InvitationMade } from '#shared/api/people.ts';
import { bitOf, cutOf, detailsOf, machineOf } from '../../support/samples.ts';
import { type Person, password, type TestClub } from '../../support/test-club.ts';
import { attachPhoto, jpeg } from './photo-files.ts';
import { record, recorded, toldOf } from './record-cut.ts';
import { attachDrawing, share, sharedDesign, shareRemix, shareRevision } from './share-design.ts';

export type EndpointName = keyof typeof endpoints;
export const endpointNames = Object.keys(endpoints) as EndpointName[];

interface Input {
  params?: Record<string, string>;
  query?: string;
  body?: object;
  send?: (caller: Person) => PromiseLike<Response>;
}

const stockPiece = { name: 'Offcut', materialId: 'mdf', lengthMm: 400, widthMm: 200, thicknessMm: 12 };

/** A good request to every endpoint, on things of the owner's that exist; each gets things of its own to change. */
export async function everyCall(club: TestClub, owner: Person, administrator: Person) {
  const machine = await club.machine(owner);
  const design = await sharedDesign(owner, { cut: cutOf(machine.id) });
  const onBench = async (path: string, body: object) =>
    (await owner.call('post', path).send(body).expect(201)).body as { id: string };
  const invite = async () => {
    const made = await administrator.call('post', '/api/invitations').send({ role: 'member' }).expect(201);
    return (made.body as InvitationMade).link.split('/').pop() ?? '';
  };
  const cut = await recorded(club, owner, design.slug);
  const photo = (await attachPhoto(owner, cut.id, await jpeg()).expect(201)).body as { id: string };
  let people = 0;
  const newMember = () => {
    people += 1;
    const given = {
      name: 'New',
      email: `new-${people}@club.example`,
      passwordHash: '',
      role: 'member' as const,
    };
    return club.deps.database.db.transaction((tx) => createMember(club.deps, tx, given));
  };
  const revision = { slug: design.slug, number: '1' };

  const inputs: Record<EndpointName, () => Input | Promise<Input>> = {
    health: () => ({}),
    openapi: () => ({}),
    settingsSchema: () => ({}),
    me: () => ({}),
    listMembers: () => ({}),
    changeMember: async () => ({
      params: { id: await newMember() },
      body: { role: 'moderator', version: 1 },
    }),
    listInvitations: () => ({}),
    invite: () => ({ body: { role: 'member', validDays: 3 } }),
    lookUpInvitation: async () => ({ params: { code: await invite() } }),
    acceptInvitation: async () => {
      people += 1;
      return {
        params: { code: await invite() },
        body: { name: 'Fern', email: `fern-${people}@club.example`, password },
      };
    },
    listNotices: () => ({}),
    readNotice: async () => {
      const given = { memberId: owner.id, kind: 'flag-raised' as const, sentence: 'Something of yours.' };
      await club.deps.database.db.transaction((tx) => insertNotice(club.deps, tx, given));
      const { items } = (await owner.call('get', '/api/notices').expect(200)).body as NoticeList;
      return { params: { id: items[0]?.id ?? '' } };
    },
    listMachines: () => ({}),
    addMachine: () => ({ body: machineOf() }),
    changeMachine: async () => ({
      params: { id: (await club.machine(owner)).id },
      body: { ...machineOf({ name: 'Other' }), version: 1 },
    }),
    removeMachine: async () => ({ params: { id: (await club.machine(owner)).id } }),
    listBits: () => ({}),
    addBit: () => ({ body: bitOf() }),
    changeBit: async () => ({
      params: { id: (await onBench('/api/bits', bitOf())).id },
      body: { ...bitOf({ flutes: 1 }), version: 1 },
    }),
    removeBit: async () => ({ params: { id: (await onBench('/api/bits', bitOf())).id } }),
    listStock: () => ({}),
    addStock: () => ({ body: stockPiece }),
    changeStock: async () => ({
      params: { id: (await onBench('/api/stock', stockPiece)).id },
      body: { ...stockPiece, widthMm: 100, version: 1 },
    }),
    removeStock: async () => ({ params: { id: (await onBench('/api/stock', stockPiece)).id } }),
    inspectDrawing: () => ({
      send: (caller) => attachDrawing(caller.call('post', endpoints.inspectDrawing.path)),
    }),
    shareDesign: () => ({ send: (caller) => share(caller, detailsOf({ title: 'Shared by a caller' })) }),
    listDesigns: () => ({ query: 'q=corner&sort=match' }),
    getDesign: () => ({ params: { slug: design.slug } }),
    changeDesign: async () => {
      const now = await owner.call('get', `/api/designs/${design.slug}`).expect(200);
      return {
        params: { slug: design.slug },
        body: { summary: 'Said anew.', version: (now.body as Design).version },
      };
    },
    withdrawDesign: async () => ({
      params: { slug: (await sharedDesign(owner, { title: 'To be withdrawn' })).slug },
    }),
    getGeometry: () => ({ params: revision }),
    takeDrawing: () => ({ params: revision }),
    takePackage: () => ({ params: revision }),
    // A bench is its owner's alone, so a caller asks about the owner's machine.
    fit: () => ({ params: revision, query: `machineId=${machine.id}` }),
    shareRevision: () => ({ send: (caller) => shareRevision(caller, design.slug) }),
    shareRemix: () => ({ send: (caller) => shareRemix(caller, design.slug) }),
    listCuts: () => ({ params: { slug: design.slug } }),
    recordCut: () => ({
      send: async (caller) => {
        const own = await caller.call('post', '/api/machines').send(machineOf());
        return record(caller, design.slug, toldOf((own.body as { id?: string }).id ?? machine.id));
      },
    }),
    getCut: () => ({ params: { id: cut.id } }),
    correctCut: async () => {
      const { id, version } = await recorded(club, owner, design.slug);
      return { params: { id }, body: { ...cutOf(machine.id), version } };
    },
    noteInService: () => ({ params: { id: cut.id }, body: { result: 'holds' } }),
    addPhoto: () => ({ send: async (caller) => attachPhoto(caller, cut.id, await jpeg()) }),
    getPhoto: () => ({ params: { id: photo.id } }),
    cutLog: () => ({ query: 'whose=club' }),
    cutLogCsv: () => ({ query: 'whose=mine' }),
    raiseFlag: () => ({ body: { designSlug: design.slug, reason: 'The hole is off.' } }),
    listFlags: () => ({}),
    decideFlag: async () => {
      const raised = await administrator.call('post', '/api/flags').send({
        designSlug: (await sharedDesign(owner, { title: 'To be decided' })).slug,
        reason: 'The hole is off.',
      });
      return {
        params: { id: (raised.body as Flag).id },
        body: { action: 'dismiss', reason: 'It is as drawn.', version: 1 },
      };
    },
    audit: () => ({}),
  };

  return {
    named: Object.keys(inputs),
    async call(name: EndpointName, caller: Person): Promise<Response> {
      const { params = {}, query, body, send } = await inputs[name]();
      if (send !== undefined) return send(caller);
      const { method, path } = endpoints[name];
      const filled = path.replace(/:(\w+)/g, (_, part: string) => params[part] ?? `no-${part}`);
      const request = caller.call(method, query === undefined ? filled : `${filled}?${query}`);
      return body === undefined ? request : request.send(body);
    },
  };
}
