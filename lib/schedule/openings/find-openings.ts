/** Times that work: every stretch of every crew's days into which a visit fits, with the best start in it. */
import {
  leastFirstDayMinutes,
  leastUsefulMinutes,
  startStepMinutes,
} from '@/lib/schedule/planning-rules';
import { daysBetween } from '@/lib/time/civil';
import { type CrewDay, type CrewDays, crewDays, type Gap } from './crew-days';
import { makeHorizon } from './horizon';
import { type MissedWishes, readyWishes } from './missed-wishes';
import type { FoundOpening, OpeningCrew, OpeningsInput, PlaceIndex } from './opening-input';

const MINUTE_MS = 60_000;
const STEP_MS = startStepMinutes * MINUTE_MS;
/** Days off in a row, in the middle of a visit, past which it is no longer one visit. */
const MOST_DAYS_OFF = 30;

type Piece = { startMs: number; endMs: number; day: CrewDay; gap: Gap };
/** The first day, and for a visit of several days those after it. */
type Pieces = [Piece, ...Piece[]];
type Candidate = { pieces: Pieces; driveAddedMinutes: number; score: number };
type Search = {
  input: OpeningsInput;
  crew: OpeningCrew;
  days: CrewDays;
  workMs: number;
  missed: MissedWishes;
  drive: (from: PlaceIndex, to: PlaceIndex) => number;
};

/**
 * All openings, best first: for each crew and each free stretch of its days, the start with the least trouble in it.
 *
 * A start is tried each quarter of an hour from the crew's day start. It works when the drive from the stop
 * before and to the stop after fit between; the drive out from the base and home lie outside the hours. A visit
 * that fits into one of the crew's days is never split; a longer one begins at the end of a day, with two hours
 * or more, and goes on each worked day from its start, as `splitOverCalendar` does.
 *
 * Trouble, in minutes: driveMinute × drive added (before→site + site→after − before→after, over all its days)
 * + dayWaited × days after `from` + scrapMinute × leftovers beside it from a quarter to an hour + missedWish × wishes missed.
 * Example: an empty day, 20 minutes from the base, on the first day: 40 minutes driven, nothing else: 40.
 * Complete: a start that works lies in a stretch that is found (checked against brute force).
 */
export function findOpenings(input: OpeningsInput): FoundOpening[] {
  const { from, until, zone, wishes, windowMinutes } = input;
  const horizon = makeHorizon(from, zone);
  const dayCount = Math.max(0, daysBetween(from, until) + 1);
  const missed = readyWishes(wishes, windowMinutes);
  const drive = driveOf(input);
  const found = input.crews.flatMap((crew) => {
    const days = crewDays({ ...crew, horizon });
    const workMs = crew.workMinutes * MINUTE_MS;
    const search: Search = { input, crew, days, workMs, missed, drive };
    const worked = Array.from({ length: dayCount }, (_, day) => days.on(day) ?? []).flat();
    const isOneDay = worked.some((day) => day.endMs - day.startMs >= workMs);
    return worked.flatMap((day) => openingsOn(search, day, isOneDay));
  });
  return found.sort((a, b) => a.score - b.score || a.startsAt.getTime() - b.startsAt.getTime());
}

/**
 * Each start once, with the crew for which it is least trouble: who comes makes no second time of it for a
 * customer. Example: two crews free on Monday at 8:00, of 20 and of 35 minutes' trouble: the one of 20.
 */
export function eachStartOnce(found: readonly FoundOpening[]): FoundOpening[] {
  const best = new Map<number, FoundOpening>();
  for (const opening of found) {
    const startMs = opening.startsAt.getTime();
    const known = best.get(startMs);
    if (!known || opening.score < known.score) best.set(startMs, opening);
  }
  return found.filter((opening) => best.get(opening.startsAt.getTime()) === opening);
}

/** The best few, but not all on one day: somebody on the phone wants a choice. */
export function variedOpenings(found: readonly FoundOpening[], limit: number): FoundOpening[] {
  const mostADay = Math.ceil(limit / 3);
  const taken = new Map<number, number>();
  const isFirstOfDay = (opening: FoundOpening) => {
    const day = Math.floor(opening.startsAt.getTime() / 86_400_000);
    const count = taken.get(day) ?? 0;
    taken.set(day, count + 1);
    return count < mostADay;
  };
  const first = found.filter(isFirstOfDay).slice(0, limit);
  const chosen = new Set(first);
  const rest = found.filter((opening) => !chosen.has(opening)).slice(0, limit - first.length);
  return [...first, ...rest].sort((a, b) => a.score - b.score);
}

