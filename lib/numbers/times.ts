import type { Figure, FigureKey } from '@/lib/contracts/numbers';
import { occasionWords, parseOccasion } from '@/lib/messages/occasions';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { localDate } from '@/lib/time/local-moment';
import type { DriveFact, JobFact, MessageFact, VisitFact } from './facts';
import { jobOf } from './promises';
import { median, splitBy } from './tally';
import { workedMinutes } from './worked-minutes';

const dayMs = 86_400_000;

/**
 * Median of the days from the enquiry to a job's first visit of these kinds, for jobs whose first was in the
 * period; parts by how many weeks it took.
 */
export function daysUntil(
  key: Extract<FigureKey, 'days-to-measure' | 'days-to-install'>,
  firsts: readonly { job: JobFact; at: Date }[],
  zone: string,
): Figure {
  const lines = firsts
    .map(({ job, at }) => ({
      ...jobOf(job),
      on: localDate(at, zone),
      words: `asked on ${localDate(job.enquiredAt, zone)}`,
      value: Math.max(0, at.getTime() - job.enquiredAt.getTime()) / dayMs,
    }))
    .sort((a, b) => b.value - a.value);
  return {
    key,
    unit: 'days',
    value: median(lines.map(({ value }) => value)),
    outOf: lines.length,
    splits: splitBy(lines, ({ value }) => ({ name: weeksName(value), value: 1 })).sort((a, b) =>
      a.name.localeCompare(b.name, 'en', { numeric: true }),
    ),
    lines,
    caution: null,
  };
}

function weeksName(days: number): string {
  const weeks = Math.floor(days / 7);
  return weeks === 0 ? 'within a week' : `${weeks} to ${weeks + 1} weeks`;
}

/** Hours worked on site beside the hours that were expected, by kind and crew. */
export function hoursAgainstEstimate(visits: readonly VisitFact[], zone: string): Figure {
  const done = visits.flatMap((visit) => {
    const worked = visit.status === 'done' ? workedMinutes(visit) : null;
    return worked === null ? [] : [{ visit, worked }];
  });
  const sum = (values: number[]) => values.reduce((total, value) => total + value, 0) / 60;
  return {
    key: 'hours',
    unit: 'hours',
    value: done.length === 0 ? null : sum(done.map(({ worked }) => worked)),
    outOf: sum(done.map(({ visit }) => visit.workMinutes)),
    splits: splitBy(done, ({ visit, worked }) => ({
      name: `${visitKindWords[visit.kind]}, ${visit.crewName}`,
      value: worked / 60,
      outOf: visit.workMinutes / 60,
    })),
    lines: done.map(({ visit, worked }) => ({
      ...jobOf(visit),
      on: localDate(visit.leftAt ?? visit.startsAt, zone),
      words: `${visitKindWords[visit.kind]}, ${visit.crewName}: ${(visit.workMinutes / 60).toFixed(1)} h expected`,
      value: worked / 60,
    })),
    caution: null,
  };
}

/** Minutes driven for each visit, base to base, over the days of each crew. */
export function drivePerVisit(days: readonly DriveFact[], isEstimated: boolean): Figure {
  const visits = days.flatMap((day) => day.visits);
  const minutes = days.reduce((total, day) => total + day.minutes, 0);
  return {
    key: 'drive',
    unit: 'minutes',
    value: visits.length === 0 ? null : minutes / visits.length,
    outOf: visits.length,
    splits: splitBy(days, (day) => ({
      name: day.crewName,
      value: day.minutes,
      outOf: day.visits.length,
    })),
    lines: days.flatMap((day) =>
      day.visits.map((visit) => ({
        ...jobOf(visit),
        on: day.day,
        words: `${visitKindWords[visit.kind]}, ${day.crewName}: its share of the day`,
        value: day.minutes / day.visits.length,
      })),
    ),
    caution: isEstimated ? 'Drive times are estimated for some of these.' : null,
  };
}

/** An occasion that is no more keeps its name. */
function occasionName(occasion: string): string {
  const known = parseOccasion(occasion);
  return known ? occasionWords[known] : occasion;
}

/** What texts cost, by occasion; null while the shop has not said what one message costs. */
export function messageCost(
  sent: readonly MessageFact[],
  segmentPrice: number | null,
  zone: string,
): Figure {
  const price = segmentPrice ?? 0;
  const segments = sent.reduce((total, message) => total + message.segments, 0);
  return {
    key: 'message-cost',
    unit: segmentPrice === null ? 'count' : 'money',
    value: segmentPrice === null ? segments : segments * price,
    outOf: sent.length,
    splits: splitBy(sent, ({ occasion, segments: count }) => ({
      name: occasionName(occasion),
      value: segmentPrice === null ? count : count * price,
    })),
    lines: sent.map((message) => ({
      ...jobOf(message),
      on: localDate(message.sentAt, zone),
      words: `${occasionName(message.occasion)}: ${message.segments === 1 ? '1 message' : `${message.segments} messages`}`,
      value: segmentPrice === null ? message.segments : message.segments * price,
    })),
    caution:
      segmentPrice === null ? 'Say in Messages what one message costs to see it in money.' : null,
  };
}
