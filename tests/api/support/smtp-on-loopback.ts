import { once } from 'node:events';
import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';

export interface ReceivedMail {
  from: string;
  to: string[];
  bytes: Buffer;
}

export interface LoopbackSmtp {
  url: string;
  received: ReceivedMail[];
  /** Resolves with the next mail that comes. */
  next(): Promise<ReceivedMail>;
  /** Answers given instead of taking a mail, one for each, then none. */
  refusals: number[];
  stop(): Promise<void>;
}

/** A real SMTP server on loopback that takes every mail, or refuses as it is told. */
export async function smtpOnLoopback(port = 0): Promise<LoopbackSmtp> {
  const received: ReceivedMail[] = [];
  const refusals: number[] = [];
  const waiting: ((mail: ReceivedMail) => void)[] = [];
  const server = new SMTPServer({
    disabledCommands: ['STARTTLS', 'AUTH'],
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const refusal = refusals.shift();
        if (refusal !== undefined) {
          done(Object.assign(new Error('not now'), { responseCode: refusal }));
          return;
        }
        const { mailFrom, rcptTo } = session.envelope;
        const mail = {
          from: mailFrom === false ? '' : mailFrom.address,
          to: rcptTo.map(({ address }) => address),
          bytes: Buffer.concat(chunks),
        };
        received.push(mail);
        done();
        waiting.shift()?.(mail);
      });
    },
  });
  server.on('error', () => undefined);
  const listening = server.listen(port, '127.0.0.1');
  await once(listening, 'listening');
  const bound = (listening.address() as AddressInfo).port;
  return {
    url: `smtp://127.0.0.1:${bound}`,
    received,
    refusals,
    next: () => new Promise((resolve) => waiting.push(resolve)),
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  };
}
