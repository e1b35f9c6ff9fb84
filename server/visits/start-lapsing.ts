import { database } from '@/server/base/database';
import { repeat } from '@/server/base/repeat';
import { lapseAllHolds } from './lapse-holds';

const tickMs = 10_000;

/** Lets holds go when their quarter of an hour is over, so that the diaries show it; gives what stops it. */
export function startLapsing(): () => Promise<void> {
  const lapsing = repeat('visits/start-lapsing', tickMs, async () =>
    lapseAllHolds((await database()).db, new Date()),
  );
  return lapsing.stop;
}
