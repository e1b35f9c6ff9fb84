import type { WallBookView } from '@/lib/contracts/rooms';
import type { AccessCodeView, StopView } from '@/lib/contracts/stops';
import type { TodayView } from '@/lib/contracts/visits';
import { newerStop } from '@/lib/days/stop-on-phone';
import { furtherVisit, visitAfter } from '@/lib/days/visit-on-phone';
import type { Holder } from '@/lib/sync/holder';
import type { QueuedWork } from '@/lib/sync/queued';
import { inStore } from './phone-database';
import type { PhoneDatabase } from './phone-tables';

/** When the day was last fetched whole, and which day that was. */
export type Fetched = { at: string; date: string };

const holderKey = 'holder';
const fetchedKey = 'fetched';
const dayKey = (date: string): string => `day:${date}`;
const stopKey = (visitId: string): string => `stop:${visitId}`;
const codeKey = (visitId: string): string => `code:${visitId}`;
const blankKey = (jobId: string): string => `blank:${jobId}`;

/** Who holds the phone from now on. What the office showed somebody else is gone first; nothing unsent is. */
export async function keepHolder(holder: Holder): Promise<void> {
  await inStore((database) => {
    const { kept, rooms } = database;
    return database.transaction('rw', kept, rooms, async () => {
      const before = await read<Holder>(holderKey);
      if (before?.personId !== holder.personId) await kept.clear();
      await rooms.filter(({ personId }) => personId !== holder.personId).delete();
      await kept.put({ key: holderKey, value: holder });
    });
  });
}

export function readHolder(): Promise<Holder | null> {
  return read<Holder>(holderKey);
}

export type DayFetched = {
  personId: string;
  days: TodayView[];
  blanks: WallBookView[];
  stops: StopView[];
  /** Of today's sites; a code is kept for its day and no longer. */
  codes: AccessCodeView[];
  at: string;
};

/** The day as the office showed it, in place of the one before; nothing when somebody else holds the phone by now. */
export async function keepDays(fetched: DayFetched): Promise<void> {
  const { personId, days, blanks, stops, codes, at } = fetched;
  await inKept(async (kept) => {
    const holder = await read<Holder>(holderKey);
    const [today] = days;
    if (holder?.personId !== personId || !today) return;
    const known = (await readDays()).flatMap(({ visits }) => visits);
    const keptOf = (visitId: string) => known.find(({ id }) => id === visitId) ?? null;
    const newer: StopView[] = [];
    for (const stop of stops) newer.push(newerStop(await readKeptStop(stop.visitId), stop));
    await kept.clear();
    await kept.bulkPut([
      { key: holderKey, value: holder },
      { key: fetchedKey, value: { at, date: today.date } satisfies Fetched },
      ...days.map((day) => {
        const visits = day.visits.map((visit) => furtherVisit(visit, keptOf(visit.id)));
        return { key: dayKey(day.date), value: { ...day, visits } };
      }),
      ...newer.map((stop) => ({ key: stopKey(stop.visitId), value: stop })),
      ...codes.map((code) => ({ key: codeKey(code.visitId), value: code })),
      ...blanks.map((blank) => ({ key: blankKey(blank.jobId), value: blank })),
    ]);
  });
}

export function readFetched(): Promise<Fetched | null> {
  return read<Fetched>(fetchedKey);
}

export async function readDay(date: string): Promise<TodayView | null> {
  const day = await read<TodayView>(dayKey(date));
  return day && withSnags(day);
}

/** A day that an older program kept has none. */
const withSnags = (day: TodayView): TodayView => ({ ...day, snags: day.snags ?? [] });

/** Every day that is kept, in order. */
export async function readDays(): Promise<TodayView[]> {
  const rows = await inStore(({ kept }) => kept.where('key').startsWith(dayKey('')).toArray());
  return rows.map(({ value }) => withSnags(value as TodayView));
}

/** Within the transaction of what changed it: the days as they are after what the office has taken. */
export async function putVisitsAfter(works: readonly QueuedWork[]): Promise<void> {
  for (const day of await readDays()) {
    const value = { ...day, visits: day.visits.map((visit) => visitAfter(visit, works)) };
    await inStore(({ kept }) => kept.put({ key: dayKey(day.date), value }));
  }
}

/** An empty book for a room of this job that nobody has drawn yet. */
export function readBlank(jobId: string): Promise<WallBookView | null> {
  return read<WallBookView>(blankKey(jobId));
}

/** A stop as the office last showed it, with what it has taken since. */
export function readKeptStop(visitId: string): Promise<StopView | null> {
  return read<StopView>(stopKey(visitId));
}

/** Within the transaction of what changed it. */
export async function putStop(stop: StopView): Promise<void> {
  await inStore(({ kept }) => kept.put({ key: stopKey(stop.visitId), value: stop }));
}

/** Shown by the office just now; nothing when somebody else holds the phone by now. */
export async function keepStop(stop: StopView, personId: string): Promise<void> {
  await inKept(async (kept) => {
    const holder = await read<Holder>(holderKey);
    if (holder && holder.personId !== personId) return;
    const value = newerStop(await readKeptStop(stop.visitId), stop);
    await kept.put({ key: stopKey(stop.visitId), value });
  });
}

/** The access code of a stop, on its day; on any other day it is gone. */
export async function readCode(visitId: string, date: string): Promise<string | null> {
  const code = await read<AccessCodeView>(codeKey(visitId));
  return code?.date === date ? code.code : null;
}

/** Codes of days that are past leave the phone. */
export async function dropPastCodes(date: string): Promise<void> {
  await inStore(({ kept }) =>
    kept
      .where('key')
      .startsWith(codeKey(''))
      .filter(({ value }) => (value as AccessCodeView).date !== date)
      .delete(),
  );
}

/** The writer of each key knows its shape, and the store is cleared when the program's shapes change. */
async function read<Value>(key: string): Promise<Value | null> {
  const row = await inStore(({ kept }) => kept.get(key));
  return (row?.value as Value | undefined) ?? null;
}

/** One transaction over what is kept. */
function inKept(work: (kept: PhoneDatabase['kept']) => Promise<void>): Promise<void> {
  return inStore((database) =>
    database.transaction('rw', database.kept, () => work(database.kept)),
  );
}
