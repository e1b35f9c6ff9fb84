import type { WallBookView } from '@/lib/contracts/rooms';
import type { AccessCodeView, StopView } from '@/lib/contracts/stops';
import type { TodayView } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';
import type { Holder } from '@/lib/sync/holder';
import { addDays } from '@/lib/time/civil';
import { getJson } from './get-json';
import { dropPastCodes, keepDays, readFetched } from './kept-store';
import { localToday } from './local-today';
import { newId } from './new-id';
import { rememberRoom } from './room-store';

/** What was fetched a moment ago need not be fetched again. */
const FRESH_MS = 5 * 60_000;

/**
 * While a phone page is open, keeps on the phone what the day needs without a signal: today's and
 * tomorrow's visits with their stops, those of the snags to mend, the wall books of their rooms, and an empty book for each job. Runs when the page
 * opens, when the signal is back, and when the page is looked at again, until the returned function is called.
 */
export function startFetchingAhead(holder: Holder): () => void {
  let isStopped = false;
  let isRunning = false;
  const run = async () => {
    if (isStopped || isRunning || document.visibilityState !== 'visible') return;
    isRunning = true;
    try {
      await dropPastCodes(localToday());
      const fetched = await readFetched();
      const ageMs = fetched ? Date.now() - Date.parse(fetched.at) : Number.POSITIVE_INFINITY;
      if (ageMs >= FRESH_MS) await fetchAhead(holder);
    } catch (cause) {
      // A store that fails here fails the screens too, and they say so.
      console.warn('setwell: could not fetch ahead', cause);
    }
    isRunning = false;
  };
  void run();
  window.addEventListener('online', run);
  document.addEventListener('visibilitychange', run);
  return () => {
    isStopped = true;
    window.removeEventListener('online', run);
    document.removeEventListener('visibilitychange', run);
  };
}

/** True when everything came. What came is kept, whether or not the rest did. */
export async function fetchAhead({ personId, mayMeasure, mayReport }: Holder): Promise<boolean> {
  const today = await getJson<TodayView>(apiPaths.today());
  if (!today) return false;
  const tomorrow = await getJson<TodayView>(apiPaths.today(addDays(today.date, 1)));
  const days = tomorrow ? [today, tomorrow] : [today];
  const visits = mayMeasure ? days.flatMap((day) => day.visits) : [];
  let isWhole = tomorrow !== null;
  const stops: StopView[] = [];
  const codes: AccessCodeView[] = [];
  // A snag is mended on a later visit too: its stop is kept with those of the day.
  const stopIds = new Set([
    ...days.flatMap((day) => day.visits.map(({ id }) => id)),
    ...today.snags.map(({ visitId }) => visitId),
  ]);
  for (const id of mayReport ? stopIds : []) {
    const stop = await getJson<StopView>(apiPaths.stop(id));
    if (stop) stops.push(stop);
    else isWhole = false;
    const code = stop?.mayTakeCode
      ? await getJson<AccessCodeView>(apiPaths.accessCode(id), 'POST')
      : null;
    if (code) codes.push(code);
  }
  const blanks: WallBookView[] = [];
  for (const jobId of new Set(visits.map((visit) => visit.jobId))) {
    const blank = await getJson<WallBookView>(apiPaths.blankBook(jobId, newId()));
    if (blank) blanks.push(blank);
    else isWhole = false;
  }
  for (const roomId of new Set(visits.flatMap(({ rooms }) => rooms.map(({ id }) => id)))) {
    const book = await getJson<WallBookView>(apiPaths.room(roomId));
    if (book) await rememberRoom(book, personId);
    else isWhole = false;
  }
  await keepDays({ personId, days, blanks, stops, codes, at: new Date().toISOString() });
  return isWhole;
}
