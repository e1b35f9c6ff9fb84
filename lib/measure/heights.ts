import { type Outcome, type Problem, problem, refused, warning } from '@/lib/problem';
import { bothUnits } from '@/lib/units/both-units';
import { type Combination, combinationFigure, combine, figureCombination } from './combination';
import type { Figure } from './figure';
import { type LevelPoint, levelSurface, levelTilt, tilted } from './floor-surface';
import { describeKick, type KickRun, placesUnder, type RunKick } from './kick-run';
import { givenFigure, unreadable } from './reading-problems';
import { refuseScribeRules, type ScribeRules } from './scribe';

export type KickInput = {
  /** Runs that share a counter, and so one datum. */
  runs: KickRun[];
  nominalKickMm: number;
  /** Fixed by what is already set: drop from the level line to its datum, in place of the high point. */
  fixedDatumDrop: Figure | null;
  /** Floor still to be laid where the drops were read; 0 where they were read on the finished floor. */
  floorToCome: { valueMm: number; u: number };
  standsOn: 'finished-floor' | 'rough-floor';
  legs: { minMm: number; maxMm: number };
  /** Standard u of the level line, mm per mm (`slopeUncertainty`). */
  uLevel: number;
  scribe: ScribeRules;
};

export type KickHeights = {
  /** Drop from the level line to the datum: the finished floor at the high point (or what is set). */
  datumDrop: Figure;
  /** The level line it counts from. */
  setUpId: string;
  /** Null where what is already set fixes the datum. */
  highPoint: { runId: string; xMm: number; yMm: number; readingIds: string[] } | null;
  /** Greatest less least drop under the runs. */
  fall: Figure;
  runs: RunKick[];
  /** "Stands on the rough floor: every kick grows by 12 mm (1/2") of floor to come." */
  words: string;
};

/**
 * Heights of the kick bases of runs that share a counter: kick(x, y) = K + drop(x, y), with
 * K = nominal − least finished-floor drop under all of them, or fixed by what is already set.
 * Edge rule: on the rough floor every kick grows by the floor to come. The high point is the least drop
 * at a reading or corner under the runs; legs are checked at each unit corner against both ends.
 * Units, frame, signs: mm; x along each run's wall, y out of it; drops from one level line, down.
 * Example: drops 1000 and 1006 under a run, nominal 100 → K = −900, kicks 100 and 106.
 * Problems: floor-not-read, set-ups-mixed, reading-not-a-number, uncertainty-not-known, rules-not-known;
 * warnings floor-carried-on, kick-below-nothing.
 * Source: common practice, no source.
 */
export function kickHeights(input: KickInput): Outcome<KickHeights> {
  const wrong = refuseKicks(input);
  if (wrong.length > 0) return refused(...wrong);
  const { floorToCome, standsOn, nominalKickMm } = input;
  const toCome = figureCombination({
    value: floorToCome.valueMm,
    u: floorToCome.u,
    U: 0,
    from: [],
  });
  const runs = input.runs.map((run) => {
    const dropAt = levelSurface(run.drops);
    const tilt = levelTilt(input.uLevel);
    const finishedDrop = oncePerPlace((xMm, yMm) => {
      const found = dropAt(xMm, yMm);
      const c = combine([
        [1, found.c],
        [-1, toCome],
      ]);
      return { c: tilted(c, xMm, yMm, tilt), extrapolated: found.extrapolated };
    });
    return { run, finishedDrop, under: placesUnder(run) };
  });
  const drops = runs.flatMap(({ run, finishedDrop, under }) =>
    under.map(({ xMm, yMm }) => ({
      runId: run.runId,
      xMm,
      yMm,
      c: finishedDrop(xMm, yMm).c,
    })),
  );
  const high = drops.reduce((best, place) => (place.c.value < best.c.value ? place : best));
  const low = drops.reduce((best, place) => (place.c.value > best.c.value ? place : best));
  const datum = input.fixedDatumDrop === null ? high.c : figureCombination(input.fixedDatumDrop);
  const kickAt = ({ c }: { c: Combination }) => {
    const drop = combine([
      [1, c],
      [-1, datum],
      [standsOn === 'rough-floor' ? 1 : 0, toCome],
    ]);
    return { ...drop, value: drop.value + nominalKickMm };
  };
  const kicks = runs.map(({ run, finishedDrop, under }) =>
    describeKick(
      run,
      under,
      input,
      oncePerPlace((xMm, yMm) => {
        const drop = finishedDrop(xMm, yMm);
        const height = combinationFigure(kickAt(drop));
        return { xMm, yMm, height, extrapolated: drop.extrapolated };
      }),
    ),
  );
  const fall = combinationFigure(
    combine([
      [1, low.c],
      [-1, high.c],
    ]),
  );
  const { runId, xMm, yMm } = high;
  const highPoint = { runId, xMm, yMm, readingIds: combinationFigure(high.c).from };
  const value: KickHeights = {
    datumDrop: combinationFigure(datum),
    setUpId: input.runs[0]?.drops[0]?.setUpId ?? '',
    highPoint: input.fixedDatumDrop === null ? highPoint : null,
    fall,
    runs: kicks,
    words: standingWords(input),
  };
  return { value, problems: kicks.flatMap(kickWarnings) };
}

