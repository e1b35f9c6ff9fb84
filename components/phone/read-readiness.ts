import type { TodayVisit } from '@/lib/contracts/visits';
import type { Holder } from '@/lib/sync/holder';
import { type Readiness, readinessOf } from '@/lib/sync/readiness';
import type { CrewLanguage } from '@/lib/words/crew';
import { readDay, readFetched, readKeptStop } from './kept-store';
import { inStore } from './phone-database';

/** What of the day is in the phone's store; watched as the store changes. */
export async function readReadiness(
  { personId, mayReport }: Pick<Holder, 'personId' | 'mayReport'>,
  isProgramKept: boolean,
  language?: CrewLanguage,
): Promise<Readiness & { asOf: string | null }> {
  const fetched = await readFetched();
  const today = fetched ? await readDay(fetched.date) : null;
  const visits = today?.visits ?? [];
  const rows = await inStore(({ rooms }) =>
    rooms.filter((row) => row.personId === personId).primaryKeys(),
  );
  const readiness = readinessOf({
    isProgramKept,
    language,
    fetchedAt: fetched?.at ?? null,
    visitCount: visits.length,
    keptStopCount: mayReport ? await countStops(visits) : undefined,
    roomIds: [...new Set(visits.flatMap(({ rooms }) => rooms.map(({ id }) => id)))],
    keptRoomIds: new Set(rows),
  });
  return { ...readiness, asOf: fetched?.at ?? null };
}

async function countStops(visits: readonly TodayVisit[]): Promise<number> {
  const kept = await Promise.all(visits.map(({ id }) => readKeptStop(id)));
  return kept.filter((stop) => stop !== null).length;
}
