import type { Room, Wall } from '@/lib/contracts/wall-book';

/** Every wall of a room with the wall before it, in walking order; null where a chain begins in the open. */
export function wallsOf(room: Room): { wall: Wall; before: Wall | null }[] {
  return room.chains.flatMap(({ walls, closed }) =>
    walls.map((wall, index) => ({
      wall,
      before: walls[index - 1] ?? (closed ? (walls.at(-1) ?? null) : null),
    })),
  );
}

/** "Wall B"; "a wall no longer drawn" where the room has none of this id. */
export function wallName(room: Room, wallId: string): string {
  const found = wallsOf(room).find(({ wall }) => wall.id === wallId);
  return found ? `Wall ${found.wall.name}` : 'A wall no longer drawn';
}

/** The corner at a wall's left end: "A–B"; the free end where a chain begins: "start of B". */
export function cornerName(room: Room, wallId: string): string {
  const found = wallsOf(room).find(({ wall }) => wall.id === wallId);
  if (!found) return 'no longer drawn';
  return found.before ? `${found.before.name}–${found.wall.name}` : `start of ${found.wall.name}`;
}
