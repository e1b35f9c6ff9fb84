/** Kick heights of an island over its own floor readings. */
import { type Outcome, problem, refused } from '@/lib/problem';
import { combinationFigure, combine, figureCombination } from './combination';
import { type Figure, figure } from './figure';
import { type LevelPoint, levelSurface, levelTilt, tilted } from './floor-surface';
import { isMeasured, type Measured } from './measured';

export type KickPlace = LevelPoint;
type Footprint = { leftMm: number; rightMm: number; backMm: number; frontMm: number };
type KickRules = {
  nominalKickMm: number;
  datumDrop: Measured | null;
  legs: { minMm: number; maxMm: number };
  /** Standard u of the level line, mm per mm. */
  uLevel: number;
};

export type IslandKick = {
  xMm: number;
  yMm: number;
  height: Figure;
  legs: 'within' | 'too-low' | 'too-high';
  extrapolated: boolean;
};

/** kick(x, y) = nominal + drop(x, y) − datum drop, at the four corners and at each reading under it. */
export function kickAtPlaces(
  floor: KickPlace[],
  { leftMm, rightMm, backMm, frontMm }: Footprint,
  { nominalKickMm, datumDrop, legs, uLevel }: KickRules,
): Outcome<IslandKick[]> {
  const bad = floor.filter(({ id, xMm, yMm, valueMm, u }) =>
    [xMm, yMm, valueMm].some((value) => !isMeasured({ value, u, from: [id] })),
  );
  if (bad.length > 0) {
    const message = 'A floor reading of the island cannot be true. Take it again.';
    return refused(
      problem(
        'reading-impossible',
        message,
        bad.map(({ id }) => id),
      ),
    );
  }
  if (floor.length === 0) {
    return refused(problem('floor-not-read', 'Read the floor at the four corners of the island.'));
  }
  const surfaceAt = levelSurface(floor);
  const tilt = levelTilt(uLevel);
  const inside = floor.filter(
    ({ xMm, yMm }) => xMm > leftMm && xMm < rightMm && yMm > backMm && yMm < frontMm,
  );
  const spots = [
    [leftMm, backMm],
    [rightMm, backMm],
    [rightMm, frontMm],
    [leftMm, frontMm],
    ...inside.map(({ xMm, yMm }) => [xMm, yMm]),
  ].map(([xMm = 0, yMm = 0]) => {
    const { c, extrapolated } = surfaceAt(xMm, yMm);
    return { xMm, yMm, surface: { c: tilted(c, xMm, yMm, tilt), extrapolated } };
  });
  const highest = spots.reduce((best, spot) =>
    spot.surface.c.value < best.surface.c.value ? spot : best,
  );
  const datum = datumDrop
    ? figureCombination(figure(datumDrop.value, datumDrop.u, datumDrop.from))
    : highest.surface.c;
  return {
    value: spots.map(({ xMm, yMm, surface }) => {
      const over = combinationFigure(
        combine([
          [1, surface.c],
          [-1, datum],
        ]),
      );
      const height = figure(nominalKickMm + over.value, over.u, over.from);
      const reach =
        height.value < legs.minMm ? 'too-low' : height.value > legs.maxMm ? 'too-high' : 'within';
      return { xMm, yMm, height, legs: reach, extrapolated: surface.extrapolated };
    }),
    problems: [],
  };
}
