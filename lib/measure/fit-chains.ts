/** Each chain of walls walked as read: the picture of how it closes, before any adjustment. */
import { type Figure, figure } from '@/lib/measure/figure';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { planHeight } from '@/lib/measure/plan-context';
import type { ChainClosure } from '@/lib/measure/room-closure';
import type { WalkedWall } from '@/lib/measure/room-walk';

type Side = { wallId: string; length: Figure | null; lengthMm: number };
type Turn = { angle: Figure | null; angleDeg: number };

export function fitChains(context: FitContext): ChainClosure[] {
  return context.book.room.chains.map((_, index) => {
    const walls = context.walk.walls.filter(({ chain }) => chain === index);
    return fitChain(context, walls);
  });
}

function fitChain(context: FitContext, walls: WalkedWall[]): ChainClosure {
  const closed = walls[0]?.closed ?? false;
  const sides = walls.map(({ wall }): Side => {
    const length = lengthAtPlan(context, wall.id);
    return { wallId: wall.id, length, lengthMm: length?.value ?? wall.nominalLengthMm };
  });
  const turns = walls.map(({ wall, leftCornerDeg }): Turn => {
    const angle = context.corners.find(({ cornerWallId }) => cornerWallId === wall.id)?.angle;
    return { angle: angle ?? null, angleDeg: angle?.value ?? leftCornerDeg ?? 90 };
  });
  const base = {
    wallIds: walls.map(({ wall }) => wall.id),
    closed,
    walk: walkSides(sides, turns, 0),
  };
  const allTurned = turns.every(({ angle }) => angle !== null);
  const allRead = sides.every(({ length }) => length !== null);
  if (!closed || !allTurned) {
    return { ...base, angle: null, linear: null, relativePrecision: null, areaMm2: null };
  }
  const angle = angleMisclosure(turns);
  if (!allRead) {
    const misclosure = fitFigure('room-angle-misclosure', angle);
    return { ...base, angle: misclosure, linear: null, relativePrecision: null, areaMm2: null };
  }
  const balanced = walkSides(sides, turns, angle.value / turns.length);
  const linear = linearMisclosure(sides, turns, balanced);
  const roundMm = sides.reduce((sum, { lengthMm }) => sum + lengthMm, 0);
  return {
    ...base,
    angle: fitFigure('room-angle-misclosure', angle),
    linear: fitFigure('room-linear-misclosure', linear),
    relativePrecision: linear.value > 1e-6 ? roundMm / linear.value : null,
    areaMm2: areaOf(balanced),
  };
}

/** The height of the plan, or the nearest to it that was read at the wall. */
function lengthAtPlan(context: FitContext, wallId: string): Figure | null {
  const zMm = planHeight(context.rules);
  const read = context.lengths.filter((one) => one.wallId === wallId && one.yMm === 0);
  const sorted = [...read].sort((a, b) => Math.abs(a.zMm - zMm) - Math.abs(b.zMm - zMm));
  return sorted[0]?.length ?? null;
}

/** Corners of the walk and its end; each angle is lessened by its share of the misclosure. */
function walkSides(sides: Side[], turns: Turn[], shareDeg: number): { xMm: number; yMm: number }[] {
  const walk = [{ xMm: 0, yMm: 0 }];
  let heading = 0;
  sides.forEach(({ lengthMm }, i) => {
    if (i > 0) heading += ((180 - ((turns[i]?.angleDeg ?? 90) - shareDeg)) * Math.PI) / 180;
    const last = walk[walk.length - 1] ?? { xMm: 0, yMm: 0 };
    walk.push({
      xMm: last.xMm + lengthMm * Math.cos(heading),
      yMm: last.yMm + lengthMm * Math.sin(heading),
    });
  });
  return walk;
}

function angleMisclosure(turns: Turn[]): Figure {
  const sum = turns.reduce((total, { angleDeg }) => total + angleDeg, 0);
  const u = Math.hypot(...turns.map(({ angle }) => angle?.u ?? 0));
  const from = turns.flatMap(({ angle }) => angle?.from ?? []);
  return figure(sum - (turns.length - 2) * 180, u, from);
}

/** How far the balanced walk ends from where it began; u along the gap, by the partial derivatives. */
function linearMisclosure(
  sides: Side[],
  turns: Turn[],
  walk: { xMm: number; yMm: number }[],
): Figure {
  const end = walk[walk.length - 1] ?? { xMm: 0, yMm: 0 };
  const gapMm = Math.hypot(end.xMm, end.yMm);
  const [ux, uy] = gapMm > 0 ? [end.xMm / gapMm, end.yMm / gapMm] : [1, 0];
  const n = turns.length;
  // An angle turns everything after it; balancing takes its nth part off every angle.
  const swing = walk.map((corner) => -ux * (end.yMm - corner.yMm) + uy * (end.xMm - corner.xMm));
  const swings = turns.map((_, i) => (i > 0 ? (swing[i] ?? 0) : 0));
  const mean = swings.reduce((sum, value) => sum + value, 0) / n;
  const parts = sides.map(({ length }, i) => {
    const from = walk[i] ?? { xMm: 0, yMm: 0 };
    const to = walk[i + 1] ?? from;
    const along = Math.hypot(to.xMm - from.xMm, to.yMm - from.yMm) || 1;
    return (((to.xMm - from.xMm) * ux + (to.yMm - from.yMm) * uy) / along) * (length?.u ?? 0);
  });
  const bent = turns.map(
    ({ angle }, i) => ((swings[i] ?? 0) - mean) * ((angle?.u ?? 0) * (Math.PI / 180)),
  );
  const ids = [
    ...sides.flatMap(({ length }) => length?.from ?? []),
    ...turns.flatMap(({ angle }) => angle?.from ?? []),
  ];
  return figure(gapMm, Math.hypot(...parts, ...bent), [...new Set(ids)]);
}

function areaOf(walk: { xMm: number; yMm: number }[]): number {
  const corners = walk.slice(0, -1);
  const twice = corners.reduce((sum, here, i) => {
    const next = corners[(i + 1) % corners.length] ?? here;
    return sum + here.xMm * next.yMm - next.xMm * here.yMm;
  }, 0);
  return Math.abs(twice) / 2;
}
