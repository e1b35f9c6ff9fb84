/** What a measurer asks before leaving: do the readings hold together? Light to load. */

import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import { fitClosure } from '@/lib/measure/fit-closure';
import { fitContext } from '@/lib/measure/fit-context';
import { fitCorners } from '@/lib/measure/fit-corners';
import { fitWalls } from '@/lib/measure/fit-walls';
import { roundFit } from '@/lib/measure/round-fit';

export type ProvedRoom = Pick<Fit, 'corners' | 'walls' | 'closure' | 'problems'>;

/** The straightedge a wall is looked at with where no rule set is asked; verdicts name their own. */
const STRAIGHTEDGE_MM = 2_000;

/**
 * The walls, corners and closure of a room as `fitRoom` has them, without verdicts and the fit of the runs: half of
 * the engine's code, for the phone.
 * Edge rule, units and frames: as `fitRoom`. Example: a room of four walls read true: "The readings hold
 * together." Problems: those of the book, of its repeats and of the adjustment. Source: each part names its own.
 */
export function proveRoom(wallBook: WallBook, runs: Run[], rules: FitRules): ProvedRoom {
  const context = fitContext(wallBook, runs, rules);
  const { walls } = fitWalls(context, STRAIGHTEDGE_MM);
  return roundFit({
    corners: fitCorners(context).map((corner) => ({ ...corner, verdicts: [] })),
    walls,
    closure: fitClosure(context),
    problems: context.problems,
  });
}
