import type { Chains } from './room-shapes';
import { walk } from './walk';

const LEAST_WALL_MM = 100;

/**
 * Rough lengths that meet: in a closed chain the walls nobody typed give way, as little as they can.
 *
 * Edge: when all are typed, or those left cannot make up the gap, the lengths stay as they are; a rough
 * sketch may gape. Walls do not get shorter than 100 mm.
 * Example: four walls, A typed 4000: C becomes 4000.
 * Source: least Σ(change²) under the two closing conditions (normal equations of two unknowns).
 */
export function closeSketch(chains: Chains, typedWallIds: ReadonlySet<string>): Chains {
  return chains.map((chain) => (chain.closed ? closeChain(chain, typedWallIds) : chain));
}

/** The sum of the corners of a closed chain against what walls that meet must have; null when it is right. */
export function cornerSumWords(chains: Chains): string | null {
  for (const { closed, walls } of chains) {
    if (!closed) continue;
    const sum = walls.reduce((total, { leftCornerDeg }) => total + (leftCornerDeg ?? 0), 0);
    const needed = (walls.length - 2) * 180;
    if (Math.abs(sum - needed) < 0.5) continue;
    return `The corners add up to ${Math.round(sum)}°; ${walls.length} walls that meet have ${needed}°. Set another corner.`;
  }
  return null;
}

function closeChain(chain: Chains[number], typed: ReadonlySet<string>): Chains[number] {
  const points = walk(
    chain.walls.map(({ nominalLengthMm, leftCornerDeg }) => ({
      lengthMm: nominalLengthMm,
      cornerDeg: leftCornerDeg ?? 90,
    })),
  );
  const end = points.at(-1) ?? { xMm: 0, yMm: 0 };
  const free = chain.walls.flatMap((wall, at) => {
    const [from, to] = [points[at], points[at + 1]];
    if (!from || !to || typed.has(wall.id) || wall.nominalLengthMm === 0) return [];
    const along = {
      x: (to.xMm - from.xMm) / wall.nominalLengthMm,
      y: (to.yMm - from.yMm) / wall.nominalLengthMm,
    };
    return [{ wall, along }];
  });
  const pull = solveTwo(
    free.map(({ along }) => along),
    -end.xMm,
    -end.yMm,
  );
  const changes = new Map(
    free.map(({ wall, along }) => [wall.id, pull.x * along.x + pull.y * along.y]),
  );
  const walls = chain.walls.map((wall) => {
    const change = changes.get(wall.id) ?? 0;
    const length = Math.round((wall.nominalLengthMm + change) * 10) / 10;
    return change === 0 ? wall : { ...wall, nominalLengthMm: Math.max(LEAST_WALL_MM, length) };
  });
  return { ...chain, walls };
}

/** λ of Σ(d dᵀ)·λ = gap; where the free walls all run one way, along that way only. */
function solveTwo(along: { x: number; y: number }[], gapX: number, gapY: number) {
  const sum = (of: (each: { x: number; y: number }) => number) =>
    along.reduce((total, each) => total + of(each), 0);
  const [xx, xy, yy] = [sum(({ x }) => x * x), sum(({ x, y }) => x * y), sum(({ y }) => y * y)];
  const determinant = xx * yy - xy * xy;
  if (Math.abs(determinant) > 1e-6) {
    return {
      x: (yy * gapX - xy * gapY) / determinant,
      y: (xx * gapY - xy * gapX) / determinant,
    };
  }
  const [first] = along;
  if (!first) return { x: 0, y: 0 };
  const pull = (gapX * first.x + gapY * first.y) / along.length;
  return { x: pull * first.x, y: pull * first.y };
}
