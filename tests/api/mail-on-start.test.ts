import { once } from 'node:events';
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, watch } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pino } from 'pino';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readConfig } from '#server/config.ts';
import { firstAdministratorLink } from '#server/features/people/first-administrator.ts';
import { makeInvitation } from '#server/features/people/invitations.ts';
import { type Running, start } from '#server/start.ts';
import { readMail } from './support/read-mail.ts';

let folder: string;
let running: Running;
const startHere = () =>
  start(readConfig({ PORT: '0', DATA_DIR: folder }, folder), pino({ level: 'silent' }), {
    serveClient: () => undefined,
  });
beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'tallyloft-start-'));
  mkdirSync(join(folder, 'outbox'));
  running = await startHere();
});
afterAll(async () => {
  await running.close();
  rmSync(folder, { recursive: true, force: true });
});

const mails = () => readdirSync(join(folder, 'outbox')).filter((name) => name.endsWith('.eml'));

/** Waits until there are so many mails: the folder itself says when something comes. */
async function mailsToBe(count: number): Promise<string[]> {
  const watcher = watch(join(folder, 'outbox'));
  while (mails().length < count) await once(watcher, 'change');
  watcher.close();
  return mails().sort();
}

const put = (email: string) =>
  running.deps.database.db.transaction((tx) =>
    makeInvitation(running.deps, tx, { role: 'member', note: '', validDays: 3, createdBy: null, email }),
  );

describe('a started server', () => {
  it('sends at a nudge, and after the next start what was left at a stop', async () => {
    expect(await firstAdministratorLink(running.deps)).not.toBeNull();
    await put('first@club.example');
    running.deps.mail.nudge();
    const [first] = await mailsToBe(1);
    const mail = readMail(readFileSync(join(folder, 'outbox', String(first))));
    expect(mail.header('From')).toBe('Tallyloft <tallyloft@localhost>');
    expect(mail.text).toContain(`${running.url.replace('127.0.0.1', 'localhost')}/join/`);
    await put('second@club.example');
    await running.close();
    expect(mails()).toHaveLength(1);
    running = await startHere();
    const both = await mailsToBe(2);
    expect(readMail(readFileSync(join(folder, 'outbox', String(both[1])))).header('To')).toBe(
      'second@club.example',
    );
  });
});
