/** The shop is late: when the cabinets are ready then, and where a visit that cannot stay would best go. */
import { addDays, daysBetween, type LocalDate, type LocalTime, weekdayOf } from '@/lib/time/civil';
import { toLocal } from '@/lib/time/local-moment';
import { addWorkdays } from '@/lib/time/workdays';
import type { Zone } from '@/lib/time/zones';
import type { GateInput, JobFacts } from './gate-input';
import type { FoundOpening } from './openings/opening-input';

export type ReadyDays = { was: LocalDate; becomes: LocalDate };

/**
 * When the cabinets of a job were to be ready and will be, some working days later: counted from the day the bench
 * said, else from release and lead time; a day already past is counted from today. Null where nothing is released.
 * Example: ready on Thursday 2026-05-14, three days late, Monday to Friday: Tuesday 2026-05-19.
 */
export function slippedReadyDay(
  facts: Pick<JobFacts, 'readyOn' | 'release'>,
  days: number,
  { rules, today }: Pick<GateInput, 'rules' | 'today'>,
): ReadyDays | null {
  const { readyOn, release } = facts;
  const was =
    readyOn ?? (release ? addWorkdays(release.releasedOn, rules.leadWorkdays, rules) : null);
  if (was === null) return null;
  const becomes = addWorkdays(was < today ? today : was, days, rules);
  return becomes === null ? null : { was, becomes };
}

/** Where a visit stands that has to move. */
export type SlippedVisit = { crewId: string; date: LocalDate; time: LocalTime };

/** Past so many days after the first time that works, the same crew or weekday is worth no more waiting. */
const worthWaitingDays = 14;

/**
 * The time that changes least for the customer: of the times within two weeks of the first that works, the same crew
 * on the same weekday, else the same crew, else the same weekday, else any; the earliest of those, and on that day
 * the nearest to the old hour. Null where there are none.
 */
export function slipProposal(
  visit: SlippedVisit,
  openings: readonly FoundOpening[],
  zone: Zone,
): FoundOpening | null {
  const local = openings.map((opening) => ({ opening, ...toLocal(opening.startsAt, zone) }));
  const first = local.map(({ date }) => date).sort()[0];
  if (first === undefined) return null;
  const last = addDays(first, worthWaitingDays);
  const kept = (opening: (typeof local)[number]) =>
    Number(opening.opening.crewId === visit.crewId) * 2 +
    Number(opening.weekday === weekdayOf(visit.date));
  const minutesOff = ({ time }: { time: LocalTime }) =>
    Math.abs(minutesOf(time) - minutesOf(visit.time));
  const [best] = local
    .filter(({ date }) => date <= last)
    .sort(
      (a, b) =>
        kept(b) - kept(a) ||
        daysBetween(b.date, a.date) ||
        minutesOff(a) - minutesOff(b) ||
        a.opening.score - b.opening.score,
    );
  return best?.opening ?? null;
}

/** "same crew, same weekday, 7 days later". */
export function slipWords(visit: SlippedVisit, to: SlippedVisit): string {
  const days = daysBetween(visit.date, to.date);
  return [
    visit.crewId === to.crewId ? 'same crew' : 'another crew',
    weekdayOf(visit.date) === weekdayOf(to.date) ? 'same weekday' : '',
    days === 1 ? '1 day later' : `${days} days later`,
    visit.time === to.time ? 'same hour' : '',
  ]
    .filter((part) => part !== '')
    .join(', ');
}

function minutesOf(time: LocalTime): number {
  return Number(time.slice(0, 2)) * 60 + Number(time.slice(3));
}
