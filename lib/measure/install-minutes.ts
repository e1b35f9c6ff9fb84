/** What an out-of-true room adds to an install, over its boxes and set-up. */
import type { InstallEstimate, WallFit } from '@/lib/measure/fit';
import type { RunFit } from '@/lib/measure/run-fit';

/**
 * Minutes of one person's work; refs X05, X06, X11 and J. "common practice, no source": most are our
 * estimates, and a shop's own hours should replace them.
 */
const MINUTES = {
  filler: 25,
  scribedEdge: 45,
  kickMetre: 10,
  ceilingMetre: 25,
  shimmedRun: 15,
  badWall: 20,
};
/** A wall further out of straight or plumb than this costs time wherever boxes stand on it; ref M31. */
const BAD_WALL_MM = 6;
/** A kick whose height changes more than this along a run is scribed in place. */
const WAVY_KICK_MM = 6;

/**
 * Extra minutes for fillers, scribes, kicks and walls out of true, with a line for each kind.
 * Edge rule: lines with nothing to do are left out; whole minutes. Example: two fillers, nothing else: 50.
 * Source: common practice, no source (`durations`, T01 upper bounds).
 */
export function extraInstallMinutes(runs: RunFit[], walls: WallFit[]): InstallEstimate {
  const fillers = runs.reduce(
    (sum, { left, right }) => sum + [left, right].filter(({ filler }) => filler !== null).length,
    0,
  );
  const edges = runs.reduce((sum, run) => sum + run.scribes.length, 0);
  const kickMetres = runs.reduce((sum, run) => sum + wavyKickMetres(run), 0);
  const ceilingMetres = runs.reduce(
    (sum, run) => sum + (run.ceiling?.scribe ? metresOf(run) : 0),
    0,
  );
  const rocking = runs.filter(({ setLine }) => setLine?.rocks).length;
  const bad = walls.filter(
    (wall) => runs.some(({ wallId }) => wallId === wall.wallId) && isBad(wall),
  ).length;
  const lines = [
    { words: 'fillers scribed', count: fillers, minutes: fillers * MINUTES.filler },
    { words: 'finished ends scribed', count: edges, minutes: edges * MINUTES.scribedEdge },
    { words: 'metres of kick scribed', count: kickMetres, minutes: kickMetres * MINUTES.kickMetre },
    {
      words: 'metres closed to the ceiling',
      count: ceilingMetres,
      minutes: ceilingMetres * MINUTES.ceilingMetre,
    },
    { words: 'runs shimmed at the ends', count: rocking, minutes: rocking * MINUTES.shimmedRun },
    { words: 'walls out of true', count: bad, minutes: bad * MINUTES.badWall },
  ]
    .filter(({ count }) => count > 0)
    .map((line) => ({ ...line, minutes: Math.round(line.minutes) }));
  return {
    minutes: lines.reduce((sum, { minutes }) => sum + minutes, 0),
    lines,
    basis: 'common practice, no source',
  };
}

function metresOf({ units }: RunFit): number {
  const [first, last] = [units[0], units[units.length - 1]];
  if (!first || !last) return 0;
  return Math.round((last.rightMm - first.leftMm) / 100) / 10;
}

function wavyKickMetres(run: RunFit): number {
  const { kicks } = run;
  if (!kicks || kicks.greatest.value - kicks.least.value <= WAVY_KICK_MM) return 0;
  return metresOf(run);
}

function isBad(wall: WallFit): boolean {
  const straight = wall.rows.some(({ outOfStraight }) => outOfStraight.value > BAD_WALL_MM);
  const plumb = wall.columns.some(({ over }) => Math.abs(over.value) > BAD_WALL_MM);
  return straight || plumb;
}
