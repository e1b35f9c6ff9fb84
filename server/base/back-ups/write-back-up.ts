import { once } from 'node:events';
import { mkdir, open, readdir, rename, rm } from 'node:fs/promises';
import path from 'node:path';
import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { createGzip } from 'node:zlib';
import type { OpenDatabase } from '@/db/database';
import { backUpName, backUpTakenAt } from '@/lib/keeping/back-up-name';
import { backUpsToKeep } from '@/lib/keeping/back-ups-to-keep';
import { copyFiles } from './copy-files';

export type BackUpPlaces = {
  /** Where the program keeps its database, its files and its signing secret. */
  dataDirectory: string;
  /** Better on another disk: a copy beside the original dies with it. */
  backUpDirectory: string;
};

/**
 * One whole copy of the embedded database, of the files beside it and of the signing secret; then the copies
 * that are no longer wanted go. A copy is whole or not there: it is written aside, flushed, then named.
 */
export async function writeBackUp(
  database: Pick<OpenDatabase, 'dump'>,
  { dataDirectory, backUpDirectory }: BackUpPlaces,
  now: Date,
): Promise<string> {
  await mkdir(backUpDirectory, { recursive: true, mode: 0o700 });
  const place = path.join(/*turbopackIgnore: true*/ backUpDirectory, backUpName(now));
  await writeAside(place, await database.dump());
  await copyFiles({ from: dataDirectory, to: backUpDirectory });
  await dropOld(backUpDirectory, now);
  return place;
}

async function writeAside(place: string, dump: Blob): Promise<void> {
  const aside = `${place}.part`;
  try {
    const file = await open(aside, 'w', 0o600);
    const stream = file.createWriteStream({ flush: true });
    await pipeline(Readable.fromWeb(dump.stream() as never), createGzip({ level: 1 }), stream);
    if (!stream.closed) await once(stream, 'close');
    await rename(aside, place);
  } catch (error) {
    await rm(aside, { force: true });
    throw error;
  }
}

async function dropOld(folder: string, now: Date): Promise<void> {
  const copies = (await readdir(folder)).flatMap((name) => {
    const takenAt = backUpTakenAt(name);
    return takenAt ? [{ name, takenAt }] : [];
  });
  const kept = backUpsToKeep(
    copies.map(({ takenAt }) => takenAt),
    now,
  ).map(backUpName);
  for (const { name } of copies) {
    if (!kept.includes(name)) await rm(path.join(/*turbopackIgnore: true*/ folder, name));
  }
}
