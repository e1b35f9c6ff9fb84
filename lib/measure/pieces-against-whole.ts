/** The pieces of a wall held against its whole, read at the same height. */
import type { CombinedLength } from '@/lib/measure/combined-readings';
import { type Figure, figure } from '@/lib/measure/figure';
import type { Repeat } from '@/lib/measure/mean-of';

/** Heights no further apart are one, as for repeats; from memory. */
const SAME_HEIGHT_MM = 40;

export type PiecesAgainstWhole = { zMm: number; difference: Figure };

/**
 * Sum of the pieces less the whole, mm, at every height of a wall that has both.
 *
 * Edge: one tape's own error is in both and mostly cancels: only what it adds for the further ends stays in U.
 * Example: pieces of 1210, 914 and 875 make 2999, the whole reads 3004: −5.
 * Source: common practice (add the pieces of each wall); U by JCGM 100:2008, 5.2.2.
 */
export function piecesAgainstWhole(
  lengths: readonly CombinedLength[],
  wallId: string,
): PiecesAgainstWhole[] {
  const atWall = lengths.filter((one) => one.wallId === wallId && one.yMm === 0);
  return atWall.flatMap((pieces): PiecesAgainstWhole[] => {
    const whole = atWall.find(
      (one) => !one.isInPieces && Math.abs(one.zMm - pieces.zMm) <= SAME_HEIGHT_MM,
    );
    if (!pieces.isInPieces || !whole) return [];
    const from = [...pieces.length.from, ...whole.length.from];
    const value = pieces.length.value - whole.length.value;
    return [{ zMm: pieces.zMm, difference: figure(value, uOfDifference(pieces, whole), from) }];
  });
}

function uOfDifference(pieces: CombinedLength, whole: CombinedLength): number {
  const tools = new Set([...pieces.repeats, ...whole.repeats].map(({ toolId }) => toolId));
  if (tools.size > 1) return Math.hypot(pieces.length.u, whole.length.u);
  const [ofPieces, ofWhole] = [commonOf(pieces.repeats), commonOf(whole.repeats)];
  const own = ({ length }: CombinedLength, common: number) =>
    Math.max(0, length.u ** 2 - common ** 2);
  return Math.sqrt(own(pieces, ofPieces) + own(whole, ofWhole) + (ofPieces - ofWhole) ** 2);
}

const commonOf = (repeats: readonly Repeat[]) => Math.max(...repeats.map(({ uCommon }) => uCommon));
