/** What the search for times that work is given, and what it finds. */
import type { OpeningWishes } from '@/lib/contracts/openings';
import type { OpeningWeights } from '@/lib/schedule/planning-rules';
import type { WorkCalendar } from '@/lib/schedule/work-calendar';
import type { LocalDate } from '@/lib/time/civil';
import type { Zone } from '@/lib/time/zones';

/** By which the drive is asked for; null where a place is not on the map. */
export type PlaceIndex = number | null;

/** Time that is taken: [startsAt, endsAt), on one day. */
export type BusyPiece = {
  startsAt: Date;
  endsAt: Date;
  place: PlaceIndex;
  /** What the scheduler calls it: "Ostrander in Fairhaven". */
  label: string;
};

export type OpeningCrew = {
  id: string;
  name: string;
  calendar: WorkCalendar;
  base: PlaceIndex;
  /** Of the crew and of each of its people, in other crews too; in any order, overlaps allowed. */
  busy: readonly BusyPiece[];
  /** Time on site for a crew of this size. */
  workMinutes: number;
};

export type OpeningsInput = {
  crews: readonly OpeningCrew[];
  /** Where the visit is. */
  site: PlaceIndex;
  /** Between two places on the map; asked only for drives that matter. */
  driveMinutes: (from: number, to: number) => number;
  /** Between two places of which one is not on the map. */
  driveWhenUnknownMinutes: number;
  /** First day that the gates allow, and the last day on which the visit may begin. */
  from: LocalDate;
  until: LocalDate;
  /** Nothing begins before it. */
  now: Date;
  zone: Zone;
  /** Of the promised arrival, from the start on. */
  windowMinutes: number;
  wishes: OpeningWishes;
  weights: OpeningWeights;
};

export type MissedWish = 'weekday' | 'not-before' | 'not-after' | 'done-by' | 'away';

export type FoundOpening = {
  crewId: string;
  pieces: { startsAt: Date; endsAt: Date }[];
  startsAt: Date;
  workMinutes: number;
  driveAddedMinutes: number;
  /** In stretches of `leastUsefulMinutes` or more, over the days of the visit. */
  leavesFreeMinutes: number;
  missedWishes: MissedWish[];
  /** Minutes of trouble: the weighted sum, the least is the best. */
  score: number;
  /** All places that the added driving is reckoned from. */
  places: PlaceIndex[];
  /** The stops before and after on the first day; null for the crew's base. */
  after: string | null;
  before: string | null;
};
