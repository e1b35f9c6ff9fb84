import path from 'node:path';
import { env } from '@/server/base/env';
import type { FilesPort } from './files-port';
import { localFiles } from './local-files';

const held = globalThis as typeof globalThis & { setwellFiles?: Promise<FilesPort> };

/** In a bucket where one is named; else beside the database, in the data folder that a shop backs up. */
export async function filesPort(): Promise<FilesPort> {
  const { filesBucket, dataDirectory } = env();
  if (!filesBucket) {
    return localFiles(path.join(/*turbopackIgnore: true*/ dataDirectory, 'files'));
  }
  // One client a process: each keeps its own connections. Its library is heavy, and loaded where there is a bucket.
  held.setwellFiles ??= import('./s3-files').then(({ s3Files }) =>
    s3Files({ ...filesBucket, credentials: null }),
  );
  return held.setwellFiles;
}
