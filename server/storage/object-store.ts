import { createHash } from 'node:crypto';
import type { Readable } from 'node:stream';
import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadObjectCommand,
  PutObjectCommand,
  type S3Client,
} from '@aws-sdk/client-s3';

/** What was stored, as it goes into the row. */
export interface StoredObject {
  key: string;
  sha256: string;
  sizeBytes: number;
  contentType: string;
}

export interface ObjectStore {
  readonly kind: 'local' | 's3';
  /** Writes once, under a key that was never used, and looks whether it is there. */
  put(key: string, bytes: Buffer, contentType: string): Promise<StoredObject>;
  read(key: string): Promise<Buffer>;
  stream(key: string): Promise<Readable>;
  sizeOf(key: string): Promise<number | null>;
  remove(key: string): Promise<void>;
  close(): Promise<void>;
}

/** Keys are made by us only: nothing a client says becomes part of one. */
const keyPattern = /^(originals|drawings|photos)\/[a-z0-9-]+\.(svg|webp)$/;

export function objectStore(
  client: S3Client,
  bucket: string,
  kind: 'local' | 's3',
  close: () => Promise<void>,
): ObjectStore {
  const at = (key: string) => {
    if (!keyPattern.test(key)) throw new Error(`not a key of ours: ${key}`);
    return { Bucket: bucket, Key: key };
  };
  const get = async (key: string) => {
    const answer = await client.send(new GetObjectCommand(at(key)));
    return answer.Body as Readable & { transformToByteArray(): Promise<Uint8Array> };
  };
  const store: ObjectStore = {
    kind,
    async put(key, bytes, contentType) {
      const sha256 = createHash('sha256').update(bytes).digest('hex');
      await client.send(
        new PutObjectCommand({ ...at(key), Body: bytes, ContentType: contentType, Metadata: { sha256 } }),
      );
      // The local fake answers before the bytes are flushed, so the object is looked at before a row points to it.
      const size = await store.sizeOf(key);
      if (size !== bytes.length)
        throw new Error(`object ${key} has ${size} bytes instead of ${bytes.length}`);
      return { key, sha256, sizeBytes: bytes.length, contentType };
    },
    read: async (key) => Buffer.from(await (await get(key)).transformToByteArray()),
    stream: get,
    async sizeOf(key) {
      try {
        return (await client.send(new HeadObjectCommand(at(key)))).ContentLength ?? null;
      } catch (error) {
        if ((error as { $metadata?: { httpStatusCode?: number } }).$metadata?.httpStatusCode === 404)
          return null;
        throw error;
      }
    },
    async remove(key) {
      await client.send(new DeleteObjectCommand(at(key)));
    },
    close,
  };
  return store;
}
