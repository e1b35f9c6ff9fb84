import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { MissingReading } from '@/lib/measure/missing-reading';
import { readingPlan } from '@/lib/measure/reading-plan';

/**
 * The readings still needed for these runs, in walking order, each with why and all it takes to ask.
 *
 * Edge rule: one that was skipped with a reason stays in the list and says so; a reading near enough to
 * the place asked for answers it (150 mm up or down, 250 mm along). Units: mm, deg.
 * Example: an empty book of an L with one base run begins with "Wall A, length at the floor".
 * Problems: none. Source: common practice (which readings a kitchen needs); three heights because they
 * let the room prove itself.
 */
export function whatIsMissing(wallBook: WallBook, runs: Run[], rules: FitRules): MissingReading[] {
  return readingPlan(wallBook, runs, rules).filter((planned) => planned.takenBy.length === 0);
}
