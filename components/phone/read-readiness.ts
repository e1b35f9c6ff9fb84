import { type Readiness, readinessOf } from '@/lib/sync/readiness';
import { readDay, readFetched } from './kept-store';
import { phoneDatabase } from './phone-database';

/** What of the day is in the phone's store; watched as the store changes. */
export async function readReadiness(
  personId: string,
  isProgramKept: boolean,
): Promise<Readiness & { asOf: string | null }> {
  const fetched = await readFetched();
  const today = fetched ? await readDay(fetched.date) : null;
  const visits = today?.visits ?? [];
  const rows = await phoneDatabase()
    .rooms.filter((row) => row.personId === personId)
    .primaryKeys();
  const readiness = readinessOf({
    isProgramKept,
    fetchedAt: fetched?.at ?? null,
    visitCount: visits.length,
    roomIds: [...new Set(visits.flatMap(({ rooms }) => rooms.map(({ id }) => id)))],
    keptRoomIds: new Set(rows),
  });
  return { ...readiness, asOf: fetched?.at ?? null };
}
