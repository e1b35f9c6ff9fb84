/** Where the adjustment begins: the walls laid out as read (as drawn where not read), roughly closed. */
import type { RoomLayout } from './room-layout';
import type { RoomObservation, RoomShape } from './room-observations';

/** Room between facing chains where nothing says better; only a place to start from. */
const USUAL_GALLEY_MM = 2_500;

/**
 * Approximate coordinates of every point, x and y by point.
 *
 * Edge: a chain tied to another by widths is laid facing it, middle to middle; untied, it lies beside it.
 */
export function startingPoints(
  room: RoomShape,
  layout: RoomLayout,
  observations: RoomObservation[],
): { x: Float64Array; y: Float64Array } {
  const x = new Float64Array(layout.points.length);
  const y = new Float64Array(layout.points.length);
  const lengths = readLengths(layout, observations);
  const turns = readTurns(room, layout, observations);
  layout.chainStarts.forEach((start, chain) => {
    let heading = 0;
    let atX = 0;
    let atY = 0;
    const walk: [number, number][] = [[0, 0]];
    for (let i = 0; i < start.wallCount; i++) {
      if (i > 0) heading += turns[start.wall + i] ?? 0;
      const length = lengths[start.wall + i] ?? 0;
      atX += length * Math.cos(heading);
      atY += length * Math.sin(heading);
      walk.push([atX, atY]);
    }
    if (start.closed) shareMisclosure(walk, lengths, start.wall);
    const place =
      layout.chainTied[chain] === true
        ? placeFacing(layout, observations, chain, walk, { x, y })
        : { cos: 1, sin: 0, x: 0, y: chain * 2 * USUAL_GALLEY_MM };
    walk.slice(0, start.closed ? -1 : undefined).forEach(([px, py], i) => {
      x[start.point + i] = place.x + place.cos * px - place.sin * py;
      y[start.point + i] = place.y + place.sin * px + place.cos * py;
    });
    if (layout.chainTied[chain] !== true) turnFirstWallToX(start, x, y);
  });
  return { x, y };
}

function readLengths(layout: RoomLayout, observations: RoomObservation[]): number[] {
  const read = layout.walls.map((): number[] => []);
  for (const observation of observations) {
    if (observation.kind !== 'length') continue;
    read[layout.wallById.get(observation.wallId) ?? -1]?.push(observation.valueMm);
  }
  return layout.walls.map((wall, i) => middleOf(read[i] ?? []) ?? wall.nominalLengthMm);
}

/** Turn in radians from the wall before into each wall: 180° less the interior angle. */
function readTurns(room: RoomShape, layout: RoomLayout, observations: RoomObservation[]): number[] {
  const read = layout.walls.map((): number[] => []);
  for (const observation of observations) {
    if (observation.kind !== 'corner') continue;
    read[layout.wallById.get(observation.cornerWallId) ?? -1]?.push(observation.angleDeg);
  }
  const nominal = room.chains.flatMap((chain) => chain.walls.map((wall) => wall.leftCornerDeg));
  return layout.walls.map((_, i) => {
    const angle = middleOf(read[i] ?? []) ?? nominal[i] ?? 90;
    return ((180 - angle) * Math.PI) / 180;
  });
}

function middleOf(values: number[]): number | null {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor((sorted.length - 1) / 2)] ?? null;
}

/** Compass rule on the walk's points, so that the last falls on the first. */
function shareMisclosure(walk: [number, number][], lengths: number[], firstWall: number): void {
  const last = walk[walk.length - 1] ?? [0, 0];
  const [gapX, gapY] = [last[0], last[1]];
  const total = walk.slice(1).reduce((sum, _, i) => sum + (lengths[firstWall + i] ?? 0), 0);
  let run = 0;
  walk.forEach((point, i) => {
    if (i === 0 || total === 0) return;
    run += lengths[firstWall + i - 1] ?? 0;
    point[0] -= (gapX * run) / total;
    point[1] -= (gapY * run) / total;
  });
}

/** Turns and shifts a tied chain so that its wall faces, middle to middle, the wall it was read from. */
function placeFacing(
  layout: RoomLayout,
  observations: RoomObservation[],
  chain: number,
  walk: [number, number][],
  placed: { x: Float64Array; y: Float64Array },
): { cos: number; sin: number; x: number; y: number } {
  const start = layout.chainStarts[chain]?.wall ?? 0;
  for (const observation of observations) {
    if (observation.kind !== 'width') continue;
    const one = layout.wallById.get(observation.wallId) ?? -1;
    const other = layout.wallById.get(observation.toWallId) ?? -1;
    const here = layout.walls[one]?.chain === chain ? one : other;
    const there = layout.walls[here === one ? other : one];
    const from = walk[here - start];
    const to = walk[here - start + 1];
    if (layout.walls[here]?.chain !== chain || !there || there.chain >= chain || !from || !to)
      continue;
    const thereX = [placed.x[there.left] ?? 0, placed.x[there.right] ?? 0] as const;
    const thereY = [placed.y[there.left] ?? 0, placed.y[there.right] ?? 0] as const;
    const heading = Math.atan2(thereY[1] - thereY[0], thereX[1] - thereX[0]);
    const turn = heading + Math.PI - Math.atan2(to[1] - from[1], to[0] - from[0]);
    const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
    const [middleX, middleY] = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
    return {
      cos,
      sin,
      x:
        (thereX[0] + thereX[1]) / 2 -
        Math.sin(heading) * observation.valueMm -
        cos * middleX +
        sin * middleY,
      y:
        (thereY[0] + thereY[1]) / 2 +
        Math.cos(heading) * observation.valueMm -
        sin * middleX -
        cos * middleY,
    };
  }
  const endX = walk[walk.length - 1]?.[0] ?? 0;
  return { cos: -1, sin: 0, x: endX, y: Math.max(0, ...placed.y) + USUAL_GALLEY_MM };
}

/** The first wall of a chain that stands alone lies along x, as its fixed heading wants it. */
function turnFirstWallToX(
  start: { point: number; wallCount: number; closed: boolean },
  x: Float64Array,
  y: Float64Array,
): void {
  const originX = x[start.point] ?? 0;
  const originY = y[start.point] ?? 0;
  const dx = (x[start.point + 1] ?? 0) - originX;
  const dy = (y[start.point + 1] ?? 0) - originY;
  const length = Math.hypot(dx, dy);
  if (length === 0) return;
  const count = start.closed ? start.wallCount : start.wallCount + 1;
  for (let i = 0; i < count; i++) {
    const px = (x[start.point + i] ?? 0) - originX;
    const py = (y[start.point + i] ?? 0) - originY;
    x[start.point + i] = originX + (px * dx + py * dy) / length;
    y[start.point + i] = originY + (py * dx - px * dy) / length;
  }
  y[start.point + 1] = originY;
}
