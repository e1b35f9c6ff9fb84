import type { SnagView } from '@/lib/contracts/snags';
import type { Crew } from './crew-language';

/** "Part short · Kitchen, sink 36 · Bench · by Fri, Dec 4". */
export function snagFacts(snag: SnagView, { words }: Crew): string {
  const where = [snag.roomName, snag.place].filter(Boolean).join(', ');
  return [
    words.snagKinds[snag.kind],
    where,
    words.menders[snag.mender],
    snag.dueOn ? words.dueOn(snag.dueWords ?? snag.dueOn) : '',
    snag.isAfterSignOff ? words.afterSignOff : '',
  ]
    .filter(Boolean)
    .join(' · ');
}
