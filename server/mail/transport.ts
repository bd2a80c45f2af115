import { mkdir, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { createTransport, type SendMailOptions } from 'nodemailer';
import type { MailMessage } from './message.ts';

/** The way out: resolves once the mail has been handed over, and throws when it was not. */
export interface MailTransport {
  send(message: MailMessage): Promise<void>;
  close(): void;
}

/** SMTP where a server is named, else one file a mail under the data folder. */
export function openMailTransport(given: {
  smtpUrl: string | undefined;
  mailFrom: string;
  dataDir: string;
}): MailTransport {
  return given.smtpUrl === undefined
    ? fileTransport(join(given.dataDir, 'outbox'), given.mailFrom)
    : smtpTransport(given.smtpUrl, given.mailFrom);
}

/** What a header takes is given by parts, so that the encoder quotes it: a name is never an address or a line. */
function optionsOf({ id, to, subject, text, html }: MailMessage, mailFrom: string): SendMailOptions {
  const host = /@([a-z0-9.-]+)/i.exec(mailFrom)?.[1] ?? 'localhost';
  return {
    from: mailFrom,
    to: [to],
    subject,
    text,
    html,
    messageId: `<${id}@${host}>`,
    // Nobody's out-of-office should answer a program.
    headers: { 'Auto-Submitted': 'auto-generated' },
    disableFileAccess: true,
    disableUrlAccess: true,
  };
}

export function smtpTransport(smtpUrl: string, mailFrom: string): MailTransport {
  const transporter = createTransport({
    url: smtpUrl,
    connectionTimeout: 8000,
    greetingTimeout: 8000,
    socketTimeout: 15_000,
  });
  return {
    async send(message) {
      await transporter.sendMail(optionsOf(message, mailFrom));
    },
    close: () => transporter.close(),
  };
}

/** Writes each mail as RFC 5322 text; names have one width and sort by age. Links in it open doors: mode 600. */
export function fileTransport(folder: string, mailFrom: string): MailTransport {
  const transporter = createTransport({ streamTransport: true, buffer: true, newline: 'windows' });
  return {
    async send(message) {
      const { message: bytes } = await transporter.sendMail(optionsOf(message, mailFrom));
      const path = join(folder, `${message.id}.eml`);
      await mkdir(folder, { recursive: true, mode: 0o700 });
      // Under another name first: a mail that is there is whole.
      await writeFile(`${path}.part`, bytes as Buffer, { mode: 0o600 });
      await rename(`${path}.part`, path);
    },
    close: () => transporter.close(),
  };
}
