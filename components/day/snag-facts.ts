import type { SnagView } from '@/lib/contracts/snags';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import type { Crew } from './crew-language';

/** "Part short · Kitchen, sink 36 · Bench · by Fri, Dec 4". */
export function snagFacts(snag: SnagView, crew: Crew): string {
  const { words } = crew;
  const where = [snag.roomName, snag.place].filter(Boolean).join(', ');
  return [
    words.snagKinds[snag.kind],
    where,
    words.menders[snag.mender],
    snag.dueOn ? words.dueOn(dayWords(snag.dueOn, crew)) : '',
    snag.isAfterSignOff ? words.afterSignOff : '',
  ]
    .filter(Boolean)
    .join(' · ');
}

/** "Fri, Dec 4", "vie 4 dic". */
export function dayWords(date: string, { language, region }: Crew): string {
  return formatLocalDayShort(date, { language, region });
}
