import { z } from 'zod';

const wholeNumber = (least: number, most: number) =>
  z
    .string()
    .regex(/^\d+$/, 'must be a whole number')
    .transform(Number)
    .refine((value) => value >= least && value <= most, `must be between ${least} and ${most}`);

const timeZone = z.string().refine((name) => {
  try {
    new Intl.DateTimeFormat('en', { timeZone: name });
    return true;
  } catch {
    return false;
  }
}, 'must be an IANA time zone such as Europe/London');

const url = (...protocols: string[]) =>
  z
    .string()
    .refine(
      (text) => URL.canParse(text) && protocols.includes(new URL(text).protocol),
      `must be a URL that starts with ${protocols.map((protocol) => `${protocol}//`).join(' or ')}`,
    );

const environment = z
  .object({
    PORT: wholeNumber(0, 65_535).default(4870),
    HOST: z.string().min(1, 'must not be empty').default('127.0.0.1'),
    DATA_DIR: z.string().min(1, 'must not be empty').optional(),
    DATABASE_URL: url('postgres:', 'postgresql:').optional(),
    S3_ENDPOINT: url('http:', 'https:').optional(),
    S3_BUCKET: z
      .string()
      .regex(/^[a-z0-9][a-z0-9.-]{2,62}$/, 'must be a bucket name')
      .optional(),
    S3_REGION: z.string().min(1, 'must not be empty').optional(),
    S3_ACCESS_KEY_ID: z.string().min(1, 'must not be empty').optional(),
    S3_SECRET_ACCESS_KEY: z.string().min(1, 'must not be empty').optional(),
    SMTP_URL: url('smtp:', 'smtps:').optional(),
    MAIL_FROM: z.string().min(3, 'must be a mail address').default('Tallyloft <tallyloft@localhost>'),
    APP_URL: url('http:', 'https:')
      .refine(
        (text) => !URL.canParse(text) || new URL(text).href === `${new URL(text).origin}/`,
        'must be an address without a path: the club has a whole host name for itself',
      )
      .optional(),
    AUTH_SECRET: z.string().min(32, 'must have at least 32 characters').optional(),
    TRUST_PROXY: wholeNumber(0, 10).default(0),
    CLUB_TIME_ZONE: timeZone.default('UTC'),
  })
  .superRefine((values, context) => {
    const needed = ['S3_ENDPOINT', 'S3_BUCKET', 'S3_ACCESS_KEY_ID', 'S3_SECRET_ACCESS_KEY'] as const;
    const given = needed.filter((name) => values[name] !== undefined);
    if (given.length === 0 || given.length === needed.length) return;
    for (const name of needed.filter((name) => values[name] === undefined)) {
      context.addIssue({
        code: 'custom',
        path: [name],
        message: `is needed together with ${given.join(', ')}`,
      });
    }
  });

export interface S3Config {
  endpoint: string;
  bucket: string;
  region: string;
  accessKeyId: string;
  secretAccessKey: string;
}

export interface Config {
  port: number;
  host: string;
  dataDir: string;
  databaseUrl: string | undefined;
  s3: S3Config | undefined;
  smtpUrl: string | undefined;
  mailFrom: string;
  appUrl: string | undefined;
  authSecret: string | undefined;
  trustProxyHops: number;
  clubTimeZone: string;
}

/** A wrong environment: one line that names the variable. */
export class ConfigError extends Error {}

/** Reads and checks the environment, once. Empty values count as absent. */
export function readConfig(env: Record<string, string | undefined>, defaultDataDir: string): Config {
  const given = Object.fromEntries(
    Object.entries(env).filter(([, value]) => value !== '' && value !== undefined),
  );
  const result = environment.safeParse(given);
  if (!result.success) {
    const lines = result.error.issues.map((issue) => `${issue.path.join('.')} ${issue.message}`);
    throw new ConfigError(lines.join('; '));
  }
  const values = result.data;
  const s3 =
    values.S3_ENDPOINT && values.S3_BUCKET && values.S3_ACCESS_KEY_ID && values.S3_SECRET_ACCESS_KEY
      ? {
          endpoint: values.S3_ENDPOINT,
          bucket: values.S3_BUCKET,
          region: values.S3_REGION ?? 'us-east-1',
          accessKeyId: values.S3_ACCESS_KEY_ID,
          secretAccessKey: values.S3_SECRET_ACCESS_KEY,
        }
      : undefined;
  return {
    port: values.PORT,
    host: values.HOST,
    dataDir: values.DATA_DIR ?? defaultDataDir,
    databaseUrl: values.DATABASE_URL,
    s3,
    smtpUrl: values.SMTP_URL,
    mailFrom: values.MAIL_FROM,
    // As browsers send it in Origin: no path, small letters, no port that goes without saying.
    appUrl: values.APP_URL === undefined ? undefined : new URL(values.APP_URL).origin,
    authSecret: values.AUTH_SECRET,
    trustProxyHops: values.TRUST_PROXY,
    clubTimeZone: values.CLUB_TIME_ZONE,
  };
}
