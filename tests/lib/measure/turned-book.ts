/** The same wall book seen in a mirror, walked from another wall, or taken in another order. */
import type { Reading } from '@/lib/contracts/readings';
import type { Run, RunEnd } from '@/lib/contracts/runs';
import type { WallBook } from '@/lib/contracts/wall-book';

/** Left and right change places; every number stays. */
export function mirroredBook(book: WallBook): WallBook {
  const lengthOf = (wallId: string) => planLength(book, wallId);
  const chains = book.room.chains.map(({ closed, walls }) => ({
    closed,
    walls: walls
      .map((wall, i) => {
        const after = walls[i + 1] ?? (closed ? walls[0] : undefined);
        return { ...wall, leftCornerDeg: after?.leftCornerDeg ?? null };
      })
      .reverse(),
  }));
  const before = new Map(
    book.room.chains.flatMap(({ closed, walls }) =>
      walls.map((wall, i) => {
        const previous = walls[i - 1] ?? (closed ? walls[walls.length - 1] : undefined);
        return [wall.id, previous?.id ?? ''] as const;
      }),
    ),
  );
  const mirrored = (reading: Reading): Reading => {
    switch (reading.kind) {
      case 'corner': {
        const by =
          reading.by.method === 'angle'
            ? reading.by
            : {
                ...reading.by,
                legLeftMm: reading.by.legRightMm,
                legRightMm: reading.by.legLeftMm,
              };
        return { ...reading, cornerWallId: before.get(reading.cornerWallId) ?? '', by };
      }
      case 'diagonal':
        return {
          ...reading,
          fromCornerWallId: before.get(reading.fromCornerWallId) ?? '',
          toCornerWallId: before.get(reading.toCornerWallId) ?? '',
        };
      case 'face':
      case 'floor':
      case 'ceiling':
      case 'stud':
      case 'width':
        return { ...reading, xMm: lengthOf(reading.wallId) - reading.xMm };
      default:
        return reading;
    }
  };
  return { ...book, room: { ...book.room, chains }, readings: book.readings.map(mirrored) };
}

function planLength(book: WallBook, wallId: string): number {
  const length = book.readings.find(
    (reading) => reading.kind === 'length' && reading.wallId === wallId && reading.zMm === 910,
  );
  return length?.kind === 'length' ? length.valueMm : 0;
}

/** Places along the wall count from its other end, which lies at `lengthMm`. */
export function mirroredRun(run: Run, lengthMm: number): Run {
  const flip = (end: RunEnd): RunEnd => {
    if (end.kind === 'open') return { ...end, limitMm: lengthMm - end.limitMm };
    if (end.kind === 'casing' || end.kind === 'existing') {
      return { ...end, xMm: lengthMm - end.xMm };
    }
    return end;
  };
  const how = { left: 'right', right: 'left' } as const;
  const share =
    run.share.how === 'left' || run.share.how === 'right'
      ? { how: how[run.share.how] }
      : run.share.how === 'centred'
        ? { ...run.share, markMm: lengthMm - run.share.markMm }
        : run.share;
  return {
    ...run,
    left: flip(run.right),
    right: flip(run.left),
    units: [...run.units].reverse(),
    share,
  };
}

/** The closed room walked from its second wall. */
export function walkedFromNext(book: WallBook): WallBook {
  const chains = book.room.chains.map((chain) => ({
    ...chain,
    walls: [...chain.walls.slice(1), ...chain.walls.slice(0, 1)],
  }));
  return { ...book, room: { ...book.room, chains } };
}
