import type { Reading } from '@/lib/contracts/readings';

/**
 * The walls that a reading names; a corner or a diagonal names the walls that begin at its corners.
 *
 * Edge: doorways, withdrawals and skips name none.
 * Example: a width from wall A to wall C names both.
 */
export function wallIdsOf(reading: Reading): string[] {
  switch (reading.kind) {
    case 'corner':
      return [reading.cornerWallId];
    case 'diagonal':
      return [reading.fromCornerWallId, reading.toCornerWallId];
    case 'width':
      return [reading.wallId, reading.toWallId];
    case 'doorway':
    case 'withdrawal':
    case 'skip':
      return [];
    default:
      return [reading.wallId];
  }
}
