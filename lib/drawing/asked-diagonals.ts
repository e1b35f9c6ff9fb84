import type { ProvedRoom } from '@/lib/measure/prove-room';

export type AskedDiagonal = { slot: string; fromCornerWallId: string; toCornerWallId: string };

const slotShape = /^diagonal:([^:]+):([^:]+):/;

/** The diagonals that would settle most, as the fit asks for them, best first; two at the most. */
export function askedDiagonals({ closure }: ProvedRoom): AskedDiagonal[] {
  return closure.settle
    .flatMap(({ slot }) => {
      const [, fromCornerWallId, toCornerWallId] = slotShape.exec(slot) ?? [];
      return fromCornerWallId && toCornerWallId ? [{ slot, fromCornerWallId, toCornerWallId }] : [];
    })
    .slice(0, 2);
}
