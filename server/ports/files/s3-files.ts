import {
  DeleteObjectCommand,
  GetObjectCommand,
  NoSuchKey,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import type { FilesPort } from './files-port';

export type S3Place = {
  bucket: string;
  region: string;
  /** Another provider of the same protocol; null: the region's own. */
  endpoint: string | null;
  /** Null: from where the SDK looks by itself (environment, instance role). */
  credentials: { accessKeyId: string; secretAccessKey: string } | null;
};

/** Files in a bucket of S3 or of a store that speaks its protocol. */
export function s3Files({ bucket, region, endpoint, credentials }: S3Place): FilesPort {
  const client = new S3Client({
    region,
    ...(endpoint ? { endpoint, forcePathStyle: true } : {}),
    ...(credentials ? { credentials } : {}),
    maxAttempts: 3,
  });
  return {
    async put(key, bytes) {
      await client.send(new PutObjectCommand({ Bucket: bucket, Key: key, Body: bytes }));
    },
    async remove(key) {
      await client.send(new DeleteObjectCommand({ Bucket: bucket, Key: key }));
    },
    async read(key) {
      try {
        const { Body } = await client.send(new GetObjectCommand({ Bucket: bucket, Key: key }));
        return Body ? (Body.transformToWebStream() as ReadableStream<Uint8Array>) : null;
      } catch (error) {
        if (error instanceof NoSuchKey) return null;
        throw error;
      }
    },
  };
}
