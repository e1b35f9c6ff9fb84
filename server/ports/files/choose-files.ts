import path from 'node:path';
import { env } from '@/server/base/env';
import type { FilesPort } from './files-port';
import { localFiles } from './local-files';
import { s3Files } from './s3-files';

const held = globalThis as typeof globalThis & { setwellFiles?: FilesPort };

/** In a bucket where one is named; else beside the database, in the data folder that a shop backs up. */
export function filesPort(): FilesPort {
  const { filesBucket, dataDirectory } = env();
  if (!filesBucket) {
    return localFiles(path.join(/*turbopackIgnore: true*/ dataDirectory, 'files'));
  }
  // One client a process: each keeps its own connections.
  held.setwellFiles ??= s3Files({ ...filesBucket, credentials: null });
  return held.setwellFiles;
}
