import { S3Client } from '@aws-sdk/client-s3';
import type { S3Config } from '#server/config.ts';

// The SDK is pinned to a version that runs on Node 20; its notice about later versions is for us, not for
// the person who starts a club's server.
process.env['AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED'] ??= 'true';

export function s3Client(config: S3Config): S3Client {
  return new S3Client({
    endpoint: config.endpoint,
    region: config.region,
    credentials: { accessKeyId: config.accessKeyId, secretAccessKey: config.secretAccessKey },
    forcePathStyle: true,
    // With the client's own defaults a store that knows no trailing checksums keeps the framing in the object.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  });
}
