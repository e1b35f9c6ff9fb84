import { type Outcome, type Problem, problem, refused } from '@/lib/problem';
import { combinationFigure } from './combination';
import type { Figure } from './figure';
import { leastSquaresLine, leastSquaresSlope } from './least-squares-line';
import { narrowestStrip, type StripPoint, stripPoint } from './narrowest-strip';
import type { ProfilePoint } from './profile';
import { unreadable } from './reading-problems';

export type FaceShape = 'straight' | 'hollow' | 'bulge' | 'wavy';
/** s = atZeroMm + slope · at. */
export type Line = { slope: number; atZeroMm: number };

export type Straightness = {
  /** Width along s of the narrowest strip of two parallel lines that holds every point. */
  minimumZone: Figure;
  /** Greatest less least residual about the least-squares line. */
  leastSquares: Figure;
  /** Proud edge of the narrowest strip. */
  zoneLine: Line;
  leastSquaresLine: Line;
  shape: FaceShape;
};

/**
 * How far one row (or column) of face readings is from straight, mm.
 * Edge rule: smaller than its own U it is straight; hollow where proud readings stand either side of a
 * low place, bulge the other way about, wavy where it turns more than once.
 * Units and signs: mm; s positive into the room; readings of one set-up only.
 * Example: s 0, 3, 0 at 0, 500, 1000 → minimum zone 3 mm, a bulge; u 0.3 each → u = √(0.09 + 2·0.0225) = 0.367.
 * Problems: too-few-readings (under 3 places), reading-not-a-number, uncertainty-not-known.
 * Source: minimum zone and least squares as in ISO 12780; shape: common practice.
 */
export function straightness(points: ProfilePoint[]): Outcome<Straightness> {
  const zone = straightZone(points);
  if (!zone.value) return { value: null, problems: zone.problems };
  const { minimumZone, shape, slope, strip } = zone.value;
  const fit = leastSquaresLine(strip);
  if (fit === null) return refused(tooFew(points));
  const value = {
    minimumZone,
    leastSquares: combinationFigure(fit.spread()),
    zoneLine: { slope, atZeroMm: Math.max(...strip.map(({ at, s }) => s - slope * at)) },
    leastSquaresLine: { slope: fit.slope.value, atZeroMm: fit.atZero.value },
    shape,
  };
  return { value, problems: [] };
}

type StraightZone = Pick<Straightness, 'minimumZone' | 'shape'> & {
  slope: number;
  strip: StripPoint[];
};

/** The narrowest strip and the shape, without the least-squares line that a fit has no use for. */
export function straightZone(points: ProfilePoint[]): Outcome<StraightZone> {
  const bad = unreadable(points.map(({ id, atMm, sMm, u }) => ({ id, values: [atMm, sMm], u })));
  if (bad.length > 0) return refused(...bad);
  const strip = points.map(stripPoint);
  const fitted = leastSquaresSlope(strip);
  const zone = narrowestStrip(strip);
  if (new Set(points.map(({ atMm }) => atMm)).size < 3 || fitted === null || zone === null) {
    return refused(tooFew(points));
  }
  const slope = Math.min(zone.slopeMost, Math.max(zone.slopeLeast, fitted));
  const minimumZone = combinationFigure(zone.width);
  return {
    value: { minimumZone, shape: shapeOf(strip, slope, minimumZone), slope, strip },
    problems: [],
  };
}

function tooFew(points: ProfilePoint[]): Problem {
  const words = 'Straightness needs readings at three places or more along the line.';
  return problem(
    'too-few-readings',
    words,
    points.map(({ id }) => id),
  );
}

/**
 * How often the face turns, seen along the strip: a turn counts where it comes back by half the strip's
 * width. One turn is a hollow or a bulge, more are waves.
 */
function shapeOf(points: StripPoint[], slope: number, zone: Figure): FaceShape {
  if (zone.value <= zone.U) return 'straight';
  const levels = [...points].sort((a, b) => a.at - b.at).map(({ at, s }) => s - slope * at);
  const back = zone.value / 2 - 1e-9;
  const turns: ('high' | 'low')[] = [];
  let going: 'up' | 'down' | null = null;
  let [high, low] = [levels[0] ?? 0, levels[0] ?? 0];
  for (const level of levels) {
    if (going !== 'down' && high - level >= back) {
      if (going === 'up') turns.push('high');
      [going, low] = ['down', level];
    } else if (going !== 'up' && level - low >= back) {
      if (going === 'down') turns.push('low');
      [going, high] = ['up', level];
    }
    high = Math.max(high, level);
    low = Math.min(low, level);
  }
  if (turns.length !== 1) return 'wavy';
  return turns[0] === 'low' ? 'hollow' : 'bulge';
}
