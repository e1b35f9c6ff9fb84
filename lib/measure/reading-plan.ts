/** Every reading a room needs for its runs, in walking order, with what answers each. */

import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import { planAcross } from '@/lib/measure/plan-across';
import { type AskedSlot, type PlanContext, planContext } from '@/lib/measure/plan-context';
import { planLevels } from '@/lib/measure/plan-levels';
import { planWall } from '@/lib/measure/plan-wall';
import { planWayIn } from '@/lib/measure/plan-way-in';
import { takenBy } from '@/lib/measure/taken-by';

/**
 * The whole list: round the walls, then floor and ceiling from one laser, then across the room, then the
 * way in; taken ones included, so that a phone can count them.
 *
 * Edge rule: slots keep their keys while readings come in: they count places along a wall, not
 * millimetres. Runs on walls the room has not got ask for nothing. Problems: none.
 */
export function readingPlan(wallBook: WallBook, runs: Run[], rules: FitRules): PlannedReading[] {
  const context = planContext(wallBook, runs, rules);
  const slots: AskedSlot[] = [
    ...context.walk.walls.flatMap((walked) => planWall(context, walked)),
    ...planLevels(context),
    ...planAcross(context),
    ...planWayIn(context),
  ];
  return slots.map((slot) => ({
    ...slot,
    takenBy: takenBy(context, slot.ask),
    skipped: skipOf(context, slot.slot),
  }));
}

function skipOf(context: PlanContext, slot: string): PlannedReading['skipped'] {
  const skip = context.skips.get(slot);
  return skip ? { readingId: skip.id, reason: skip.reason } : null;
}
