import type { Wall } from '@/lib/contracts/wall-book';
import type { Chains } from './room-shapes';

/** A chimney breast until it is typed: 5 ft wide, 15 in deep. A bay: 2 ft slants, 4 ft between. */
const BREAST_MM = { width: 1_524, depth: 381 };
const BAY_MM = { slant: 609.6, width: 1_219.2 };
/** A piece of wall left over beside them is never drawn shorter. */
const LEAST_PIECE_MM = 300;

/** A wall's length as drawn. */
export function setLength(chains: Chains, wallId: string, nominalLengthMm: number): Chains {
  return withWall(chains, wallId, (wall) => [{ ...wall, nominalLengthMm }]);
}

/** The corner at a wall's left; the free end of an open chain has none. */
export function setCorner(chains: Chains, wallId: string, leftCornerDeg: number): Chains {
  return withWall(chains, wallId, (wall) => [
    wall.leftCornerDeg === null ? wall : { ...wall, leftCornerDeg },
  ]);
}

/** One wall more after this one, round a corner. */
export function addWallAfter(
  chains: Chains,
  wallId: string,
  { id, cornerDeg, lengthMm }: { id: string; cornerDeg: number; lengthMm: number },
): Chains {
  return withWall(chains, wallId, (wall) => [
    wall,
    { id, name: '', nominalLengthMm: lengthMm, leftCornerDeg: cornerDeg },
  ]);
}

/**
 * A chimney breast in the middle of a wall: its face stands into the room, so the wall becomes five.
 *
 * Example: A becomes A, a cheek at 90°, the face at 270°, a cheek at 270°, the rest of A at 90°.
 */
export function insertBreast(chains: Chains, wallId: string, newId: () => string): Chains {
  const { width, depth } = BREAST_MM;
  return insertBulge(chains, wallId, newId, width, [
    { lengthMm: depth, cornerDeg: 90 },
    { lengthMm: width, cornerDeg: 270 },
    { lengthMm: depth, cornerDeg: 270 },
    { lengthMm: 0, cornerDeg: 90 },
  ]);
}

/** A bay in the middle of a wall, out of the room by two slants at 45°. */
export function insertBay(chains: Chains, wallId: string, newId: () => string): Chains {
  const { slant, width } = BAY_MM;
  return insertBulge(chains, wallId, newId, width + slant * Math.SQRT2, [
    { lengthMm: slant, cornerDeg: 225 },
    { lengthMm: width, cornerDeg: 135 },
    { lengthMm: slant, cornerDeg: 135 },
    { lengthMm: 0, cornerDeg: 225 },
  ]);
}

/**
 * The room without a wall; the corner left behind turns as the two did together.
 *
 * Edge: the last wall of a room stays. An end of a chain that is taken away leaves a free end.
 * Example: corners of 90° and 270° with the wall between them gone: 180°.
 */
export function removeWall(chains: Chains, wallId: string): Chains {
  const wallCount = chains.reduce((sum, { walls }) => sum + walls.length, 0);
  if (wallCount <= 1) return chains;
  return chains
    .map((chain) => {
      const at = chain.walls.findIndex(({ id }) => id === wallId);
      if (at < 0) return chain;
      const closed = chain.closed && chain.walls.length > 3;
      const gone = chain.walls[at];
      const next = chain.walls[(at + 1) % chain.walls.length];
      const walls = chain.walls
        .map((wall) =>
          wall === next && gone ? { ...wall, leftCornerDeg: joined(gone, wall) } : wall,
        )
        .filter(({ id }) => id !== wallId);
      return { closed, walls: closed ? walls : withFreeStart(walls) };
    })
    .filter(({ walls }) => walls.length > 0);
}

function withWall(chains: Chains, wallId: string, change: (wall: Wall) => Wall[]): Chains {
  return chains.map((chain) => ({
    ...chain,
    walls: chain.walls.flatMap((wall) => (wall.id === wallId ? change(wall) : [wall])),
  }));
}

function insertBulge(
  chains: Chains,
  wallId: string,
  newId: () => string,
  takesMm: number,
  pieces: { lengthMm: number; cornerDeg: number }[],
): Chains {
  return withWall(chains, wallId, (wall) => {
    const restMm = Math.max(LEAST_PIECE_MM, (wall.nominalLengthMm - takesMm) / 2);
    return [
      { ...wall, nominalLengthMm: restMm },
      ...pieces.map(({ lengthMm, cornerDeg }) => ({
        id: newId(),
        name: '',
        nominalLengthMm: lengthMm || restMm,
        leftCornerDeg: cornerDeg,
      })),
    ];
  });
}

/** Headings turn by 180 − corner; a turn right round is no corner, so it is drawn square. */
function joined(gone: Wall, next: Wall): number | null {
  if (gone.leftCornerDeg === null) return null;
  const corner = gone.leftCornerDeg + (next.leftCornerDeg ?? 90) - 180;
  return corner > 0 && corner < 360 ? corner : 90;
}

function withFreeStart([first, ...others]: Wall[]): Wall[] {
  return first ? [{ ...first, leftCornerDeg: null }, ...others] : [];
}
