import { MM_PER_INCH } from '@/lib/units/fraction-parts';

/** A tick of the inch that is drawn large: where it lies, and what is written by it. */
export type TapeTick = { sixtyFourths: number; numerator: number; denominator: number };

export type TapeTicks = {
  /** 0, 1/8 … 7/8. */
  eighths: TapeTick[];
  /** 1/16, 3/16 … 15/16, half way between; none where the shop reads eighths. */
  sixteenths: TapeTick[];
  /** What one touch of less or more moves, in 64ths: 2 in a 1/32 shop, 1 in a 1/64 one; null: no need. */
  nudge: number | null;
};

/**
 * The ticks that a shop's step asks for on the inch of tape.
 *
 * Edge: a step that is not on a tape is read as sixteenths.
 * Example: 1.5875 mm (1/16 in): eight eighths, eight sixteenths, no nudge.
 */
export function tapeTicks(stepMm: number): TapeTicks {
  const denominator = [2, 4, 8, 16, 32, 64].find(
    (each) => Math.abs(MM_PER_INCH / each - stepMm) < 1e-6,
  );
  const eighths = Array.from({ length: 8 }, (_, count) => tick(count * 8));
  const sixteenths = Array.from({ length: 8 }, (_, count) => tick(count * 8 + 4));
  if (denominator !== undefined && denominator <= 8) {
    return { eighths, sixteenths: [], nudge: null };
  }
  const isFiner = denominator === 32 || denominator === 64;
  return { eighths, sixteenths, nudge: isFiner ? 64 / denominator : null };
}

/** One touch of less or more; stays on the inch. */
export function nudged(sixtyFourths: number, by: number): number {
  return Math.min(63, Math.max(0, sixtyFourths + by));
}

function tick(sixtyFourths: number): TapeTick {
  let [numerator, denominator] = [sixtyFourths, 64];
  while (numerator % 2 === 0 && denominator > 1) {
    numerator /= 2;
    denominator /= 2;
  }
  return { sixtyFourths, numerator, denominator };
}
