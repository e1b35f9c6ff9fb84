import { constants } from 'node:fs';
import { mkdir, open, rename, rm } from 'node:fs/promises';
import path from 'node:path';
import { Readable } from 'node:stream';
import type { FilesPort } from './files-port';

/** Letters, digits, dashes and single slashes: no key leads out of the folder. */
const keyShape = /^[\w-]+(?:\/[\w-]+)*\.[a-z]+$/;

/** Files in a folder of this machine. A file is whole or not there: it is written aside, flushed, then named. */
export function localFiles(folder: string): FilesPort {
  const placeOf = (key: string): string => {
    if (!keyShape.test(key)) throw new Error(`not a key of a file: ${key}`);
    return path.join(/*turbopackIgnore: true*/ folder, key);
  };
  return {
    async put(key, bytes) {
      const place = placeOf(key);
      await mkdir(path.dirname(place), { recursive: true });
      const aside = `${place}.${process.pid}-${counter()}.part`;
      try {
        const file = await open(aside, 'wx', 0o600);
        try {
          await file.writeFile(bytes);
          await file.sync();
        } finally {
          await file.close();
        }
        await rename(aside, place);
      } catch (error) {
        await rm(aside, { force: true });
        throw error;
      }
    },
    async remove(key) {
      await rm(placeOf(key), { force: true });
    },
    async read(key) {
      try {
        const file = await open(placeOf(key), constants.O_RDONLY);
        return Readable.toWeb(file.createReadStream()) as ReadableStream<Uint8Array>;
      } catch (error) {
        if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null;
        throw error;
      }
    },
  };
}

let count = 0;
/** Two requests that put one key write aside under different names. */
function counter(): number {
  count += 1;
  return count;
}
