import type { TodayVisit } from '@/lib/contracts/visits';
import { furtherVisit, isOver, visitAfter, waitingWork } from '@/lib/days/visit-on-phone';
import { readDays } from './kept-store';
import { readQueue } from './queue-store';

/** A visit as it was drawn, and over it what the phone has kept of it and what was tapped here since. */
export async function readVisitHere(drawn: TodayVisit): Promise<TodayVisit> {
  const kept = (await readDays()).flatMap(({ visits }) => visits);
  const same = kept.find(({ id }) => id === drawn.id) ?? null;
  return visitAfter(furtherVisit(drawn, same), waitingWork(await readQueue()));
}

/** Where to go after a stop that is over; undefined while it is not. Null: it was the last of its day. */
export async function readNextVisit(drawn: TodayVisit): Promise<TodayVisit | null | undefined> {
  if (!isOver(await readVisitHere(drawn))) return undefined;
  const days = await readDays();
  const day = days.find(({ visits }) => visits.some(({ id }) => id === drawn.id));
  const at = day?.visits.findIndex(({ id }) => id === drawn.id) ?? -1;
  const taps = waitingWork(await readQueue());
  return day?.visits.slice(at + 1).find((one) => !isOver(visitAfter(one, taps))) ?? null;
}
