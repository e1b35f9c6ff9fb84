/** A wall that cannot be read from corner to corner is asked for in pieces, mark to mark. */

import type { ReadingOf } from '@/lib/contracts/readings';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { IN_THE_WAY } from '@/lib/measure/in-the-way';
import {
  type AskedSlot,
  heightWords,
  lengthSoFar,
  type PlanContext,
} from '@/lib/measure/plan-context';
import type { WalkedWall } from '@/lib/measure/room-walk';
import { featureWord } from '@/lib/words/feature-words';

/** What stands out less is passed in front of, the tape held off the wall; common practice, no source. */
const PASSED_IN_FRONT_MM = 100;
/** A stretch shorter than this beside a corner is none. */
const LEAST_STRETCH_MM = 20;
/** More marks than the two widest things give are the measurer's to choose. */
const MOST_MARKED = 2;
const TWO_STRETCHES = ['piece to the mark', 'piece from the mark'];

type Feature = ReadingOf<'feature'>;

/** The stretches to read instead of a length; null where nothing keeps the tape from corner to corner. */
export function piecesInstead(
  context: PlanContext,
  walked: WalkedWall,
  length: AskedSlot,
): AskedSlot | null {
  if (length.ask.kind !== 'length') return null;
  const { wall } = walked;
  const { zMm, nominalMm } = length.ask;
  const across = featuresAcross(context, wall.id, zMm);
  const proud = across.filter(({ projectionMm }) => projectionMm >= PASSED_IN_FRONT_MM);
  const isGivenUp = context.skips.get(length.slot)?.reason === IN_THE_WAY;
  if (proud.length === 0 && !isGivenUp) return null;
  const marked = proud.length > 0 ? proud : across;
  return {
    ...length,
    slot: `pieces:${wall.id}:${zMm}`,
    words: `Wall ${wall.name} in pieces, ${heightWords(zMm, context.rules)}`,
    why: 'The tape does not pass from corner to corner: mark the wall, read mark to mark.',
    ask: {
      kind: 'pieces',
      wallId: wall.id,
      zMm,
      nominalMm,
      stretches: stretchesBeside(marked, lengthSoFar(context, walked), context.rules.region),
    },
  };
}

/** Standing features of a wall that a tape at this height meets, left to right. */
function featuresAcross(context: PlanContext, wallId: string, zMm: number): Feature[] {
  return context
    .byKind('feature')
    .filter((one) => one.wallId === wallId && one.z0Mm <= zMm && one.z1Mm >= zMm)
    .sort((a, b) => a.x0Mm - b.x0Mm);
}

/**
 * What the stretches of a wall are called, left to right, from the features whose sides are its marks.
 *
 * Edge: a feature in the corner leaves no stretch there; with nothing to mark by, two stretches about one mark.
 * Example: a window from 1200 to 2100 on 3000: piece to the window, window, piece to the corner.
 */
export function stretchesBeside(
  features: readonly Pick<Feature, 'feature' | 'x0Mm' | 'x1Mm'>[],
  lengthMm: number,
  region: FitRules['region'],
): string[] {
  const widest = [...features]
    .sort((a, b) => b.x1Mm - b.x0Mm - (a.x1Mm - a.x0Mm))
    .slice(0, MOST_MARKED)
    .sort((a, b) => a.x0Mm - b.x0Mm);
  const stretches: string[] = [];
  let atMm = 0;
  for (const { feature, x0Mm, x1Mm } of widest) {
    if (x1Mm <= atMm) continue;
    const word = featureWord(feature, region);
    if (x0Mm - atMm >= LEAST_STRETCH_MM) stretches.push(`piece to the ${word}`);
    stretches.push(word);
    atMm = x1Mm;
  }
  if (lengthMm - atMm >= LEAST_STRETCH_MM) stretches.push('piece to the corner');
  return stretches.length > 1 ? stretches : TWO_STRETCHES;
}
