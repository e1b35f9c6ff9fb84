/** What real times on site say about the shop's minutes per unit and per room. */

/** One visit that was carried out. */
export type TimedVisit = {
  /** By the clock on site, pauses and nights taken off. */
  actualMinutes: number;
  /** People who shared the work; 1 for a measure. */
  people: number;
  /** Minutes of one person that the estimate has beside the units or rooms: set-up, fillers, stairs. */
  fixedPersonMinutes: number;
  /** Units set or rooms measured. */
  count: number;
};

export type Correction = {
  /** Minutes of one person for each unit or room: the shop's own now, and what is offered. */
  nowMinutes: number;
  offeredMinutes: number;
  /** The middle half of the visits lies between these. */
  lowQuartileMinutes: number;
  highQuartileMinutes: number;
  visitCount: number;
  /** Left out: nobody tapped "arrived" or "done" in time, so that the time is absurd. */
  setAsideCount: number;
};

/** Fewer say nothing yet. */
export const leastTimedVisits = 5;
const OFFER_STEP_MINUTES = 5;
/** A real time this far from the estimate is a tap forgotten, not work. Common practice, no source. */
const ABSURD_SHARE = { least: 0.2, most: 4 };

/**
 * The median over visits of (actual × people − fixed) ÷ count, to five minutes: one day lost to a wrong delivery does
 * not move it. Null with fewer than five visits that can be true.
 * Example: two people on site for 10 hours, 300 minutes fixed, 12 units: 75 a unit.
 */
export function correctedMinutes(
  visits: readonly TimedVisit[],
  nowMinutes: number,
): Correction | null {
  const credible = visits.filter((visit) => isCredible(visit, nowMinutes));
  if (credible.length < leastTimedVisits) return null;
  const said = credible
    .map(({ actualMinutes, people, fixedPersonMinutes, count }) =>
      Math.max(0, (actualMinutes * people - fixedPersonMinutes) / count),
    )
    .sort((a, b) => a - b);
  const steps = Math.round(quantile(said, 0.5) / OFFER_STEP_MINUTES);
  return {
    nowMinutes,
    offeredMinutes: Math.max(1, steps) * OFFER_STEP_MINUTES,
    lowQuartileMinutes: Math.round(quantile(said, 0.25)),
    highQuartileMinutes: Math.round(quantile(said, 0.75)),
    visitCount: credible.length,
    setAsideCount: visits.length - credible.length,
  };
}

function isCredible(visit: TimedVisit, nowMinutes: number): boolean {
  const { actualMinutes, people, fixedPersonMinutes, count } = visit;
  const estimate = fixedPersonMinutes + count * nowMinutes;
  if (!(count > 0 && people > 0 && estimate > 0)) return false;
  const share = (actualMinutes * people) / estimate;
  return share >= ABSURD_SHARE.least && share <= ABSURD_SHARE.most;
}

/** Between the two nearest of sorted values (R. J. Hyndman and Y. Fan 1996, type 7). */
function quantile(sorted: readonly number[], share: number): number {
  const at = (sorted.length - 1) * share;
  const below = sorted[Math.floor(at)] ?? 0;
  const above = sorted[Math.ceil(at)] ?? below;
  return below + (above - below) * (at - Math.floor(at));
}

/** [from, until) as instants. */
type Span = { from: Date; until: Date };

/**
 * Minutes worked between arriving and leaving: within the days that were booked, less the pauses.
 * Example: arrived Monday 08:00, left Tuesday 12:00, booked 8–16 on both, paused 12:00–12:30 on Monday: 690.
 */
export function workedMinutes(
  onSite: Span,
  booked: readonly Span[],
  pauses: readonly Span[],
): number {
  const isOneDay = booked.length <= 1;
  // On one day all of it counts: a crew that stays longer than booked is what is to be learned.
  const spans = isOneDay ? [onSite] : booked.map((piece) => overlap(piece, onSite));
  const ms = spans.reduce((sum, span) => {
    const paused = pauses.reduce((lost, pause) => lost + lengthMs(overlap(span, pause)), 0);
    return sum + lengthMs(span) - paused;
  }, 0);
  return Math.max(0, ms / 60_000);
}

function overlap(one: Span, other: Span): Span {
  return {
    from: new Date(Math.max(one.from.getTime(), other.from.getTime())),
    until: new Date(Math.min(one.until.getTime(), other.until.getTime())),
  };
}

function lengthMs({ from, until }: Span): number {
  return Math.max(0, until.getTime() - from.getTime());
}
