import { planRoom, type RoomPlan } from '@/db/seed/demo-rooms';
import { measureRoom } from '@/db/seed/measure-room';
import { seededRandom } from '@/db/seed/seeded-random';
import { angleAt, lengthOf } from '@/db/seed/true-room';
import type { Reading } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { Tool } from '@/lib/contracts/wall-book';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';

const planned = (plan: RoomPlan) =>
  planRoom(plan, defaultShopRules('US').fit, seededRandom(1)).truth;

/** A nearly true kitchen that stands nowhere, 142 by 120 inches or so; the walls A to D of a room drawn all round. */
const truth = planned('nearly-true');

/** An L, 166 by 142 inches or so: six walls, of which D begins at an outside corner. */
export const sixWalls = planned('misread');
export const sixWallsInches = [166, 82, 71, 59, 95, 142];

export const trueAngleDeg = (wallIndex: number, zMm: number) => angleAt(truth, wallIndex, zMm);
export const trueLengthMm = (wallIndex: number, zMm: number) => lengthOf(truth, wallIndex, zMm);

/** What a measurer reads off it to everything that the program asks of this book, in the order asked. */
export function readOff({ wallBook, runs, rules }: WallBookView, of = truth): Reading[] {
  const toolOf = (kind: Tool['spec']['kind']) => {
    const tool = wallBook.tools.find(({ spec }) => spec.kind === kind);
    if (!tool) throw new Error(`the shop has no ${kind}`);
    return tool;
  };
  return measureRoom({
    truth: of,
    room: wallBook.room,
    runs,
    rules,
    tools: { tape: toolOf('tape'), level: toolOf('level') },
    random: seededRandom(1871),
    startedAt: new Date(),
  });
}

/** What was read and where, to the sixteenth, without the ids that a phone makes. */
export function inShort(reading: Reading): string {
  const sixteenths = (mm: number) => Math.round((mm * 16) / 25.4);
  switch (reading.kind) {
    case 'corner':
      return `corner ${reading.cornerWallId} ${'diagonalMm' in reading.by ? sixteenths(reading.by.diagonalMm) : ''}`;
    case 'length':
      return `length ${reading.wallId} ${reading.zMm} ${sixteenths(reading.valueMm)}`;
    case 'diagonal':
      return `diagonal ${reading.fromCornerWallId} ${sixteenths(reading.valueMm)}`;
    default:
      return reading.kind;
  }
}
