import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { splitIntoPieces } from '@/lib/schedule';
import { addDays, type LocalDate, type LocalTime } from '@/lib/time/civil';
import { fromLocal } from '@/lib/time/local-moment';
import { isWorkday, type WorkingPattern } from '@/lib/time/workdays';
import type { Zone } from '@/lib/time/zones';
import { localStart } from './local-start';

/** Where a visit stands in the diary: who, which local day and time, how long. */
export type Place = { crewId: string; date: LocalDate; time: LocalTime; workMinutes: number };

export const placeOf = (visit: VisitView, zone: Zone): Place => ({
  crewId: visit.crewId,
  ...localStart(visit.startsAt, zone),
  workMinutes: visit.workMinutes,
});

export const isSamePlace = (a: Place, b: Place): boolean =>
  a.crewId === b.crewId &&
  a.date === b.date &&
  a.time === b.time &&
  a.workMinutes === b.workMinutes;

/**
 * The visit as it will stand there, drawn before the server has answered. Where it cannot stand there, it
 * is left as it is: the server's refusal says why.
 */
export function visitAt(
  visit: VisitView,
  place: Place,
  shop: { pattern: WorkingPattern; zone: Zone; crews: readonly CrewView[] },
): VisitView {
  const startsAt = fromLocal(place.date, place.time, shop.zone);
  const { value: pieces } = splitIntoPieces({
    workMinutes: place.workMinutes,
    startsAt,
    pattern: shop.pattern,
    zone: shop.zone,
  });
  const last = pieces?.at(-1);
  if (!pieces || !last) return visit;
  return {
    ...visit,
    crewId: place.crewId,
    crewName: shop.crews.find(({ id }) => id === place.crewId)?.name ?? visit.crewName,
    workMinutes: place.workMinutes,
    startsAt: startsAt.toISOString(),
    endsAt: last.endsAt.toISOString(),
    pieces: pieces.map((piece, index) => ({
      id: visit.pieces[index]?.id ?? `${visit.id}/${index}`,
      startsAt: piece.startsAt.toISOString(),
      endsAt: piece.endsAt.toISOString(),
    })),
  };
}

/** The next day that is worked, later or earlier; the day itself where none is within ten weeks. */
export function workdayBeside(
  date: LocalDate,
  step: 1 | -1,
  pattern: Pick<WorkingPattern, 'workdays' | 'closedDays'>,
): LocalDate {
  for (let ahead = 1, day = addDays(date, step); ahead <= 70; ahead++, day = addDays(day, step)) {
    if (isWorkday(day, pattern)) return day;
  }
  return date;
}

/** A time of day some minutes later, kept within the day. Example: 30 minutes after "23:45" is "23:45". */
export function timeBeside(time: LocalTime, minutes: number): LocalTime {
  const total = Number(time.slice(0, 2)) * 60 + Number(time.slice(3)) + minutes;
  if (total < 0 || total >= 24 * 60) return time;
  return `${String(Math.floor(total / 60)).padStart(2, '0')}:${String(total % 60).padStart(2, '0')}`;
}

/** A held time is taken or let go, never moved. */
export const canChange = ({ status }: VisitView): boolean =>
  status === 'booked' || status === 'confirmed';

/** No answer yet from the customer. */
export const isOpen = ({ status }: VisitView): boolean => status === 'held' || status === 'booked';
