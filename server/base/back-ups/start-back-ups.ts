import type { OpenDatabase } from '@/db/database';
import { log } from '@/server/base/log';
import { repeat } from '@/server/base/repeat';
import { type BackUpPlaces, writeBackUp } from './write-back-up';

const everyMs = 3_600_000;

/** A copy an hour while the program runs. A database server is backed up with its own tools. */
export function startBackUps(database: OpenDatabase, places: BackUpPlaces): () => Promise<void> {
  if (database.kind === 'server') return async () => {};
  const copies = repeat('back-ups', everyMs, async () => {
    await writeBackUp(database, places, new Date());
    log('backed up');
  });
  return copies.stop;
}
