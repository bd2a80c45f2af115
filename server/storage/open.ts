import { join } from 'node:path';
import type { S3Config } from '#server/config.ts';
import { startLocalS3 } from './local-s3.ts';
import { type ObjectStore, objectStore } from './object-store.ts';
import { s3Client } from './s3-client.ts';

/** The S3 store of the environment, else the local fake over the data folder. */
export async function openObjectStore(s3: S3Config | undefined, dataDir: string): Promise<ObjectStore> {
  if (s3 !== undefined) {
    const client = s3Client(s3);
    return objectStore(client, s3.bucket, 's3', async () => client.destroy());
  }
  const local = await startLocalS3(join(dataDir, 'objects'));
  const client = s3Client(local.config);
  return objectStore(client, local.config.bucket, 'local', async () => {
    client.destroy();
    await local.close();
  });
}
