/** How times are ranked and found: what a new shop starts with. Common practice, no source. */

/** What counts as how many minutes of trouble; the sum of all ranks an opening. */
export type OpeningWeights = {
  /** Of each minute of driving that the visit adds. */
  driveMinute: number;
  /** Of each day that the customer waits after the first day on which it could be. */
  dayWaited: number;
  /** Of each minute left over beside the visit that is too short for another one. */
  scrapMinute: number;
  /** Of each wish that the time misses. */
  missedWish: number;
};

export const usualOpeningWeights: OpeningWeights = {
  driveMinute: 1,
  dayWaited: 3,
  scrapMinute: 0.25,
  missedWish: 60,
};

/** Starts are offered in steps of this from the start of the crew's day. */
export const startStepMinutes = 15;
/** A stretch shorter than this takes no other visit: the shortest in the table of durations, with its drive. */
export const leastUsefulMinutes = 60;
/** A visit of several days does not begin for less than this on its first. */
export const leastFirstDayMinutes = 120;
/** Between two places of which one is not on the map. */
export const driveWhenUnknownMinutes = 20;
