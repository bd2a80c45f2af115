import { mkdtempSync, readdirSync, readFileSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { asc, eq, isNull, sql } from 'drizzle-orm';
import { pino } from 'pino';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { systemClock } from '#server/clock.ts';
import { rowsOf } from '#server/db/rows.ts';
import { design, outbox, user } from '#server/db/schema/index.ts';
import { outboxWorker } from '#server/mail/outbox-worker.ts';
import { openOutbox } from '#server/mail/send-outbox.ts';
import { fileTransport, openMailTransport, smtpTransport } from '#server/mail/transport.ts';
import type { InvitationMade } from '#shared/api/people.ts';
import { plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { decided, flagged } from './support/raise-flag.ts';
import { readMail } from './support/read-mail.ts';
import { sharedDesign } from './support/share-design.ts';
import { type LoopbackSmtp, smtpOnLoopback } from './support/smtp-on-loopback.ts';

const mailFrom = 'Millrace Makers <loft@club.example>';
let club: TestClub;
let smtp: LoopbackSmtp;
let ada: Person;
let wren: Person;
let tarn: Person;
let moss: Person;
beforeAll(async () => {
  club = await testClub();
  // Failures are part of these tests, so they are not printed.
  club.deps.log = pino({ level: 'silent' });
  ada = await club.person('Ada', 'administrator');
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  moss = await club.person('Moss', 'moderator');
});
beforeEach(async () => {
  smtp = await smtpOnLoopback();
});
afterEach(async () => {
  club.deps.clock = systemClock;
  await smtp.stop();
  await club.deliverMail();
});
afterAll(() => club.close());

const invite = async (more: object = {}) =>
  (
    await ada
      .call('post', '/api/invitations')
      .send({ role: 'moderator', email: 'fern@club.example', ...more })
      .expect(201)
  ).body as InvitationMade;
const waiting = () =>
  club.deps.database.db
    .select()
    .from(outbox)
    .where(isNull(outbox.sentAt))
    .orderBy(asc(outbox.createdAt), asc(outbox.id));
const sendBySmtp = (url = smtp.url) => openOutbox(club.deps, smtpTransport(url, mailFrom));
const later = (seconds: number) => {
  const now = club.deps.clock.now().getTime() + seconds * 1000;
  club.deps.clock = { now: () => new Date(now) };
};
let widthMm = 600;
async function decisionOn(title: string, reason: string) {
  widthMm += 1;
  const { slug, id } = await sharedDesign(wren, { title }, plateSvg(widthMm));
  await decided(moss, await flagged(tarn, slug), 'withholdRevision', reason);
  return { slug, id };
}

describe('an invitation with an address', () => {
  it('arrives by SMTP with a link that lets its reader join', async () => {
    const made = await invite();
    expect(await sendBySmtp().sendDue()).toBe(1);
    expect(smtp.received).toMatchObject([{ from: 'loft@club.example', to: ['fern@club.example'] }]);
    const mail = readMail(smtp.received[0]?.bytes ?? '');
    expect(mail.header('From')).toBe('Millrace Makers <loft@club.example>');
    expect(mail.header('To')).toBe('fern@club.example');
    expect(mail.header('Subject')).toBe('Ada invites you to Our club');
    expect(mail.text).toContain(`\n${made.link}\n`);
    expect(mail.html).toContain(`<a href="${made.link}">`);
    expect(mail.text).toContain('as a moderator');
    expect(mail.text).toContain(made.expiresAt.slice(0, 10));
    const code = /\/join\/([\w-]+)/.exec(mail.text)?.[1] ?? '';
    await club.stranger.call('get', `/api/invitations/${code}`).expect(200);
    expect(await waiting()).toEqual([]);
  });

  it('leaves its link nowhere in the database, before and after it is sent', async () => {
    const made = await invite();
    const code = made.link.split('/').pop() ?? '';
    const everything = async () => {
      const { db } = club.deps.database;
      const answer = await db.execute(sql`select
        (select json_agg(o)::text from outbox o) || (select json_agg(i)::text from invitation i) ||
        (select json_agg(a)::text from audit_entry a) ||
        coalesce((select json_agg(k)::text from idempotency_key k), '') as text`);
      return rowsOf<{ text: string }>(answer)[0]?.text ?? '';
    };
    for (const text of [await everything(), await club.deliverMail().then(everything)]) {
      expect(text).toContain(made.id);
      expect(text).not.toContain(code);
    }
  });

  it('is put in once by a request that is repeated, and not at all without an address', async () => {
    for (let count = 0; count < 2; count += 1) {
      await ada
        .call('post', '/api/invitations')
        .set('Idempotency-Key', 'mail-once')
        .send({ role: 'member', email: 'fern@club.example' })
        .expect(201);
    }
    expect(await waiting()).toHaveLength(1);
    await ada.call('post', '/api/invitations').send({ role: 'member' }).expect(201);
    expect(await waiting()).toHaveLength(1);
  });

  it('is not sent any more once its link has run out', async () => {
    await invite({ validDays: 1 });
    later(25 * 3600);
    expect(await sendBySmtp().sendDue()).toBe(0);
    expect(smtp.received).toEqual([]);
    expect(await waiting()).toEqual([]);
  });

  it.each(['fern', 'fern@club.example\r\nBcc: all@club.example', 'a@b.example, c@d.example'])(
    'to %j is refused',
    async (email) => {
      const answer = await ada.call('post', '/api/invitations').send({ role: 'member', email }).expect(422);
      expect(answer.body.errors).toMatchObject([{ path: 'email' }]);
      expect(await waiting()).toEqual([]);
    },
  );
});

describe('a decision', () => {
  it('arrives by SMTP at the owner and the flagger, with its reason as they wrote it', async () => {
    const reason = 'Wall under 2 mm & <b>thin</b>: “no”.';
    const { slug } = await decisionOn('Peg & <i>pin</i>', reason);
    expect(await sendBySmtp().sendDue()).toBe(2);
    expect(smtp.received.map(({ to }) => to[0]).sort()).toEqual([tarn.email, wren.email]);
    for (const { bytes } of smtp.received) {
      const mail = readMail(bytes);
      expect(mail.header('Subject')).toMatch(/^Decision on “Peg & <i>pin<\/i>” \(TL-\d{4}\)$/);
      expect(mail.header('Auto-Submitted')).toBe('auto-generated');
      expect(mail.text).toContain(reason);
      expect(mail.text).toContain(`http://localhost:4870/designs/${slug}`);
      expect(mail.html).toContain('Wall under 2 mm &amp; &lt;b&gt;thin&lt;/b&gt;');
      expect(mail.html).not.toMatch(/<b>|<i>|<script|<img/);
    }
  });

  it('of a moderator who flagged it too goes to the owner alone', async () => {
    widthMm += 1;
    const { slug } = await sharedDesign(wren, { title: 'In one step' }, plateSvg(widthMm));
    const body = { designSlug: slug, reason: 'Thin.', decision: { action: 'caution', reason: 'Thin.' } };
    await moss.call('post', '/api/flags').send(body).expect(201);
    expect((await club.deliverMail()).map(({ to }) => to.address)).toEqual([wren.email]);
  });

  it('cannot be given another header by a name or a title', async () => {
    const { db } = club.deps.database;
    const { id } = await decisionOn('Injected', 'Thin.');
    const bad = '\r\nBcc: all@club.example\r\n\r\n<script>';
    await db
      .update(design)
      .set({ title: `T${bad}` })
      .where(eq(design.id, id));
    const names = [`Wren${bad}`, '"x" <thief@evil.example>, y'];
    await db
      .update(user)
      .set({ name: String(names[0]) })
      .where(eq(user.id, wren.id));
    await db
      .update(user)
      .set({ name: String(names[1]) })
      .where(eq(user.id, tarn.id));
    expect(await sendBySmtp().sendDue()).toBe(2);
    expect(smtp.received.flatMap(({ to }) => to).sort()).toEqual([tarn.email, wren.email]);
    for (const { bytes, to } of smtp.received) {
      const mail = readMail(bytes);
      expect([...mail.headers.keys()].sort()).toEqual([
        'auto-submitted',
        'content-type',
        'date',
        'from',
        'message-id',
        'mime-version',
        'subject',
        'to',
      ]);
      expect(mail.headers.get('to')?.[0]).toMatch(new RegExp(`<${to[0]}>$`));
      expect(mail.html).not.toContain('<script');
    }
    await db.update(user).set({ name: 'Wren' }).where(eq(user.id, wren.id));
    await db.update(user).set({ name: 'Tarn' }).where(eq(user.id, tarn.id));
  });
});

describe('the outbox', () => {
  it('keeps what a server refuses, tries again after a while that grows, and sends it once', async () => {
    await invite();
    const sender = sendBySmtp();
    smtp.refusals.push(451, 451);
    expect(await sender.sendDue()).toBe(0);
    expect(await waiting()).toMatchObject([{ attempts: 1 }]);
    later(9);
    expect(await sender.sendDue()).toBe(0);
    expect(await waiting()).toMatchObject([{ attempts: 1 }]);
    later(2);
    expect(await sender.sendDue()).toBe(0);
    expect(await waiting()).toMatchObject([{ attempts: 2 }]);
    later(19);
    await sender.sendDue();
    expect(await waiting()).toMatchObject([{ attempts: 2 }]);
    later(2);
    expect(await sender.sendDue()).toBe(1);
    later(24 * 3600);
    expect(await sender.sendDue()).toBe(0);
    expect(smtp.received).toHaveLength(1);
  });

  it('sends the others past one that is refused', async () => {
    await invite({ email: 'first@club.example' });
    await invite({ email: 'second@club.example' });
    smtp.refusals.push(550);
    expect(await sendBySmtp().sendDue()).toBe(1);
    expect(smtp.received).toMatchObject([{ to: ['second@club.example'] }]);
    expect(await waiting()).toMatchObject([{ payload: { to: 'first@club.example' } }]);
  });

  it('loses nothing while there is no server, and a new process sends it when there is one', async () => {
    const { url } = smtp;
    await smtp.stop();
    await invite({ email: 'first@club.example' });
    await invite({ email: 'second@club.example' });
    expect(await sendBySmtp(url).sendDue()).toBe(0);
    expect((await waiting()).map(({ attempts }) => attempts)).toEqual([1, 0]);
    smtp = await smtpOnLoopback(Number(new URL(url).port));
    expect(await sendBySmtp().sendDue()).toBe(2);
    expect(smtp.received).toHaveLength(2);
  });

  it('sends a mail once when two work through it at the same time', async () => {
    for (let count = 0; count < 5; count += 1) await invite({ email: `n${count}@club.example` });
    const counts = await Promise.all([sendBySmtp().sendDue(), sendBySmtp().sendDue()]);
    expect(counts.reduce((sum, count) => sum + count, 0)).toBe(5);
    expect(smtp.received.map(({ to }) => to[0]).sort()).toEqual(
      Array.from({ length: 5 }, (_, count) => `n${count}@club.example`),
    );
  });

  it('names a mail the same each time it is tried', async () => {
    await invite();
    const [row] = await waiting();
    await sendBySmtp().sendDue();
    const { header } = readMail(smtp.received[0]?.bytes ?? '');
    expect(header('Message-ID')).toBe(`<${row?.id}@club.example>`);
  });

  it('is worked through at the start and at a nudge, and rests after the stop', async () => {
    await invite({ email: 'first@club.example' });
    const worker = outboxWorker(club.deps, smtpTransport(smtp.url, mailFrom));
    worker.nudge();
    expect(smtp.received).toEqual([]);
    let next = smtp.next();
    worker.start();
    expect((await next).to).toEqual(['first@club.example']);
    await invite({ email: 'second@club.example' });
    next = smtp.next();
    worker.nudge();
    expect((await next).to).toEqual(['second@club.example']);
    await worker.stop();
    expect(await waiting()).toEqual([]);
    await invite({ email: 'third@club.example' });
    worker.nudge();
    await worker.stop();
    expect(await waiting()).toHaveLength(1);
  });
});

describe('without an SMTP server', () => {
  let folder: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'tallyloft-mail-'));
  });
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  it('each mail is a file of its own that mail programs read, in the order of its age, for our eyes only', async () => {
    const made = await invite({ email: 'first@club.example' });
    await decisionOn('Zürcher Stück – 6 mm', `Ünder ${'a long line of words '.repeat(12)}`);
    const ids = (await waiting()).map(({ id }) => id);
    const transport = openMailTransport({ smtpUrl: undefined, mailFrom, dataDir: folder });
    expect(await openOutbox(club.deps, transport).sendDue()).toBe(3);
    const names = readdirSync(join(folder, 'outbox'));
    expect(names).toEqual(ids.map((id) => `${id}.eml`).sort());
    expect(new Set(names.map(({ length }) => length)).size).toBe(1);
    const mails = names.map((name) => {
      const path = join(folder, 'outbox', name);
      expect(statSync(path).mode & 0o777).toBe(0o600);
      return readMail(readFileSync(path));
    });
    expect(mails[0]?.text).toContain(made.link);
    expect(mails[1]?.header('Subject')).toContain('“Zürcher Stück – 6 mm”');
    expect(mails[1]?.text).toContain(`Ünder ${'a long line of words '.repeat(12)}`.trim());
    for (const name of names) {
      // RFC 5322, 2.1.1: no line over 998 octets.
      const lines = readFileSync(join(folder, 'outbox', name), 'latin1').split('\r\n');
      expect(Math.max(...lines.map(({ length }) => length))).toBeLessThanOrEqual(998);
    }
  });

  it('a mail that cannot be written waits', async () => {
    await invite();
    const transport = fileTransport('/dev/null/outbox', mailFrom);
    expect(await openOutbox(club.deps, transport).sendDue()).toBe(0);
    expect(await waiting()).toMatchObject([{ attempts: 1 }]);
  });
});
