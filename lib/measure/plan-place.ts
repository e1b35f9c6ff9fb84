/** A place along and out of a wall as a place of the adjusted plan. */
import type { FitContext } from '@/lib/measure/fit-context';

/** Null while the room cannot be laid out. */
export function planPlace(
  { room }: Pick<FitContext, 'room'>,
  place: { wallId: string; xMm: number; yMm: number },
): { xMm: number; yMm: number } | null {
  const corner = room?.corners.find(({ cornerWallId }) => cornerWallId === place.wallId);
  const wall = room?.walls.find(({ wallId }) => wallId === place.wallId);
  if (!corner || !wall) return null;
  const heading = (wall.headingDeg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(heading), Math.sin(heading)];
  return {
    xMm: corner.xMm + place.xMm * cos - place.yMm * sin,
    yMm: corner.yMm + place.xMm * sin + place.yMm * cos,
  };
}
