import type { Reading, ReadingOf } from '@/lib/contracts/readings';

/** Heights, depths and places no further apart are one place, as the engine has it; from memory. */
const SAME_PLACE_MM = 40;
/** Studs stand 400 or more apart. */
const SAME_STUD_MM = 100;

/**
 * Whether two readings are of the same thing, so that their figures can be held side by side.
 *
 * Edge: gaps, drops and rises are comparable only inside one set-up, and so never across two people.
 * Example: wall B at 36" and at 37" is one thing; at 36" and 60" it is two.
 */
export function isSameThing(one: Reading, other: Reading): boolean {
  switch (one.kind) {
    case 'length':
      return (
        other.kind === 'length' &&
        one.wallId === other.wallId &&
        isNearPlace(one.yMm, other.yMm) &&
        isNearPlace(one.zMm, other.zMm)
      );
    case 'pieces':
      return (
        other.kind === 'pieces' && one.wallId === other.wallId && isNearPlace(one.zMm, other.zMm)
      );
    case 'corner':
      return (
        other.kind === 'corner' &&
        one.cornerWallId === other.cornerWallId &&
        isNearPlace(one.zMm, other.zMm)
      );
    case 'diagonal':
      return (
        other.kind === 'diagonal' &&
        endsOf(one) === endsOf(other) &&
        isNearPlace(one.zMm, other.zMm)
      );
    case 'width':
      return (
        other.kind === 'width' &&
        one.wallId === other.wallId &&
        one.toWallId === other.toWallId &&
        isNearPlace(one.xMm, other.xMm)
      );
    case 'feature':
      return (
        other.kind === 'feature' &&
        one.wallId === other.wallId &&
        one.feature === other.feature &&
        overlaps(one, other)
      );
    case 'stud':
      return (
        other.kind === 'stud' &&
        one.wallId === other.wallId &&
        one.at === other.at &&
        Math.abs(one.xMm - other.xMm) <= SAME_STUD_MM
      );
    case 'doorway':
      return other.kind === 'doorway' && one.name === other.name;
    case 'face':
    case 'floor':
    case 'ceiling':
    case 'withdrawal':
    case 'skip':
      return false;
  }
}

/** Heights, depths and places that count as one. */
export function isNearPlace(one: number, other: number): boolean {
  return Math.abs(one - other) <= SAME_PLACE_MM;
}

function endsOf({ fromCornerWallId, toCornerWallId }: ReadingOf<'diagonal'>): string {
  return [fromCornerWallId, toCornerWallId].sort().join();
}

function overlaps(one: ReadingOf<'feature'>, other: ReadingOf<'feature'>): boolean {
  const along = Math.min(one.x1Mm, other.x1Mm) - Math.max(one.x0Mm, other.x0Mm);
  const up = Math.min(one.z1Mm, other.z1Mm) - Math.max(one.z0Mm, other.z0Mm);
  return along >= -SAME_PLACE_MM && up >= -SAME_PLACE_MM;
}
