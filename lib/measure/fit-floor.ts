/** The floor and clear height of a fit, over the whole room. */
import { type Figure, figure } from '@/lib/measure/figure';
import type { FloorFit, FloorPoint } from '@/lib/measure/fit';
import { fitFigure } from '@/lib/measure/fit-figure';
import type { LevelLine, LevelReading } from '@/lib/measure/level-line';

/**
 * High point, low point and fall of the floor as read, and the least clear height where both were read.
 * Edge rule: null with no floor reading; the first of equals. Units: mm; heights over the high point.
 * Example: drops 1000 and 1012: fall 12, the second lies 12 below the high point.
 */
export function fitFloor(level: LevelLine): FloorFit | null {
  const [first, ...rest] = level.drops;
  if (!first) return null;
  let [high, low] = [first, first];
  for (const drop of rest) {
    if (drop.valueMm < high.valueMm - 1e-6) high = drop;
    if (drop.valueMm > low.valueMm + 1e-6) low = drop;
  }
  const point = ({ wallId, xMm, yMm, valueMm, id }: LevelReading): FloorPoint => ({
    wallId,
    xMm,
    yMm,
    heightMm: high.valueMm - valueMm,
    readingId: id,
  });
  const u = high === low ? 0 : Math.hypot(high.u, low.u);
  const fall = figure(low.valueMm - high.valueMm, u, [...new Set([high.id, low.id])]);
  return {
    highPoint: point(high),
    lowPoint: point(low),
    fall: fitFigure('floor-fall', fall),
    points: level.drops.map(point),
    clearHeightLeast: leastClearHeight(level),
    verdicts: [],
  };
}

/** Drop and rise belong to one place when no further apart than this. */
const SAME_PLACE_MM = 150;

function leastClearHeight(level: LevelLine): FloorFit['clearHeightLeast'] {
  let least: { height: Figure; at: LevelReading } | null = null;
  for (const rise of level.rises) {
    const drop = nearestDrop(level, rise);
    if (!drop) continue;
    const valueMm = drop.valueMm + rise.valueMm;
    if (least && valueMm >= least.height.value - 1e-6) continue;
    least = { height: figure(valueMm, Math.hypot(drop.u, rise.u), [drop.id, rise.id]), at: rise };
  }
  if (!least) return null;
  const { wallId, xMm, yMm } = least.at;
  return { figure: fitFigure('clear-height', least.height), wallId, xMm, yMm };
}

function nearestDrop(level: LevelLine, rise: LevelReading): LevelReading | null {
  let found: { drop: LevelReading; apartMm: number } | null = null;
  for (const drop of level.drops) {
    if (drop.wallId !== rise.wallId) continue;
    const apartMm = Math.hypot(drop.xMm - rise.xMm, drop.yMm - rise.yMm);
    if (apartMm <= SAME_PLACE_MM && (!found || apartMm < found.apartMm)) found = { drop, apartMm };
  }
  return found?.drop ?? null;
}
