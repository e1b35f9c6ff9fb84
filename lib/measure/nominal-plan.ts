/** The room as drawn: corner places in the plan, before anything is read. */
import type { Room } from '@/lib/contracts/wall-book';
import type { WallLine } from '@/lib/measure/sight-lines';

export type NominalPlan = {
  x: number[];
  y: number[];
  lines: WallLine[];
  /** The wall that begins at each point; null at the far end of an open chain. */
  wallAt: (string | null)[];
};

/**
 * Corners of the drawn room, walked chain by chain; x along the first wall, y into the room.
 * Edge rule: a chain that does not close as drawn is left open at its last corner; chains lie apart.
 * Example: four walls 3000, 2000, 3000, 2000 at 90° give corners 0,0 3000,0 3000,2000 0,2000.
 */
export function nominalPlan(
  room: Pick<Room, 'chains'>,
  lengthOf: (wallId: string) => number,
): NominalPlan {
  const plan: NominalPlan = { x: [], y: [], lines: [], wallAt: [] };
  for (const chain of room.chains) {
    const first = plan.x.length;
    let headingDeg = 0;
    let x = 0;
    let y = 0;
    chain.walls.forEach((wall, i) => {
      if (i > 0) headingDeg += 180 - (wall.leftCornerDeg ?? 90);
      plan.x.push(x);
      plan.y.push(y);
      plan.wallAt.push(wall.id);
      const isLast = i === chain.walls.length - 1;
      const left = first + i;
      plan.lines.push({
        left,
        right: isLast && chain.closed ? first : left + 1,
        closed: chain.closed,
      });
      const heading = (headingDeg * Math.PI) / 180;
      x += lengthOf(wall.id) * Math.cos(heading);
      y += lengthOf(wall.id) * Math.sin(heading);
    });
    if (chain.closed) continue;
    plan.x.push(x);
    plan.y.push(y);
    plan.wallAt.push(null);
  }
  return plan;
}
