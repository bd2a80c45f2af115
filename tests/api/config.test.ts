import { describe, expect, it } from 'vitest';
import { ConfigError, readConfig } from '#server/config.ts';

const refusal = (env: Record<string, string>): string => {
  try {
    readConfig(env, '.data/club');
  } catch (error) {
    expect(error).toBeInstanceOf(ConfigError);
    return (error as ConfigError).message;
  }
  return 'it was taken';
};

const s3 = {
  S3_ENDPOINT: 'https://store.example',
  S3_BUCKET: 'tallyloft',
  S3_ACCESS_KEY_ID: 'key',
  S3_SECRET_ACCESS_KEY: 'secret',
};

describe('the environment', () => {
  it('may be empty: the defaults of the contract stand', () => {
    expect(readConfig({ PORT: '', APP_URL: '', UNRELATED: 'x' }, '.data/club')).toEqual({
      port: 4870,
      host: '127.0.0.1',
      dataDir: '.data/club',
      databaseUrl: undefined,
      s3: undefined,
      smtpUrl: undefined,
      mailFrom: 'Tallyloft <tallyloft@localhost>',
      appUrl: undefined,
      authSecret: undefined,
      trustProxyHops: 0,
      clubTimeZone: 'UTC',
    });
  });

  it('is read as it stands', () => {
    const env = {
      PORT: '0',
      HOST: '::1',
      DATA_DIR: '/srv/club',
      DATABASE_URL: 'postgresql://club@db/club',
      ...s3,
      S3_REGION: 'eu-north-1',
      SMTP_URL: 'smtps://mail.example:465',
      MAIL_FROM: 'Club <club@mail.example>',
      APP_URL: 'https://Loft.example:443/',
      AUTH_SECRET: 'x'.repeat(32),
      TRUST_PROXY: '2',
      CLUB_TIME_ZONE: 'Europe/Paris',
    };
    expect(readConfig(env, '.data/club')).toEqual({
      port: 0,
      host: '::1',
      dataDir: '/srv/club',
      databaseUrl: 'postgresql://club@db/club',
      s3: {
        endpoint: 'https://store.example',
        bucket: 'tallyloft',
        region: 'eu-north-1',
        accessKeyId: 'key',
        secretAccessKey: 'secret',
      },
      smtpUrl: 'smtps://mail.example:465',
      mailFrom: 'Club <club@mail.example>',
      appUrl: 'https://loft.example',
      authSecret: 'x'.repeat(32),
      trustProxyHops: 2,
      clubTimeZone: 'Europe/Paris',
    });
  });

  it.each([
    ['PORT', '70000'],
    ['PORT', '-1'],
    ['PORT', 'http'],
    ['DATABASE_URL', 'mysql://db/club'],
    ['DATABASE_URL', 'club.db'],
    ['SMTP_URL', 'mail.example'],
    ['MAIL_FROM', 'x'],
    ['APP_URL', 'loft.example'],
    ['APP_URL', 'ftp://loft.example'],
    ['APP_URL', 'https://loft.example/below'],
    ['AUTH_SECRET', 'too short'],
    ['TRUST_PROXY', 'true'],
    ['TRUST_PROXY', '11'],
    ['CLUB_TIME_ZONE', 'Mars/Olympus'],
  ])('with a wrong %s (%s) is refused in one line that names it', (name, value) => {
    const message = refusal({ [name]: value });
    expect(message).toMatch(new RegExp(`^${name} (must|needs)`));
    expect(message).not.toContain('\n');
    // A secret that is too short is still a secret.
    if (name === 'AUTH_SECRET') expect(message).not.toContain(value);
  });

  it('names every wrong variable at once', () => {
    const message = refusal({ PORT: 'x', TRUST_PROXY: 'x', APP_URL: 'x' });
    for (const name of ['PORT', 'TRUST_PROXY', 'APP_URL']) expect(message).toContain(name);
  });

  it.each(Object.keys(s3) as (keyof typeof s3)[])('with a store that lacks %s names it', (name) => {
    const { [name]: _left, ...rest } = s3;
    expect(refusal(rest)).toMatch(new RegExp(`^${name} is needed together with`));
  });

  it.each([
    ['S3_ENDPOINT', 'store.example'],
    ['S3_BUCKET', 'No Bucket'],
  ])('with a wrong %s names it', (name, value) => {
    expect(refusal({ ...s3, [name]: value })).toMatch(new RegExp(`^${name} must`));
  });
});
