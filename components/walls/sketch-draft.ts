import type { Room } from '@/lib/contracts/wall-book';
import { closeSketch } from '@/lib/walls-pad/close-sketch';
import { namedWalls } from '@/lib/walls-pad/name-walls';
import type { Chains } from '@/lib/walls-pad/room-shapes';

/** A room half drawn; plain JSON, kept at every touch. */
export type SketchDraft = {
  step: 'shape' | 'walls' | 'site';
  chains: Chains;
  /** Walls whose length was typed: the others give way when a closed room must close. */
  typedWallIds: string[];
  name: string;
  wallThicknessToComeMm: number;
  floorToComeMm: number;
  /** Asked where a floor is still to come. */
  cabinetsStandOn: 'finished-floor' | 'rough-floor';
};

export function startSketch(room: Room): SketchDraft {
  const { chains, name, wallThicknessToComeMm, floorToComeMm, cabinetsStandOn } = room;
  const walls = chains.flatMap((chain) => chain.walls);
  return {
    step: walls.length > 0 ? 'walls' : 'shape',
    chains,
    typedWallIds: walls.map(({ id }) => id),
    name: name || 'Kitchen',
    wallThicknessToComeMm,
    floorToComeMm,
    cabinetsStandOn: cabinetsStandOn ?? 'finished-floor',
  };
}

/** The room as it is kept. A sketch begun by an older program does not say what the cabinets stand on. */
export function roomOfSketch(roomId: string, draft: SketchDraft): Room {
  const { name, chains, wallThicknessToComeMm, floorToComeMm, cabinetsStandOn } = draft;
  const room = { id: roomId, name, chains, wallThicknessToComeMm, floorToComeMm };
  return floorToComeMm > 0 && cabinetsStandOn ? { ...room, cabinetsStandOn } : room;
}

/** Names and closes what was changed; walls with readings keep their names. */
export function withChains(
  draft: SketchDraft,
  chains: Chains,
  keptWallIds: ReadonlySet<string>,
): SketchDraft {
  const closed = closeSketch(chains, new Set([...draft.typedWallIds, ...keptWallIds]));
  return { ...draft, chains: namedWalls(closed, keptWallIds) };
}
