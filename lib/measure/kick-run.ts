import { roundBlankUp } from '@/lib/units/round';
import type { Figure } from './figure';
import type { LevelPoint } from './floor-surface';
import { type ScribeAllowance, type ScribeRules, scribeAllowance } from './scribe';

export type Rectangle = { x0Mm: number; x1Mm: number; y0Mm: number; y1Mm: number };
export type FaceSide = 'front' | 'back' | 'left' | 'right';

/** One run (or island) that stands on the floor, in its wall's frame. */
export type KickRun = {
  runId: string;
  /** Every floor reading of its wall. */
  drops: LevelPoint[];
  /** Of the kick base. */
  footprint: Rectangle;
  /** Kick faces: front and back run along x at a y, left and right along y at an x. */
  faces: { side: FaceSide; atMm: number }[];
  /** Each unit's footprint; legs are checked at its four corners. */
  units: { unitId: string; footprint: Rectangle }[];
};

export type KickPlace = {
  xMm: number;
  yMm: number;
  height: Figure;
  /** Outside the readings: carried on. */
  extrapolated: boolean;
};
export type UnitKick = KickPlace & {
  unitId: string;
  corner: 'back-left' | 'back-right' | 'front-left' | 'front-right';
  legs: 'within' | 'too-low' | 'too-high';
  /** Its U reaches past an end of the range. */
  inDoubt: boolean;
};
/** One kick face: its least height, and the blank (least + scribe allowance, rounded up once). */
export type KickFace = {
  side: FaceSide;
  least: KickPlace;
  scribe: ScribeAllowance;
  blankMm: number;
};
export type RunKick = {
  runId: string;
  least: KickPlace;
  greatest: KickPlace;
  corners: UnitKick[];
  faces: KickFace[];
};

export type Place = { xMm: number; yMm: number };

/** A reading this far outside a footprint still says how the floor is under it. */
const BESIDE_MM = 50;

type KickAt = (xMm: number, yMm: number) => KickPlace;

/** Where the floor under a run can be highest or lowest: its readings, its corners, its units' corners. */
export function placesUnder({ drops, footprint, units }: KickRun): Place[] {
  const readings = drops.filter(({ xMm, yMm }) => isUnder(footprint, xMm, yMm));
  const corners = [footprint, ...units.map((unit) => unit.footprint)].flatMap(cornersOf);
  return [...readings, ...corners].map(({ xMm, yMm }) => ({ xMm, yMm }));
}

/** Kick heights of one run, from the height at any place; `under`: its `placesUnder`. */
export function describeKick(
  run: KickRun,
  under: Place[],
  rules: { legs: { minMm: number; maxMm: number }; scribe: ScribeRules },
  kickAt: KickAt,
): RunKick {
  const kicks = under.map(({ xMm, yMm }) => kickAt(xMm, yMm));
  const corners = run.units.flatMap(({ unitId, footprint }) =>
    cornersOf(footprint).map(({ corner, xMm, yMm }) => {
      const kick = kickAt(xMm, yMm);
      return { ...kick, unitId, corner, ...legsAt(kick.height, rules.legs) };
    }),
  );
  return {
    runId: run.runId,
    least: kicks.reduce((best, kick) => (kick.height.value < best.height.value ? kick : best)),
    greatest: kicks.reduce((best, kick) => (kick.height.value > best.height.value ? kick : best)),
    corners,
    faces: run.faces.flatMap((face) => faceOf(run, under, face, rules.scribe, kickAt) ?? []),
  };
}

function faceOf(
  run: KickRun,
  under: Place[],
  { side, atMm }: { side: FaceSide; atMm: number },
  scribe: ScribeRules,
  kickAt: KickAt,
): KickFace | null {
  const alongX = side === 'front' || side === 'back';
  const { x0Mm, x1Mm, y0Mm, y1Mm } = run.footprint;
  const [from, to] = alongX ? [x0Mm, x1Mm] : [y0Mm, y1Mm];
  const along = ({ xMm, yMm }: Place) => (alongX ? xMm : yMm);
  const inside = under.map(along).filter((at) => at > from && at < to);
  const places = [...new Set([from, ...inside, to])].sort((a, b) => a - b);
  const kicks = places.map((at) => (alongX ? kickAt(at, atMm) : kickAt(atMm, at)));
  const { value } = scribeAllowance({
    places: kicks.map(({ height, ...place }, index) => ({
      id: height.from[0] ?? `${run.runId}:${side}:${index}`,
      atMm: along(place),
      gapMm: height.value,
      u: height.u,
    })),
    uShared: 0,
    held: 'by-size',
    rules: scribe,
  });
  const least = kicks.reduce((best, kick) => (kick.height.value < best.height.value ? kick : best));
  if (value === null) return null;
  const blankMm = roundBlankUp(least.height.value + value.unrounded.value, scribe.stepMm);
  return { side, least, scribe: value, blankMm };
}

function legsAt(height: Figure, { minMm, maxMm }: { minMm: number; maxMm: number }) {
  const { value, U } = height;
  const legs: UnitKick['legs'] = value < minMm ? 'too-low' : value > maxMm ? 'too-high' : 'within';
  const inDoubt = Math.abs(value - minMm) < U || Math.abs(value - maxMm) < U;
  return { legs, inDoubt };
}

function cornersOf({ x0Mm, x1Mm, y0Mm, y1Mm }: Rectangle) {
  return [
    { corner: 'back-left' as const, xMm: x0Mm, yMm: y0Mm },
    { corner: 'back-right' as const, xMm: x1Mm, yMm: y0Mm },
    { corner: 'front-left' as const, xMm: x0Mm, yMm: y1Mm },
    { corner: 'front-right' as const, xMm: x1Mm, yMm: y1Mm },
  ];
}

function isUnder({ x0Mm, x1Mm, y0Mm, y1Mm }: Rectangle, xMm: number, yMm: number): boolean {
  const inX = xMm >= x0Mm - BESIDE_MM && xMm <= x1Mm + BESIDE_MM;
  return inX && yMm >= y0Mm - BESIDE_MM && yMm <= y1Mm + BESIDE_MM;
}