function openingsOn(search: Search, day: CrewDay, isOneDay: boolean): FoundOpening[] {
  const gaps = isOneDay ? day.gaps : day.gaps.filter(({ before }) => before === null);
  return gaps.flatMap((gap) => {
    const best = isOneDay ? bestInGap(search, day, gap) : bestOverDays(search, day, gap);
    return best ? [opening(search, best)] : [];
  });
}

/** The stretch of a gap in which the crew can be on site, after the drive there and before the drive on. */
function stretchOf({ drive, input }: Search, gap: Gap): { fromMs: number; untilMs: number } {
  const { after, before } = gap;
  const thereMs = after
    ? after.endMs + drive(after.piece.place, input.site) * MINUTE_MS
    : gap.startMs;
  const onMs = before
    ? before.startMs - drive(input.site, before.piece.place) * MINUTE_MS
    : gap.endMs;
  return { fromMs: Math.max(gap.startMs, thereMs), untilMs: Math.min(gap.endMs, onMs) };
}

function bestInGap(search: Search, day: CrewDay, gap: Gap): Candidate | null {
  const { fromMs, untilMs } = stretchOf(search, gap);
  const first = firstStart(search, day, fromMs);
  if (first + search.workMs > untilMs) return null;
  const driveAddedMinutes = driveAdded(search, gap);
  let best: Candidate | null = null;
  for (let startMs = first; startMs + search.workMs <= untilMs; startMs += STEP_MS) {
    const pieces: Pieces = [{ startMs, endMs: startMs + search.workMs, day, gap }];
    const scrapMs = scrap(startMs - fromMs) + scrap(untilMs - startMs - search.workMs);
    best = better(best, { search, pieces, driveAddedMinutes, scrapMs });
  }
  return best;
}

function bestOverDays(search: Search, day: CrewDay, gap: Gap): Candidate | null {
  const { fromMs } = stretchOf(search, gap);
  const lastStart = day.endMs - leastFirstDayMinutes * MINUTE_MS;
  const first = firstStart(search, day, fromMs);
  if (first > lastStart) return null;
  const days = followingDays(search, day, search.workMs - (day.endMs - first));
  const firstDrive = driveAdded(search, gap);
  let best: Candidate | null = null;
  for (let startMs = first; startMs <= lastStart; startMs += STEP_MS) {
    const more = followingPieces(days, search.workMs - (day.endMs - startMs));
    // A later start leaves more for the days after it, which does not fit either.
    if (!more) break;
    const pieces: Pieces = [{ startMs, endMs: day.endMs, day, gap }, ...more.pieces];
    const scrapMs = scrap(startMs - fromMs) + more.scrapMs;
    const driveAddedMinutes = firstDrive + more.driveAddedMinutes;
    best = better(best, { search, pieces, driveAddedMinutes, scrapMs });
  }
  return best;
}

type FollowingDay = { day: CrewDay; gap: Gap; untilMs: number; driveAddedMinutes: number };

/** The worked days after the first that are free at their start, up to the one after the work is used up. */
function followingDays(search: Search, firstDay: CrewDay, workMs: number): FollowingDay[] {
  const following: FollowingDay[] = [];
  let leftMs = workMs + firstDay.endMs - firstDay.startMs;
  let daysOff = 0;
  for (let number = firstDay.day + 1; leftMs > 0; number += 1) {
    const day = search.days.on(number);
    if (!day) {
      daysOff += 1;
      if (daysOff > MOST_DAYS_OFF) return following;
      continue;
    }
    daysOff = 0;
    const gap = day.gaps[0];
    if (!gap) return following;
    const { fromMs, untilMs } = stretchOf(search, gap);
    if (fromMs > day.startMs) return following;
    following.push({ day, gap, untilMs, driveAddedMinutes: driveAdded(search, gap) });
    leftMs -= day.endMs - day.startMs;
  }
  return following;
}

