import type { Figure } from '@/lib/measure/figure';
import type { Share } from '@/lib/measure/fit-figure';

/** Over: past the limit. Close: four fifths of it, or past it with U. Within: the rest. */
export function shareOf(figure: Figure, limitMm: number): Share {
  const sizeMm = Math.abs(figure.value);
  if (sizeMm > limitMm) return 'over';
  return sizeMm >= 0.8 * limitMm || sizeMm + figure.U > limitMm ? 'close' : 'within';
}
