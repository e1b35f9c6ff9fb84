import type { ReadingOf } from '@/lib/contracts/readings';
import type { WallBook } from '@/lib/contracts/wall-book';
import { lengthOwnPart } from '@/lib/measure/uncertainty';
import { type JudgeInput, judgedBy, type PadVerdict } from './pad-verdict';
import { placeBy, roomPlan } from './room-plan';
import { sayDifference, sayLength, sayPlusMinus } from './say-length';

/** A ceiling reading stands over a floor reading that is this near on the plan. */
const OVER_EACH_OTHER_MM = 60;

/**
 * A drop with the others of its set-up: the high point so far, and the fall from it.
 *
 * Example: drops 1200 and 1212: 1/2" below the high point, close to a 1/2" flag.
 * Source: the rule set that the shop has picked, else its own; the decision is the shop's.
 */
export function verdictOfFloor(input: JudgeInput<ReadingOf<'floor'>>): PadVerdict {
  const { reading, others, tool, rules, book } = input;
  const before = others
    .filter((other): other is ReadingOf<'floor'> => other.kind === 'floor')
    .filter(({ setUpId }) => setUpId === reading.setUpId);
  const drops = before.map(({ dropMm }) => dropMm);
  if (drops.length === 0) return { kind: 'note', words: 'First of this set-up.' };
  const least = Math.min(...drops);
  const fallMm = Math.max(...drops, reading.dropMm) - Math.min(least, reading.dropMm);
  const expandedMm = 2 * Math.SQRT2 * lengthOwnPart(tool);
  const spanMm = spanOfFall(book, [...before, reading]);
  const { kind, by } = judgedBy(rules, 'floor-fall', { value: fallMm, U: expandedMm }, spanMm);
  const decision = fallMm > rules.floorFallDecisionMm ? ' The office must decide; tell them.' : '';
  const fall = `the floor falls ${sayDifference(fallMm, rules)} ${sayPlusMinus(expandedMm, rules)} so far.`;
  if (reading.dropMm <= least) return { kind, by, words: `High point so far; ${fall}${decision}` };
  const below = sayDifference(reading.dropMm - least, rules);
  return { kind, by, words: `${below} below the high point; ${fall}${decision}` };
}

/** From the highest to the lowest place on the plan; 0 where a wall is no longer drawn. */
function spanOfFall(book: WallBook, floor: readonly ReadingOf<'floor'>[]): number {
  const { walls } = roomPlan(book);
  const inOrder = [...floor].sort((one, other) => one.dropMm - other.dropMm);
  const [high, low] = [inOrder[0], inOrder.at(-1)].map((point) => {
    const wall = walls.find(({ wallId }) => wallId === point?.wallId);
    return wall && point ? placeBy(wall, point) : null;
  });
  return high && low ? Math.hypot(high.xMm - low.xMm, high.yMm - low.yMm) : 0;
}

/**
 * A rise with the drop under it: the clear height there, else how it compares with the other rises.
 *
 * Example: drop 1200, rise 1232: clear height 2432 mm.
 * Source: MEASURE "Frames and signs": clear height = drop + rise.
 */
export function verdictOfCeiling(input: JudgeInput<ReadingOf<'ceiling'>>): PadVerdict {
  const { reading, others, tool, rules } = input;
  const expanded = sayPlusMinus(2 * Math.SQRT2 * lengthOwnPart(tool), rules);
  const under = others.find(
    (other): other is ReadingOf<'floor'> =>
      other.kind === 'floor' &&
      other.setUpId === reading.setUpId &&
      other.wallId === reading.wallId &&
      Math.hypot(other.xMm - reading.xMm, other.yMm - reading.yMm) <= OVER_EACH_OTHER_MM,
  );
  if (under) {
    const clear = sayLength(under.dropMm + reading.riseMm, rules);
    return { kind: 'note', words: `Clear height ${clear} ${expanded} here.` };
  }
  const rises = others
    .filter((other): other is ReadingOf<'ceiling'> => other.kind === 'ceiling')
    .filter(({ setUpId }) => setUpId === reading.setUpId)
    .map(({ riseMm }) => riseMm);
  if (rises.length === 0) return { kind: 'note', words: 'First of the ceiling.' };
  const highest = Math.max(...rises);
  if (reading.riseMm >= highest) return { kind: 'note', words: 'Highest of the ceiling so far.' };
  const lower = sayDifference(highest - reading.riseMm, rules);
  return { kind: 'note', words: `${lower} lower than the highest so far.` };
}
