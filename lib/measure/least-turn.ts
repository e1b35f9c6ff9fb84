import { type Combination, combine } from './combination';

/** A gap that depends on the turn t as (proud − hollow) − t · d. */
export type TurnLine = { proud: Combination; hollow: Combination; d: number };
export type TurnEnd = { t: number; c: Combination };
/** Every turn from `least` to `most` leaves the same greatest gap; null: no end on that side. */
export type LeastTurn = { least: TurnEnd | null; most: TurnEnd | null };

/** Places along the wall nearer than this are one: no turn changes the gap between them. */
const ONE_PLACE_MM = 1e-6;

/**
 * The turns that leave the greatest of some gaps least: a minimax in one variable, exact. Two lines that
 * slope against each other are exchanged for the one that stands highest over their crossing until none
 * does; or a gap that no turn changes decides.
 * Edge rule: where only one side slopes, the turn is free on the other.
 * Example: gaps 1 − t and 3 + t → t = −1 alone; gaps 2, 1 − t, t → every t from −1 to 2.
 * Source: elementary (convex, piecewise straight).
 */
export function leastTurn(lines: TurnLine[]): LeastTurn {
  const falling = lines.filter(({ d }) => d > ONE_PLACE_MM);
  const rising = lines.filter(({ d }) => d < -ONE_PLACE_MM);
  const crossing = lowestCrossing(falling, rising);
  const level = highest(
    lines.filter(({ d }) => Math.abs(d) <= ONE_PLACE_MM),
    0,
  );
  if (crossing !== null && (level === null || crossing.value > gapAt(level, 0))) {
    const value = crossingValue(crossing);
    return { least: endOf(crossing.down, value), most: endOf(crossing.up, value) };
  }
  if (level === null) return { least: null, most: null };
  const value = combine([
    [1, level.proud],
    [-1, level.hollow],
  ]);
  return { least: latest(falling, value), most: earliest(rising, value) };
}

/** The nearest turn to the preferred one between two ends. */
export function turnNearest(preferred: TurnEnd, { least, most }: LeastTurn): TurnEnd {
  if (least !== null && preferred.t <= least.t) return least;
  if (most !== null && preferred.t >= most.t) return most;
  return preferred;
}

/** What two ranges of turns share; where they are apart, the end of the first that is nearer the second. */
export function turnWithin(first: LeastTurn, second: LeastTurn): LeastTurn {
  if (first.most !== null && second.least !== null && second.least.t >= first.most.t) {
    return { least: first.most, most: first.most };
  }
  if (first.least !== null && second.most !== null && second.most.t <= first.least.t) {
    return { least: first.least, most: first.least };
  }
  return {
    least: chosen(first.least, second.least, (a, b) => a > b),
    most: chosen(first.most, second.most, (a, b) => a < b),
  };
}

function chosen(
  a: TurnEnd | null,
  b: TurnEnd | null,
  wins: (a: number, b: number) => boolean,
): TurnEnd | null {
  if (a === null || b === null) return a ?? b;
  return wins(a.t, b.t) ? a : b;
}

function gapAt({ proud, hollow, d }: TurnLine, t: number): number {
  return proud.value - hollow.value - t * d;
}

/** Where a line comes down to a value. */
function endOf({ proud, hollow, d }: TurnLine, value: Combination): TurnEnd {
  const c = combine([
    [1 / d, proud],
    [-1 / d, hollow],
    [-1 / d, value],
  ]);
  return { t: c.value, c };
}

function latest(falling: TurnLine[], value: Combination): TurnEnd | null {
  return extreme(falling, value, (a, b) => a > b);
}

function earliest(rising: TurnLine[], value: Combination): TurnEnd | null {
  return extreme(rising, value, (a, b) => a < b);
}

function extreme(
  lines: TurnLine[],
  value: Combination,
  wins: (a: number, b: number) => boolean,
): TurnEnd | null {
  let best: { line: TurnLine; t: number } | null = null;
  for (const line of lines) {
    const t = (line.proud.value - line.hollow.value - value.value) / line.d;
    if (best === null || wins(t, best.t)) best = { line, t };
  }
  return best && endOf(best.line, value);
}

type Crossing = { down: TurnLine; up: TurnLine; t: number; value: number };

/** Least value of the greatest of falling and rising lines; null where one side is missing. */
function lowestCrossing(falling: TurnLine[], rising: TurnLine[]): Crossing | null {
  const [firstDown, firstUp] = [falling[0], rising[0]];
  if (!firstDown || !firstUp) return null;
  let crossing = crossingOf(firstDown, firstUp);
  // Each exchange raises the crossing, so no pair comes up twice.
  for (let left = falling.length * rising.length; left > 0; left -= 1) {
    const { down, up, t, value } = crossing;
    const overDown = highest(falling, t) ?? down;
    const overUp = highest(rising, t) ?? up;
    const [gainDown, gainUp] = [gapAt(overDown, t) - value, gapAt(overUp, t) - value];
    if (Math.max(gainDown, gainUp) <= 1e-12 * (1 + Math.abs(value))) break;
    crossing = gainDown >= gainUp ? crossingOf(overDown, up) : crossingOf(down, overUp);
  }
  return crossing;
}

function crossingOf(down: TurnLine, up: TurnLine): Crossing {
  const t = (gapAt(down, 0) - gapAt(up, 0)) / (down.d - up.d);
  return { down, up, t, value: gapAt(down, t) };
}

function crossingValue({ down, up }: Crossing): Combination {
  const run = down.d - up.d;
  return combine([
    [-up.d / run, down.proud],
    [up.d / run, down.hollow],
    [down.d / run, up.proud],
    [-down.d / run, up.hollow],
  ]);
}

function highest(lines: TurnLine[], t: number): TurnLine | null {
  let best: TurnLine | null = null;
  let most = -Infinity;
  for (const line of lines) {
    const gap = gapAt(line, t);
    if (gap > most) [best, most] = [line, gap];
  }
  return best;
}
