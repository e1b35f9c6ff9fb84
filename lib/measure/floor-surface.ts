import { bracket } from './bracket';
import { type Combination, combine, type ErrorSource, readCombination } from './combination';
import { placeOn } from './narrowest-strip';

/** A floor or ceiling reading from the level line: x along the wall, y out of it, `valueMm` drop or rise. */
export type LevelPoint = {
  id: string;
  xMm: number;
  yMm: number;
  valueMm: number;
  u: number;
  setUpId: string;
};

/** A reading of the floor or ceiling with what it was made of. */
type LevelPlace = { xMm: number; yMm: number; c: Combination };

/** The level line's own tilt along and across a wall; its error grows with the distance. */
export type LevelTilt = { alongX: ErrorSource; alongY: ErrorSource };

export type SurfaceValue = {
  c: Combination;
  /** Outside the readings: the nearest one was carried on. */
  extrapolated: boolean;
};

/** Readings this near in y were taken along one line. */
const SAME_LINE_MM = 50;

export function levelTilt(uLevel: number): LevelTilt {
  return { alongX: { ids: [], u: uLevel }, alongY: { ids: [], u: uLevel } };
}

/** A value with the tilt of the level line over the distance from the wall's corner. */
export function tilted(c: Combination, xMm: number, yMm: number, tilt: LevelTilt): Combination {
  return {
    value: c.value,
    parts: [...c.parts, { source: tilt.alongX, weight: xMm }, { source: tilt.alongY, weight: yMm }],
  };
}

/**
 * The floor or ceiling between readings: straight along each line of readings, straight from line to line.
 * Edge rule: a line that does not reach a place is left out while another does; past all of them the
 * nearest reading is carried on and the value says so. Without readings every value is 0, carried on.
 * Units and frame: mm; x along the wall, y out of it.
 * Example: drops 1000 and 1004 at x 0 and 600 → 1001 at x 150.
 * Source: common practice (a floor is straight between readings).
 */
export function levelSurface(points: LevelPoint[]): (xMm: number, yMm: number) => SurfaceValue {
  const places = points.map(({ id, xMm, yMm, valueMm, u }) => ({
    xMm,
    yMm,
    c: readCombination(id, valueMm, u),
  }));
  const lines = linesOf(places).map((line) => ({ line, yMm: lineY(line) }));
  return (xMm, yMm) => {
    const crossed = lines.flatMap(({ line, yMm: y }) => {
      const found = bracket(line, xOf, xMm);
      return found === null ? [] : [{ c: placeOn(found), yMm: y }];
    });
    if (crossed.length > 0) return acrossLines(crossed, yMm);
    const ends = lines.flatMap(({ line, yMm: y }) => {
      const [first, last] = [line[0], line.at(-1)];
      const end = first && xMm < first.xMm ? first : last;
      return end ? [{ c: end.c, yMm: y }] : [];
    });
    return { c: acrossLines(ends, yMm).c, extrapolated: true };
  };
}

function xOf({ xMm }: LevelPlace): number {
  return xMm;
}

/** Runs of readings along the wall, nearest the wall first, each from left to right. */
function linesOf(places: LevelPlace[]): LevelPlace[][] {
  const lines: LevelPlace[][] = [];
  for (const place of [...places].sort((a, b) => a.yMm - b.yMm)) {
    const line = lines.at(-1);
    const first = line?.[0];
    if (line && first && place.yMm - first.yMm <= SAME_LINE_MM) line.push(place);
    else lines.push([place]);
  }
  return lines.map((line) => line.sort((a, b) => a.xMm - b.xMm));
}

function lineY(line: LevelPlace[]): number {
  return line.reduce((sum, { yMm }) => sum + yMm, 0) / line.length;
}

function acrossLines(crossed: { c: Combination; yMm: number }[], yMm: number): SurfaceValue {
  const found = bracket(crossed, (line) => line.yMm, yMm);
  if (found !== null) return { c: placeOn(found), extrapolated: false };
  const [first, last] = [crossed[0], crossed.at(-1)];
  const nearest = first && yMm < first.yMm ? first : last;
  const beyond = Math.abs(yMm - (nearest?.yMm ?? yMm));
  return { c: combine(nearest ? [[1, nearest.c]] : []), extrapolated: beyond > SAME_LINE_MM };
}
