import type { Room } from '@/lib/contracts/wall-book';
import type { AskedReading } from '@/lib/measure/missing-reading';
import { walkRoom } from '@/lib/measure/room-walk';
import type { CornerMethod, PadAsk } from './pad-fields';
import { type LengthSpeech, sayLength } from './say-length';

/** Where to hold the tool, in one line under the question. */
export function howToWords(
  ask: PadAsk,
  room: Room,
  speech: LengthSpeech,
  cornerMethod: CornerMethod,
): string {
  const say = (mm: number) => sayLength(mm, speech);
  const nameOf = (wallId: string) => walkRoom(room).byId.get(wallId)?.wall.name ?? '?';
  switch (ask.kind) {
    case 'length': {
      const out = ask.yMm > 1 ? ` · ${say(ask.yMm)} out from the wall` : '';
      return `${say(ask.zMm)} up · left corner to right corner${out}`;
    }
    case 'pieces':
      return `${say(ask.zMm)} up · mark the wall, then corner to mark, mark to mark, mark to corner`;
    case 'corner': {
      if (cornerMethod === 'angle') return `${say(ask.zMm)} up · the angle inside the room`;
      const walls = walkRoom(room).byId.get(ask.cornerWallId);
      const [left, right] = [walls?.before?.name ?? '?', walls?.wall.name ?? '?'];
      return ask.carriedPast
        ? `${say(ask.zMm)} up · straightedge along ${left} past the corner: mark it, mark ${right}`
        : `${say(ask.zMm)} up · mark ${left} and ${right}, then measure mark to mark`;
    }
    case 'face':
      return `${say(ask.xMm)} from the left corner · ${say(ask.zMm)} up · from the line to the wall`;
    case 'floor':
    case 'ceiling':
      return `${say(ask.xMm)} from the left corner · ${say(ask.yMm)} out · from the level line`;
    case 'diagonal':
      return `${say(ask.zMm)} up · corner to corner`;
    case 'width':
      return `${say(ask.zMm)} up · ${say(ask.xMm)} from the left of ${nameOf(ask.wallId)}, straight across to ${nameOf(ask.toWallId)}`;
    case 'stud':
      return 'from the left corner';
    case 'doorway':
      return 'past the leaf and the stop';
  }
}

/** The walls that a question is about, to be drawn thick. */
export function wallsOfAsk(ask: PadAsk, room: Room): string[] {
  switch (ask.kind) {
    case 'corner': {
      const placed = walkRoom(room).byId.get(ask.cornerWallId);
      return placed?.before ? [placed.before.id, ask.cornerWallId] : [ask.cornerWallId];
    }
    case 'diagonal':
    case 'doorway':
      return [];
    case 'width':
      return [ask.wallId, ask.toWallId];
    default:
      return [ask.wallId];
  }
}

/** The walls under which a question is listed: one for most, two for what goes across the room. */
export function wallsOfPlanned(ask: AskedReading): string[] {
  switch (ask.kind) {
    case 'corner':
      return [ask.cornerWallId];
    case 'diagonal':
      return [ask.fromCornerWallId, ask.toCornerWallId];
    case 'width':
      return [ask.wallId, ask.toWallId];
    case 'doorway':
      return [];
    default:
      return [ask.wallId];
  }
}