/** Neighbouring units share corners, and every figure asks for the same places again. */
function oncePerPlace<T>(of: (xMm: number, yMm: number) => T): (xMm: number, yMm: number) => T {
  const known = new Map<number, Map<number, T>>();
  return (xMm, yMm) => {
    const column = known.get(xMm) ?? new Map<number, T>();
    known.set(xMm, column);
    const value = column.get(yMm) ?? of(xMm, yMm);
    column.set(yMm, value);
    return value;
  };
}

function standingWords({ floorToCome, standsOn }: KickInput): string {
  if (standsOn === 'finished-floor') return 'Stands on the finished floor.';
  return `Stands on the rough floor: every kick grows by ${bothUnits(floorToCome.valueMm)} of floor to come.`;
}

function kickWarnings({ runId, least, greatest, corners }: RunKick): Problem[] {
  const found: Problem[] = [];
  if ([least, greatest, ...corners].some(({ extrapolated }) => extrapolated)) {
    const words =
      'Under part of this run nobody has read the floor; the nearest readings are carried on.';
    found.push(warning('floor-carried-on', words, [runId]));
  }
  if (least.height.value <= 0) {
    const words = 'The floor rises above the underside of the boxes: raise the kick or the datum.';
    found.push(warning('kick-below-nothing', words, [runId]));
  }
  return found;
}

function refuseKicks({
  scribe,
  runs,
  nominalKickMm,
  floorToCome,
  uLevel,
  fixedDatumDrop,
  legs,
}: KickInput): Problem[] {
  const drops: LevelPoint[] = runs.flatMap((run) => run.drops);
  const bad = unreadable([
    ...drops.map(({ id, xMm, yMm, valueMm, u }) => ({ id, values: [xMm, yMm, valueMm], u })),
    ...runs.map(({ runId, footprint, faces, units }) => {
      const corners = [footprint, ...units.map((unit) => unit.footprint)].flatMap(
        Object.values<number>,
      );
      return { id: runId, values: [...corners, ...faces.map(({ atMm }) => atMm)], u: 0 };
    }),
    { id: null, values: [floorToCome.valueMm, nominalKickMm], u: floorToCome.u },
    { id: null, values: [legs.minMm, legs.maxMm], u: uLevel },
    givenFigure(fixedDatumDrop),
  ]);
  if (bad.length > 0) return bad;
  const unread = runs.filter((run) => run.drops.length === 0).map(({ runId }) => runId);
  if (unread.length > 0 || runs.length === 0) {
    return [problem('floor-not-read', 'The floor under this run has not been read.', unread)];
  }
  if (new Set(drops.map(({ setUpId }) => setUpId)).size > 1) {
    const words = 'Drops from several level lines cannot be compared. Tie them to one first.';
    return [
      problem(
        'set-ups-mixed',
        words,
        runs.map(({ runId }) => runId),
      ),
    ];
  }
  return refuseScribeRules(scribe);
}
