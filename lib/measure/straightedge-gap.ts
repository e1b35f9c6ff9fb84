import { type Outcome, problem, refused } from '@/lib/problem';
import { type Bracket, bracket } from './bracket';
import { combinationFigure, combine } from './combination';
import type { Figure } from './figure';
import type { HullPoint } from './hull';
import {
  narrowestStrip,
  placeOn,
  type StripPoint,
  stripPoint,
  stripWidth,
} from './narrowest-strip';
import type { ProfilePoint } from './profile';
import { unreadable } from './reading-problems';

export type StraightedgeGap = {
  gap: Figure;
  /** Where it lies when it shows most. */
  fromMm: number;
  toMm: number;
  /** The row is shorter than the straightedge and was taken whole. */
  wholeRow: boolean;
};

/** Gaps within this are one, and the first place shows it: phone and server choose alike. */
const SAME_GAP_MM = 1e-6;

/**
 * Greatest gap under a straightedge of one length laid anywhere on a row and rocked so that its largest
 * gap is least; the profile is straight between readings.
 * Edge rule: a row shorter than the straightedge is taken whole; the greatest gap may show between two
 * readings' places (the straightedge's ends move along straight pieces, so it is sought there too).
 * Units and signs: mm; s positive into the room; readings of one set-up only.
 * Example: s 0, 0, 4, 0, 0 at 0, 500 … 2000 under 1000 mm → 4 mm, from 500 to 1500.
 * Problems: too-few-readings (under 3 places), edge-not-positive, reading-not-a-number, uncertainty-not-known.
 * Source: straightedge test of DIN 18202 and BS 8204; rocking: common practice; the search is ours.
 */
export function straightedgeGap(
  points: ProfilePoint[],
  edgeLengthMm: number,
): Outcome<StraightedgeGap> {
  const bad = unreadable(points.map(({ id, atMm, sMm, u }) => ({ id, values: [atMm, sMm], u })));
  if (bad.length > 0) return refused(...bad);
  if (!(edgeLengthMm > 0)) {
    return refused(problem('edge-not-positive', 'A straightedge is longer than 0.'));
  }
  const profile = profileOf(points);
  const [first, last] = [profile[0], profile.at(-1)];
  if (!first || !last || profile.length < 3) {
    const words = 'A straightedge needs readings at three places or more along the line.';
    return refused(
      problem(
        'too-few-readings',
        words,
        points.map(({ id }) => id),
      ),
    );
  }
  const wholeRow = last.at - first.at <= edgeLengthMm;
  const length = wholeRow ? last.at - first.at : edgeLengthMm;
  let best = { width: Number.NEGATIVE_INFINITY, from: first.at };
  for (const from of placesToLay(profile, length)) {
    const width = stripWidth(levelsIn(profile, from, length));
    if (width > best.width + SAME_GAP_MM) best = { width, from };
  }
  const { from: fromMm } = best;
  const strip = narrowestStrip(windowOf(profile, fromMm, length));
  const gap = combinationFigure(strip?.width ?? { value: 0, parts: [] });
  return { value: { gap, fromMm, toMm: fromMm + length, wholeRow }, problems: [] };
}

/** In order along the row; readings at one place count as their mean. */
function profileOf(points: ProfilePoint[]): StripPoint[] {
  const sorted = points.map(stripPoint).sort((a, b) => a.at - b.at);
  const places: StripPoint[][] = [];
  for (const point of sorted) {
    const last = places[places.length - 1];
    if (last?.[0]?.at === point.at) last.push(point);
    else places.push([point]);
  }
  return places.flatMap((here) => {
    const [first] = here;
    if (!first || here.length === 1) return here;
    const c = combine(here.map((point) => [1 / here.length, point.c]));
    return [{ at: first.at, s: c.value, c }];
  });
}

/**
 * Left ends at which the gap can be greatest: an end of the straightedge at a reading, or, between
 * those, where the chord from end to end is furthest from a reading (both ends on straight pieces: a
 * parabola in the place, its top where the derivative is 0).
 */
function placesToLay(profile: StripPoint[], length: number): number[] {
  const first = profile[0]?.at ?? 0;
  const last = (profile.at(-1)?.at ?? 0) - length;
  const ends = profile.flatMap(({ at }) => [at, at - length]);
  const marks = [...new Set(ends)].filter((at) => at >= first && at <= last).sort((a, b) => a - b);
  const tops: number[] = [];
  for (const [index, to] of marks.entries()) {
    const from = marks[index - 1];
    if (from === undefined) continue;
    const [left, right] = [
      pieceAt(profile, (from + to) / 2),
      pieceAt(profile, (from + to) / 2 + length),
    ];
    for (const inside of profile) {
      if (inside.at < to || inside.at > from + length) continue;
      const curve = 2 * (right.slope - left.slope);
      if (curve === 0) continue;
      const chordAtZero = right.at0 + right.slope * length - left.at0;
      const top =
        (left.slope * length + (right.slope - left.slope) * inside.at - chordAtZero) / curve;
      if (top > from && top < to) tops.push(top);
    }
  }
  return [...marks, ...tops];
}

/** The straight piece of the profile over a place: s = at0 + slope · at. */
function pieceAt(profile: StripPoint[], at: number): { slope: number; at0: number } {
  const index = Math.max(
    1,
    profile.findIndex((point) => point.at >= at),
  );
  const [from, to] = [profile[index - 1], profile[index]];
  if (!from || !to) return { slope: 0, at0: 0 };
  const slope = (to.s - from.s) / (to.at - from.at);
  return { slope, at0: from.s - slope * from.at };
}

/** The window's places without what they were made of: there are many windows, and one that counts. */
function levelsIn(profile: StripPoint[], from: number, length: number): HullPoint[] {
  const inside: HullPoint[] = [levelAt(profile, from)];
  for (const point of profile) {
    if (point.at > from && point.at < from + length) inside.push(point);
  }
  inside.push(levelAt(profile, from + length));
  return inside;
}

function levelAt(profile: StripPoint[], at: number): HullPoint {
  const edge = edgeAt(profile, at);
  return { at, s: edge ? (1 - edge.share) * edge.from.s + edge.share * edge.to.s : Number.NaN };
}

function windowOf(profile: StripPoint[], from: number, length: number): StripPoint[] {
  const inside = profile.filter(({ at }) => at > from && at < from + length);
  return [valueAt(profile, from), ...inside, valueAt(profile, from + length)];
}

function valueAt(profile: StripPoint[], at: number): StripPoint {
  const c = placeOn(edgeAt(profile, at));
  return { at, s: c.value, c };
}

/** The right end may miss the last reading by rounding. */
function edgeAt(profile: StripPoint[], at: number): Bracket<StripPoint> | null {
  return bracket(profile, placeAlong, Math.min(at, profile.at(-1)?.at ?? at));
}

function placeAlong({ at }: StripPoint): number {
  return at;
}
