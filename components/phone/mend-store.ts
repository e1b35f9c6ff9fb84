import type { CrewSnag } from '@/lib/contracts/snags';
import type { TodayView } from '@/lib/contracts/visits';
import { type StopSnags, snagsToMend } from '@/lib/days/snags-to-mend';
import type { Holder } from '@/lib/sync/holder';
import { readDays } from './kept-store';
import { localToday } from './local-today';
import { readQueue } from './queue-store';
import { readStop } from './stop-store';

/** What the holder's crews have to mend across jobs, with what was found and closed here, sent or not. */
export async function readSnagsToMend(shown: TodayView, holder: Holder): Promise<CrewSnag[]> {
  const queue = await readQueue();
  const days = [shown, ...(await readDays())];
  const places = [
    ...shown.snags,
    ...days.flatMap(({ date, visits }) =>
      visits.map((visit) => ({ ...visit, visitId: visit.id, nextOn: date })),
    ),
  ];
  const stops: StopSnags[] = [];
  for (const { visitId, jobId, customerName, street, town, nextOn } of places) {
    if (stops.some((stop) => stop.visitId === visitId)) continue;
    const stop = await readStop(visitId, holder, null);
    if (!stop) continue;
    stops.push({ visitId, jobId, customerName, street, town, nextOn, snags: stop.snags });
  }
  const closedIds = queue.flatMap(({ work, personId }) =>
    work.kind === 'event' && work.event.what === 'close-snag' && personId === holder.personId
      ? [work.event.snagId]
      : [],
  );
  return snagsToMend({ told: shown.snags, stops, closedIds, today: localToday() });
}
