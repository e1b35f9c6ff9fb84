import type { OpenDatabase } from '@/db/database';
import { log, logBug } from '@/server/base/log';
import { type BackUpPlaces, writeBackUp } from './write-back-up';

const everyMs = 3_600_000;

/**
 * A copy an hour while the program runs; gives what stops it after a copy under way. A database server is
 * backed up with its own tools, so there this does nothing.
 */
export function startBackUps(database: OpenDatabase, places: BackUpPlaces): () => Promise<void> {
  if (database.kind === 'server') return async () => {};
  let underWay: Promise<void> | null = null;
  const timer = setInterval(() => {
    underWay ??= writeBackUp(database, places, new Date())
      .then(() => log('backed up'))
      .catch((error) => logBug('back-ups', error))
      .finally(() => {
        underWay = null;
      });
  }, everyMs);
  timer.unref();
  return async () => {
    clearInterval(timer);
    await underWay;
  };
}
