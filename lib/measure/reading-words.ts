/** A reading named as a measurer would name it: "Wall B, length at the counter". */
import type { FitRules } from '@/lib/contracts/shop-rules';
import { heightWords, lengthWords } from '@/lib/measure/plan-context';
import type { RoomObservation } from '@/lib/measure/room-observations';
import { cornerName, type RoomWalk } from '@/lib/measure/room-walk';

/** "Wall B, length at the counter"; a wall that is gone is named "?". */
export function observationWords(
  walk: RoomWalk,
  rules: FitRules,
  observation: RoomObservation,
): string {
  const name = (wallId: string) => walk.byId.get(wallId)?.wall.name ?? '?';
  switch (observation.kind) {
    case 'length': {
      const out = observation.yMm > 0 ? `, ${lengthWords(observation.yMm, rules)} out` : '';
      const { piecesMm } = observation;
      if (piecesMm) {
        return `Wall ${name(observation.wallId)}, ${piecesMm.length} pieces ${heightWords(observation.zMm, rules)}`;
      }
      return `Wall ${name(observation.wallId)}, length ${heightWords(observation.zMm, rules)}${out}`;
    }
    case 'corner': {
      const walked = walk.byId.get(observation.cornerWallId);
      return `Corner ${walked ? cornerName(walked) : '?'}, ${heightWords(observation.zMm, rules)}`;
    }
    case 'diagonal':
      return `Diagonal, ${observation.from.end} of wall ${name(observation.from.wallId)} to ${observation.to.end} of wall ${name(observation.to.wallId)}`;
    case 'width':
      return `Width from wall ${name(observation.wallId)} to wall ${name(observation.toWallId)}`;
    case 'plumb':
      return `Wall ${name(observation.wallId)}, plumb`;
  }
}
