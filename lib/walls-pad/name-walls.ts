import type { Chains } from './room-shapes';

/**
 * Names walls A, B … in walking order; walls that have readings keep theirs, the others take what is free.
 *
 * Edge: after Z come AA, AB …
 * Example: A, new, B with readings on A and B: A, C, B.
 */
export function namedWalls(chains: Chains, keptWallIds: ReadonlySet<string> = new Set()): Chains {
  const walls = chains.flatMap((chain) => chain.walls);
  const taken = new Set(walls.filter(({ id }) => keptWallIds.has(id)).map(({ name }) => name));
  let count = 0;
  const nextName = () => {
    let name = letters(count++);
    while (taken.has(name)) name = letters(count++);
    return name;
  };
  return chains.map((chain) => ({
    ...chain,
    walls: chain.walls.map((wall) =>
      keptWallIds.has(wall.id) ? wall : { ...wall, name: nextName() },
    ),
  }));
}

function letters(count: number): string {
  const last = String.fromCharCode(65 + (count % 26));
  return count < 26 ? last : letters(Math.floor(count / 26) - 1) + last;
}
