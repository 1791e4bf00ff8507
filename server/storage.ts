import {
  DeleteObjectCommand,
  GetObjectCommand,
  ListObjectsV2Command,
  NoSuchKey,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { env } from './env';

// The version of Node.js is chosen in package.json; a notice at every start helps nobody.
process.env['AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED'] ??= 'true';

let client: S3Client | undefined;

function s3(): S3Client {
  client ??= new S3Client({
    region: env.S3_REGION,
    // Other stores than Amazon's do not know the newer checksums.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
    ...(env.S3_ENDPOINT === undefined ? {} : { endpoint: env.S3_ENDPOINT, forcePathStyle: true }),
    ...(process.env['AWS_ACCESS_KEY_ID'] === undefined && env.NODE_ENV !== 'production'
      ? { credentials: { accessKeyId: 'local', secretAccessKey: 'local' } }
      : {}),
  });
  return client;
}

/** Keeps bytes under a key; the same key again replaces them. */
export async function putObject(key: string, body: Uint8Array, contentType: string): Promise<void> {
  await s3().send(
    new PutObjectCommand({
      Bucket: env.S3_BUCKET,
      Key: key,
      Body: body,
      ContentType: contentType,
    }),
  );
}

/** The bytes of a key, or `null` where there is none. */
export async function getObject(key: string): Promise<Buffer | null> {
  try {
    const { Body } = await s3().send(new GetObjectCommand({ Bucket: env.S3_BUCKET, Key: key }));
    return Body === undefined ? null : Buffer.from(await Body.transformToByteArray());
  } catch (error) {
    if (error instanceof NoSuchKey) return null;
    throw error;
  }
}

export async function deleteObject(key: string): Promise<void> {
  await s3().send(new DeleteObjectCommand({ Bucket: env.S3_BUCKET, Key: key }));
}

/** Every key, page by page: for the backup. */
export async function* listObjects(): AsyncGenerator<string> {
  let token: string | undefined;
  do {
    const page = await s3().send(
      new ListObjectsV2Command({ Bucket: env.S3_BUCKET, ContinuationToken: token }),
    );
    for (const { Key } of page.Contents ?? []) if (Key !== undefined) yield Key;
    token = page.NextContinuationToken;
  } while (token !== undefined);
}
