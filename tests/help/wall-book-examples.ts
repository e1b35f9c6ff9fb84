import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { Room, Tool, WallBook } from '@/lib/contracts/wall-book';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import type { Queued, QueuedWork } from '@/lib/sync/queued';
import { roomIdOf } from '@/lib/sync/queued';

/** A small invented room for tests of the phone: walls A B C D, 4000 × 3000 mm, every corner square. */
export const exampleRoomId = id(1);
export const wallIds = { A: id(11), B: id(12), C: id(13), D: id(14) };

export const exampleTape: Tool = {
  id: id(21),
  name: 'Tape',
  spec: { kind: 'tape', accuracyClass: 'II', stepMm: 1, repeatabilityMm: 0.3 },
};
export const exampleLevel: Tool = {
  id: id(22),
  name: 'Level',
  spec: { kind: 'level', mpeMmPerM: 0.5, stepMm: 0.5, repeatabilityMm: 0.3 },
};

export const exampleRoom: Room = {
  id: exampleRoomId,
  name: 'Kitchen',
  wallThicknessToComeMm: 0,
  floorToComeMm: 0,
  chains: [
    {
      closed: true,
      walls: [
        { id: wallIds.A, name: 'A', nominalLengthMm: 4_000, leftCornerDeg: 90 },
        { id: wallIds.B, name: 'B', nominalLengthMm: 3_000, leftCornerDeg: 90 },
        { id: wallIds.C, name: 'C', nominalLengthMm: 4_000, leftCornerDeg: 90 },
        { id: wallIds.D, name: 'D', nominalLengthMm: 3_000, leftCornerDeg: 90 },
      ],
    },
  ],
};

export const metricRules = defaultShopRules('UK').fit;
export const inchRules = defaultShopRules('US').fit;

export function exampleBook(readings: Reading[] = []): WallBook {
  return { room: exampleRoom, readings, tools: [exampleTape, exampleLevel] };
}

export function exampleView(readings: Reading[] = []): WallBookView {
  const wallBook = exampleBook(readings);
  return {
    jobId: id(2),
    jobTitle: 'Kitchen',
    customerName: 'Ada Example',
    wallBook,
    runs: [],
    rules: metricRules,
    missing: [],
    tools: wallBook.tools,
    submittedAt: null,
    readers: [],
  };
}

export function exampleLength(
  number: number,
  change: Partial<ReadingOf<'length'>> = {},
): ReadingOf<'length'> {
  return {
    id: id(1_000 + number),
    roomId: exampleRoomId,
    toolId: exampleTape.id,
    takenAt: '2026-12-01T09:00:00.000Z',
    typed: '4000',
    unit: 'mm',
    touches: 'board',
    kind: 'length',
    wallId: wallIds.A,
    zMm: 910,
    yMm: 0,
    valueMm: 4_000,
    ...change,
  };
}

export function queuedExample(
  order: number,
  work: QueuedWork,
  change: Partial<Queued> = {},
): Queued {
  const itemId = work.kind === 'reading' ? work.reading.id : id(5_000 + order);
  return {
    order,
    id: itemId,
    personId: 'ann',
    roomId: roomIdOf(work),
    work,
    parked: null,
    ...change,
  };
}

/** A valid v4 shape whose last digits are the number. */
export function id(number: number): string {
  return `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`;
}
