import { createHash } from 'node:crypto';
import { asc, sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditEntry } from '#server/db/schema/index.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { share, sharedDesign } from './support/share-design.ts';

let club: TestClub;
let ada: Person;
let wren: Person;
beforeAll(async () => {
  club = await testClub();
  ada = await club.person('Ada', 'administrator');
  wren = await club.person('Wren');
});
afterAll(() => club.close());

const entries = () => club.deps.database.db.select().from(auditEntry).orderBy(asc(auditEntry.number));

/** JSON with the keys of every object in order, so that a fact has one text. */
const inOrder = (value: unknown) =>
  JSON.stringify(value, (_key, item: unknown) =>
    item !== null && typeof item === 'object' && !Array.isArray(item)
      ? Object.fromEntries(Object.entries(item).sort(([a], [b]) => (a < b ? -1 : 1)))
      : item,
  );

/** Numbers of the entries whose hash is not that of what they say and of the entry before. */
async function brokenEntries(): Promise<number[]> {
  const broken: number[] = [];
  let previousHash = '0'.repeat(64);
  for (const { number, hash, ...said } of await entries()) {
    const computed = createHash('sha256')
      .update(inOrder({ ...said, at: said.at.toISOString(), previousHash }))
      .digest('hex');
    if (hash !== computed || said.previousHash !== previousHash) broken.push(number);
    previousHash = hash;
  }
  return broken;
}

describe('the audit log', () => {
  it('tells who did what to which thing, in the order it happened', async () => {
    const { id, slug, version } = await sharedDesign(wren, { title: 'Peg' });
    const at = `/api/designs/${slug}`;
    await wren.call('patch', at).send({ title: 'Pin', version }).expect(200);
    await wren.call('delete', at).expect(204);
    const made = await ada.call('post', '/api/invitations').send({ role: 'moderator' }).expect(201);
    await ada.call('patch', `/api/members/${wren.id}`).send({ role: 'moderator', version: 1 }).expect(200);
    expect((await entries()).map(({ actorId, action, subject }) => [actorId, action, subject])).toEqual([
      [wren.id, 'design.published', `design:${id}`],
      [wren.id, 'design.edited', `design:${id}`],
      [wren.id, 'design.withdrawn', `design:${id}`],
      [ada.id, 'invitation.made', `invitation:${made.body.id}`],
      [ada.id, 'member.changed', `member:${wren.id}`],
    ]);
    expect((await entries()).at(-1)?.detail).toEqual({
      role: { before: 'member', after: 'moderator' },
      suspended: { before: false, after: false },
    });
  });

  it('holds ids only: no name, address or code', async () => {
    const text = JSON.stringify(await entries());
    expect(text).not.toMatch(/@|Wren|Ada|Peg|Pin|join\//);
  });

  it('has no entry for what was refused', async () => {
    const before = await entries();
    await share(wren, { title: 'No more than this' }).expect(422);
    await ada.call('patch', `/api/members/${wren.id}`).send({ role: 'member', version: 1 }).expect(409);
    await wren.call('post', '/api/invitations').send({ role: 'administrator' }).expect(403);
    expect(await entries()).toEqual(before);
  });

  it('is a chain, also when many write at once', async () => {
    const before = (await entries()).length;
    await Promise.all(
      Array.from({ length: 6 }, () => ada.call('post', '/api/invitations').send({ role: 'member' })),
    );
    expect(await entries()).toHaveLength(before + 6);
    expect(await brokenEntries()).toEqual([]);
  });

  it('shows what was changed, taken out or put in by hand', async () => {
    const { db } = club.deps.database;
    const numbers = (await entries()).map(({ number }) => number);
    const [, second, third] = numbers;
    const byHand = async (statement: string) => {
      await db.execute(sql`alter table audit_entry disable trigger audit_entry_append_only`);
      await db.execute(sql.raw(statement));
      await db.execute(sql`alter table audit_entry enable trigger audit_entry_append_only`);
      return brokenEntries();
    };
    const [actor] = (await entries()).filter(({ number }) => number === second);
    expect(await byHand(`update audit_entry set actor_id = '${ada.id}' where number = ${second}`)).toEqual([
      second,
    ]);
    expect(
      await byHand(`update audit_entry set actor_id = '${actor?.actorId}' where number = ${second}`),
    ).toEqual([]);
    expect(await byHand(`delete from audit_entry where number = ${second}`)).toEqual([third]);
  });
});