/** The work of the days after the first, each from its start; null where one of them is taken. */
function followingPieces(days: FollowingDay[], workMs: number) {
  const pieces: Piece[] = [];
  let driveAddedMinutes = 0;
  let leftMs = workMs;
  for (const { day, gap, untilMs, driveAddedMinutes: added } of days) {
    const endMs = day.startMs + Math.min(leftMs, day.endMs - day.startMs);
    if (endMs > untilMs) return null;
    leftMs -= endMs - day.startMs;
    driveAddedMinutes += added;
    pieces.push({ startMs: day.startMs, endMs, day, gap });
    if (leftMs <= 0) return { pieces, driveAddedMinutes, scrapMs: scrap(untilMs - endMs) };
  }
  return null;
}

/** On the steps from the day's start, not before the stretch and not before now. */
function firstStart({ input }: Search, day: CrewDay, fromMs: number): number {
  const earliest = Math.max(fromMs, input.now.getTime());
  return day.startMs + Math.max(0, Math.ceil((earliest - day.startMs) / STEP_MS)) * STEP_MS;
}

function better(
  best: Candidate | null,
  next: {
    search: Search;
    pieces: Pieces;
    driveAddedMinutes: number;
    scrapMs: number;
  },
): Candidate {
  const { search, pieces, driveAddedMinutes, scrapMs } = next;
  const { weights } = search.input;
  const [first] = pieces;
  const missed = search.missed.count(first.day, first.startMs, pieces);
  const score =
    weights.driveMinute * driveAddedMinutes +
    weights.dayWaited * first.day.day +
    weights.scrapMinute * (scrapMs / MINUTE_MS) +
    weights.missedWish * missed;
  return best && best.score <= score ? best : { pieces, driveAddedMinutes, score };
}

function driveAdded({ drive, crew, input }: Search, gap: Gap): number {
  const [from, to] = ends(gap, crew);
  // Base to base is a day at home, not a drive.
  const without = gap.after === null && gap.before === null ? 0 : drive(from, to);
  return drive(from, input.site) + drive(input.site, to) - without;
}

/** Where the crew comes from and drives on to. */
function ends({ after, before }: Gap, { base }: OpeningCrew): [PlaceIndex, PlaceIndex] {
  return [after ? after.piece.place : base, before ? before.piece.place : base];
}

function opening({ crew, missed }: Search, best: Candidate): FoundOpening {
  const { pieces } = best;
  const [first] = pieces;
  const { startMs, gap } = first;
  return {
    crewId: crew.id,
    pieces: pieces.map((piece) => ({
      startsAt: new Date(piece.startMs),
      endsAt: new Date(piece.endMs),
    })),
    startsAt: new Date(startMs),
    workMinutes: crew.workMinutes,
    driveAddedMinutes: best.driveAddedMinutes,
    leavesFreeMinutes: pieces.reduce((sum, piece) => sum + freeAfter(piece), 0) / MINUTE_MS,
    missedWishes: missed.list(first.day, startMs, pieces),
    score: best.score,
    places: [...new Set(pieces.flatMap((piece) => ends(piece.gap, crew)))],
    after: gap.after?.piece.label ?? null,
    before: gap.before?.piece.label ?? null,
  };
}

/** What of the day is still of use once the piece is in it; drives to come are not counted. */
function freeAfter({ startMs, endMs, day }: Piece): number {
  const parts = day.gaps.flatMap((gap) =>
    gap.startMs <= startMs && endMs <= gap.endMs
      ? [startMs - gap.startMs, gap.endMs - endMs]
      : [gap.endMs - gap.startMs],
  );
  return parts.reduce((sum, part) => sum + (part >= leastUsefulMinutes * MINUTE_MS ? part : 0), 0);
}

/** Waiting for the next quarter is no loss; an hour and more takes another visit. */
const scrap = (ms: number): number =>
  ms >= STEP_MS && ms < leastUsefulMinutes * MINUTE_MS ? ms : 0;

function driveOf(input: OpeningsInput) {
  return (from: PlaceIndex, to: PlaceIndex): number => {
    if (from === null || to === null) return input.driveWhenUnknownMinutes;
    return Math.ceil(input.driveMinutes(from, to));
  };
}
