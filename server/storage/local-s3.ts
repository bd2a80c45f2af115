import { mkdirSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import S3rver from 's3rver';
import type { S3Config } from '#server/config.ts';

/** The local fake checks no signature, so it listens on loopback only, on a port the system picks. */
export async function startLocalS3(directory: string): Promise<{ config: S3Config; close(): Promise<void> }> {
  mkdirSync(directory, { recursive: true });
  const bucket = 'tallyloft';
  const server = new S3rver({
    address: '127.0.0.1',
    port: 0,
    silent: true,
    directory,
    configureBuckets: [{ name: bucket }],
  });
  const address = (await server.run()) as AddressInfo;
  return {
    config: {
      endpoint: `http://127.0.0.1:${address.port}`,
      bucket,
      region: 'us-east-1',
      accessKeyId: 'S3RVER',
      secretAccessKey: 'S3RVER',
    },
    close: () => server.close(),
  };
}
