import path from 'node:path';
import { env } from '@/server/base/env';
import type { FilesPort } from './files-port';
import { localFiles } from './local-files';

/** Files lie beside the database, in the data folder that a shop backs up. */
export function filesPort(): FilesPort {
  return localFiles(path.join(/*turbopackIgnore: true*/ env().dataDirectory, 'files'));
}
