import { database } from '@/server/base/database';
import { logBug } from '@/server/base/log';
import { lapseAllHolds } from './lapse-holds';

const tickMs = 10_000;

/** Lets holds go when their quarter of an hour is over, so that the diaries show it; gives what stops it. */
export function startLapsing(): () => Promise<void> {
  let underWay: Promise<void> | null = null;
  const timer = setInterval(() => {
    underWay ??= database()
      .then(({ db }) => lapseAllHolds(db, new Date()))
      .catch((error) => logBug('visits/start-lapsing', error))
      .finally(() => {
        underWay = null;
      });
  }, tickMs);
  timer.unref();
  return async () => {
    clearInterval(timer);
    await underWay;
  };
}
