/** Which readings a crew takes again before setting: the corners that runs stand in, and the fall of the floor. */
import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import { standingReadings } from '@/lib/measure/standing-readings';
import type { Released } from './as-found';

type Common = { key: string; toolId: string };
export type AsFoundAsk = Common &
  (
    | {
        kind: 'diagonal';
        corner: string;
        cornerWallId: string;
        zMm: number;
        legLeftMm: number;
        legRightMm: number;
        carriedPast: boolean;
        /** As it was read for the sheet. */
        wasMm: number;
      }
    | { kind: 'angle'; corner: string; cornerWallId: string; zMm: number; wasDeg: number }
    | { kind: 'drop'; at: 'high' | 'low'; wallId: string; wall: string; xMm: number; yMm: number }
  );

/**
 * The questions, corners first. Each corner is read as the measurer read it, with the same legs at the same
 * height, so that one number answers it; the floor at its highest and at its lowest place, off one level line.
 *
 * Edge: a corner that no run touches is not asked; a floor with one reading has no fall to ask for.
 * Example: an L of two runs in corner A–B asks its diagonal, and the drops at the high and the low point.
 */
export function asFoundAsks({ wallBook, runs, fit }: Released): AsFoundAsk[] {
  const standing = standingReadings(wallBook.readings);
  const walls = wallBook.room.chains.flatMap((chain) => chain.walls);
  const corners = fit.corners.filter(({ cornerWallId, leftWallId }) =>
    runs.some((run) => run.wallId === cornerWallId || run.wallId === leftWallId),
  );
  return [
    ...corners.flatMap((corner) => cornerAsk(corner, standing)),
    ...floorAsks(
      fit.floor,
      standing,
      (wallId) => walls.find(({ id }) => id === wallId)?.name ?? '',
    ),
  ];
}

function cornerAsk(
  { cornerWallId, name }: { cornerWallId: string; name: string },
  standing: readonly Reading[],
): AsFoundAsk[] {
  const read = standing
    .filter((one): one is ReadingOf<'corner'> => one.kind === 'corner')
    .filter((one) => one.cornerWallId === cornerWallId)
    // The height that the boxes stand at: the one nearest the counter.
    .sort((one, other) => Math.abs(one.zMm - 900) - Math.abs(other.zMm - 900))[0];
  if (!read) return [];
  const common = {
    key: `corner:${cornerWallId}`,
    toolId: read.toolId,
    corner: name,
    cornerWallId,
    zMm: read.zMm,
  };
  if (read.by.method === 'angle') {
    return [{ ...common, kind: 'angle', wasDeg: read.by.angleDeg }];
  }
  const { legLeftMm, legRightMm, diagonalMm, carriedPast } = read.by;
  return [{ ...common, kind: 'diagonal', legLeftMm, legRightMm, carriedPast, wasMm: diagonalMm }];
}

function floorAsks(
  floor: Released['fit']['floor'],
  standing: readonly Reading[],
  wallName: (wallId: string) => string,
): AsFoundAsk[] {
  if (!floor || floor.highPoint.readingId === floor.lowPoint.readingId) return [];
  return (['high', 'low'] as const).flatMap((at) => {
    const point = at === 'high' ? floor.highPoint : floor.lowPoint;
    const read = standing.find(({ id }) => id === point.readingId);
    if (read?.kind !== 'floor') return [];
    const { wallId, xMm, yMm, toolId } = read;
    return [
      { key: `drop:${at}`, kind: 'drop', at, toolId, wallId, wall: wallName(wallId), xMm, yMm },
    ] satisfies AsFoundAsk[];
  });
}

type Taken = {
  id: string;
  roomId: string;
  takenAt: string;
  unit: 'in' | 'mm';
  typed: string;
  /** The level line of this crew, one for all drops. */
  setUpId: string;
  /** Millimetres, or degrees of an angle. */
  value: number;
};

/** The reading that an answer makes. */
export function asFoundReading(ask: AsFoundAsk, taken: Taken): Reading {
  const { setUpId, value, ...said } = taken;
  const common = { ...said, toolId: ask.toolId, touches: 'board' as const };
  if (ask.kind === 'drop') {
    const { wallId, xMm, yMm } = ask;
    return { ...common, kind: 'floor', wallId, xMm, yMm, dropMm: value, setUpId };
  }
  const { cornerWallId, zMm } = ask;
  if (ask.kind === 'angle') {
    return {
      ...common,
      kind: 'corner',
      cornerWallId,
      zMm,
      by: { method: 'angle', angleDeg: value },
    };
  }
  const { legLeftMm, legRightMm, carriedPast } = ask;
  const by = { method: 'legs', legLeftMm, legRightMm, diagonalMm: value, carriedPast } as const;
  return { ...common, kind: 'corner', cornerWallId, zMm, by };
}
