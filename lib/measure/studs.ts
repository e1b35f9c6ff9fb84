/** Studs behind the hung units: found ones, and those a regular spacing puts between them. */
import { type Outcome, problem, refused, warning } from '@/lib/problem';
import { type FoundStud, type StudGrid, studGrid } from './stud-spacing';

export type StudRead = {
  id: string;
  xMm: number;
  u: number;
  at: 'centre' | 'left-edge' | 'right-edge';
};
export type HungUnit = { unitId: string; leftMm: number; rightMm: number };
export type Span = { x0Mm: number; x1Mm: number };

export type StudInput = {
  studs: StudRead[];
  units: HungUnit[];
  /** Windows, doors and openings: nothing is predicted across them. */
  openings: Span[];
  /** The wall from its left corner; nothing is predicted past it. */
  wallLengthMm: number;
  spacingsMm: readonly number[];
  /** Thickness of a stud, for edges read. */
  studWidthMm: number;
  /** Least distance of a fixing screw from the end of a rail. */
  screwEdgeMm: number;
  studsNeeded: readonly { toWidthMm: number; studs: number }[];
};

export type Stud = { xMm: number; u: number; predicted: boolean; from: string[] };
export type UnitCatch = {
  unitId: string;
  studs: Stud[];
  needed: number;
  enough: boolean;
  words: string;
};
export type StudCatch = {
  /** Null: no spacing can be told from another. */
  spacingMm: number | null;
  studs: Stud[];
  units: UnitCatch[];
};

/**
 * Lists the studs each hung unit catches, with those that a regular spacing predicts marked as such.
 *
 * x along the wall from its left corner, mm. A stud counts only inside the unit's rail less the screw's
 * edge distance at both ends. Edge: no prediction across an opening, past the wall, or where two spacings
 * fit within u; a unit wider than the last row of the shop's table needs what the last row says.
 * Example: studs at 102, 508, 914 (± 3) and a unit from 450 to 1210: it catches 508 and 914 and needs 2.
 * Problems: `reading-impossible`; warning `too-few-studs` for each unit that needs backing.
 * Source: studs by width, practice record S06 (maker's handbook, 2009); the spacing fit is common
 * practice, no source.
 */
export function studCatch(input: StudInput): Outcome<StudCatch> {
  const bad = input.studs.filter(({ xMm, u }) => !Number.isFinite(xMm) || !(u > 0));
  if (bad.length > 0 || !(input.wallLengthMm > 0)) {
    const message = 'A stud stands nowhere. Find it again.';
    return refused(
      problem(
        'reading-impossible',
        message,
        bad.map(({ id }) => id),
      ),
    );
  }
  const found = input.studs
    .map(({ id, xMm, u, at }) => ({ id, u, centreMm: centreOf(xMm, at, input.studWidthMm) }))
    .sort((one, other) => one.centreMm - other.centreMm);
  const grid = studGrid(found, input.spacingsMm);
  const studs: Stud[] = [
    ...found.map(({ id, centreMm, u }) => ({ xMm: centreMm, u, predicted: false, from: [id] })),
    ...(grid ? predicted(grid, found, input) : []),
  ].sort((one, other) => one.xMm - other.xMm);
  const units = input.units.map((unit) => catchOf(unit, studs, input));
  return {
    value: { spacingMm: grid?.spacingMm ?? null, studs, units },
    problems: units.flatMap(({ unitId, enough, words }) =>
      enough ? [] : [warning('too-few-studs', words, [unitId])],
    ),
  };
}

function centreOf(xMm: number, at: StudRead['at'], studWidthMm: number): number {
  if (at === 'left-edge') return xMm + studWidthMm / 2;
  if (at === 'right-edge') return xMm - studWidthMm / 2;
  return xMm;
}

/** Where the row goes on; never beside a stud that was found there, even one that stands off the row. */
function predicted(grid: StudGrid, found: FoundStud[], input: StudInput): Stud[] {
  const { spacingMm, phaseMm, onGrid } = grid;
  const stretch = onGrid.flatMap((stud) => freeStretch(stud.centreMm, input) ?? []);
  const first = Math.ceil(-phaseMm / spacingMm);
  const last = Math.floor((input.wallLengthMm - phaseMm) / spacingMm);
  const studs: Stud[] = [];
  for (let k = first; k <= last; k++) {
    const xMm = phaseMm + k * spacingMm;
    const isFree = stretch.some(({ x0Mm, x1Mm }) => xMm > x0Mm && xMm < x1Mm);
    const isFound = found.some((stud) => Math.abs(stud.centreMm - xMm) < spacingMm / 4);
    if (!isFree || isFound) continue;
    // One stud may stand as far off the row as those found do; the row's own place is surer than that.
    const u = Math.hypot(grid.uPhase, Math.max(...onGrid.map((stud) => stud.u)));
    studs.push({ xMm, u, predicted: true, from: onGrid.map(({ id }) => id) });
  }
  return studs;
}

/** The wall round a place, up to the next opening at each side; null inside one. */
function freeStretch(xMm: number, { openings, wallLengthMm }: StudInput): Span | null {
  let [x0Mm, x1Mm] = [0, wallLengthMm];
  for (const opening of openings) {
    if (opening.x0Mm <= xMm && xMm <= opening.x1Mm) return null;
    if (opening.x1Mm < xMm) x0Mm = Math.max(x0Mm, opening.x1Mm);
    if (opening.x0Mm > xMm) x1Mm = Math.min(x1Mm, opening.x0Mm);
  }
  return { x0Mm, x1Mm };
}

function catchOf(unit: HungUnit, studs: Stud[], input: StudInput): UnitCatch {
  const caught = studs.filter(
    ({ xMm }) => xMm >= unit.leftMm + input.screwEdgeMm && xMm <= unit.rightMm - input.screwEdgeMm,
  );
  const needed = neededFor(unit.rightMm - unit.leftMm, input.studsNeeded);
  const enough = caught.length >= needed;
  const guessed = caught.filter((stud) => stud.predicted).length;
  const count = `${caught.length} of ${needed} ${needed === 1 ? 'stud' : 'studs'}`;
  const words = enough
    ? guessed > 0
      ? `Catches ${count}, ${guessed} predicted: find ${guessed === 1 ? 'it' : 'them'} before drilling.`
      : `Catches ${count}.`
    : `Catches ${count}: needs backing or a rail; ask the shop.`;
  return { unitId: unit.unitId, studs: caught, needed, enough, words };
}

function neededFor(widthMm: number, table: StudInput['studsNeeded']): number {
  const row = table.find(({ toWidthMm }) => widthMm <= toWidthMm + 1e-6);
  return (row ?? table[table.length - 1])?.studs ?? 1;
}
