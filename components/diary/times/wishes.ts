import { noWishes, type OpeningWishes } from '@/lib/contracts/openings';
import { addDays, type LocalDate } from '@/lib/time/civil';

/** What the customer says on the phone, as toggles and one time. */
export type Wishes = {
  weekdays: number[];
  half: 'morning' | 'afternoon' | null;
  notBefore: string;
  isSchoolRun: boolean;
  /** Another time, before the one that is booked. */
  isSooner: boolean;
  /** The measure takes two. */
  isForTwo: boolean;
  /** First day that suits; empty: as soon as may be. */
  from: string;
};

export const anyTime: Wishes = {
  weekdays: [],
  half: null,
  notBefore: '',
  isSchoolRun: false,
  isSooner: false,
  isForTwo: false,
  from: '',
};

/** Common practice: a morning visit has arrived by noon, an afternoon one arrives after it. */
const noon = '12:00';
/** Common practice: when children are brought to school and fetched. */
const schoolRun = [
  { from: '08:00', until: '09:00' },
  { from: '14:30', until: '15:45' },
];

export function askedWishes(wishes: Wishes): OpeningWishes {
  const { weekdays, half, notBefore, isSchoolRun } = wishes;
  const earliest = half === 'afternoon' && notBefore < noon ? noon : notBefore;
  return {
    ...noWishes,
    weekdays,
    ...(earliest ? { notBefore: earliest } : {}),
    ...(half === 'morning' ? { notAfter: noon } : {}),
    away: isSchoolRun ? schoolRun : [],
  };
}

/** A second press takes the half of the day back. */
export const halfToggled = (
  wishes: Wishes,
  half: NonNullable<Wishes['half']>,
): Pick<Wishes, 'half'> => ({ half: wishes.half === half ? null : half });

/** The days to look at: from the day that suits, and where it shall be sooner, until the day before the visit. */
export function askedDays(
  { from, isSooner }: Wishes,
  booked: { today: LocalDate; visitDate: LocalDate | null },
): { from?: LocalDate; until?: LocalDate } {
  if (!isSooner || !booked.visitDate) return from ? { from } : {};
  const lastDay = addDays(booked.visitDate, -1);
  const firstDay = from || booked.today;
  // A visit of today or tomorrow: what is left of the days until it.
  return lastDay < firstDay
    ? { from: firstDay, until: firstDay }
    : { from: firstDay, until: lastDay };
}
