import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { insertNotice } from '#server/features/notices/insert-notice.ts';
import type { NoticeList } from '#shared/api/notices.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
});
afterAll(() => club.close());

const tell = (memberId: string, sentence: string, designId?: string) =>
  club.deps.database.db.transaction((tx) =>
    insertNotice(club.deps, tx, { memberId, kind: 'remixed', sentence, designId }),
  );
const noticesOf = async (person: Person) =>
  (await person.call('get', '/api/notices').expect(200)).body as NoticeList;

describe('notices', () => {
  it('are mine alone, newest first, with the design they are about', async () => {
    const { id, slug } = await sharedDesign(wren);
    await tell(wren.id, 'The first.', id);
    await tell(tarn.id, 'Not for Wren.');
    await tell(wren.id, 'The second.');
    const list = await noticesOf(wren);
    expect(list).toMatchObject({ total: 2, unread: 2, nextCursor: null });
    expect(list.items.map(({ sentence }) => sentence)).toEqual(['The second.', 'The first.']);
    expect(list.items.map(({ designSlug }) => designSlug)).toEqual([undefined, slug]);
    expect(list.items[0]).toMatchObject({ kind: 'remixed' });
  });

  it('are read once, and by nobody else', async () => {
    const [newest] = (await noticesOf(wren)).items;
    const read = (person: Person, id = newest?.id) => person.call('post', `/api/notices/${id}/read`);
    await read(tarn).expect(404);
    expect((await noticesOf(wren)).unread).toBe(2);
    await read(wren).expect(204);
    const list = await noticesOf(wren);
    expect(list.unread).toBe(1);
    const readAt = list.items[0]?.readAt;
    expect(readAt).toBeDefined();
    await read(wren).expect(204);
    expect((await noticesOf(wren)).items[0]?.readAt).toBe(readAt);
    for (const id of ['no-id', '01890000-0000-7000-8000-000000000000']) await read(wren, id).expect(404);
  });

  it('are shown a hundred at a time, and all are counted', async () => {
    const fern = await club.person('Fern');
    for (let number = 0; number < 103; number += 1) await tell(fern.id, `Number ${number}.`);
    const list = await noticesOf(fern);
    expect(list.items).toHaveLength(100);
    expect(list.items[0]?.sentence).toBe('Number 102.');
    expect(list).toMatchObject({ total: 103, unread: 103, nextCursor: null });
  });
});
