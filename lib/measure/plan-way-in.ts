/** The way in: asked for where something large has to come through it. */
import type { AskedSlot, PlanContext } from '@/lib/measure/plan-context';
import { hasTallUnit } from '@/lib/measure/plan-levels';

/** A unit wider than this is turned or leaned through a common door; from memory. */
const LARGE_UNIT_MM = 900;

/** One doorway, where a unit is tall or wide; nothing else. */
export function planWayIn(context: PlanContext): AskedSlot[] {
  const isLarge = context.runs.some(
    (run) =>
      run.level === 'tall' ||
      hasTallUnit(run) ||
      run.units.some(({ widthMm }) => widthMm > LARGE_UNIT_MM),
  );
  if (!isLarge) return [];
  return [
    {
      slot: 'doorway',
      words: 'Narrowest doorway on the way in: clear width past leaf and stop, and height',
      why: 'Says whether the largest unit comes in, and how.',
      need: 'should',
      ask: { kind: 'doorway' },
    },
  ];
}
