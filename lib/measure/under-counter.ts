import { type Outcome, problem, refused, warning } from '@/lib/problem';
import { combinationFigure, combine, figureCombination } from './combination';
import type { Figure } from './figure';
import { type LevelPoint, levelSurface, levelTilt, tilted } from './floor-surface';
import { type HeightCheck, heightCheck } from './height-check';
import { placesUnder, type Rectangle } from './kick-run';
import { givenFigure, unreadable } from './reading-problems';

/** Where one appliance stands under a counter. */
export type UnderCounterInput = {
  /** Its unit. */
  unitId: string;
  drops: LevelPoint[];
  footprint: Rectangle;
  /** Underside of the counter over the datum. */
  undersideMm: number;
  /** From `kickHeights`, and the level line it counts from. */
  datumDrop: Figure;
  datumSetUpId: string;
  /** Floor still to be laid where the drops were read; 0 where they were read on the finished floor. */
  floorToCome: { valueMm: number; u: number };
  needMm: number;
  /** Standard u of the level line, mm per mm. */
  uLevel: number;
};

/**
 * Clear height under the counter where an appliance stands, from the FINISHED floor, least over its footprint.
 * Edge rule: floor still to be laid is taken off; outside the readings the nearest is carried on and said.
 * Units, frame, signs: mm; drops down from the level line; underside over the datum.
 * Example: underside 870 over the datum, datum drop 1000, drops 1002 and 1005 there → 872.
 * Problems: floor-not-read, set-ups-mixed, reading-not-a-number, uncertainty-not-known; warning floor-carried-on.
 * Source: common practice; makers give the height from the finished floor.
 */
export function underCounterHeight(input: UnderCounterInput): Outcome<HeightCheck> {
  const { unitId, drops, footprint, datumDrop, floorToCome } = input;
  const bad = unreadable([
    ...drops.map(({ id, xMm, yMm, valueMm, u }) => ({ id, values: [xMm, yMm, valueMm], u })),
    {
      id: unitId,
      values: [...Object.values(footprint), input.undersideMm, input.needMm],
      u: input.uLevel,
    },
    { id: null, values: [floorToCome.valueMm], u: floorToCome.u },
    givenFigure(datumDrop),
  ]);
  if (bad.length > 0) return refused(...bad);
  if (drops.length === 0) {
    return refused(problem('floor-not-read', 'The floor here has not been read.', [unitId]));
  }
  if (drops.some(({ setUpId }) => setUpId !== input.datumSetUpId)) {
    const words = 'These drops are from another level line than the datum. Tie them to one first.';
    return refused(problem('set-ups-mixed', words, [unitId]));
  }
  const dropAt = levelSurface(drops);
  const tilt = levelTilt(input.uLevel);
  const datum = figureCombination(datumDrop);
  const toCome = figureCombination({
    value: floorToCome.valueMm,
    u: floorToCome.u,
    U: 0,
    from: [],
  });
  const under = placesUnder({ runId: unitId, drops, footprint, faces: [], units: [] });
  const heights = under.map(({ xMm, yMm }) => {
    const drop = dropAt(xMm, yMm);
    const c = combine([
      [1, tilted(drop.c, xMm, yMm, tilt)],
      [-1, toCome],
      [-1, datum],
    ]);
    return { c: { ...c, value: c.value + input.undersideMm }, extrapolated: drop.extrapolated };
  });
  const least = heights.reduce((best, place) => (place.c.value < best.c.value ? place : best));
  const words = 'Part of the floor here has not been read; the nearest readings are carried on.';
  const carried = heights.some(({ extrapolated }) => extrapolated);
  return {
    value: heightCheck(combinationFigure(least.c), input.needMm),
    problems: carried ? [warning('floor-carried-on', words, [unitId])] : [],
  };
}
