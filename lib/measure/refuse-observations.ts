/** Readings that no room can have, found before the adjustment begins. */
import type { Problem } from '@/lib/problem';
import { isOfARoom } from './measured';
import type { RoomObservation, RoomShape } from './room-observations';

/** Problems of the readings and the room as given; none lets the adjustment go on. */
export function refuseObservations(room: RoomShape, observations: RoomObservation[]): Problem[] {
  const problems: Problem[] = [];
  const walls = new Map<string, { hasLeftCorner: boolean }>();
  for (const chain of room.chains) {
    if (chain.walls.length === 0 || (chain.closed && chain.walls.length < 3)) {
      problems.push({
        code: 'chain-too-short',
        message:
          'A closed room needs at least three walls. Add the missing walls, or open the room.',
        about: chain.walls.map((wall) => wall.id),
        severity: 'error',
      });
    }
    chain.walls.forEach((wall, i) => {
      walls.set(wall.id, { hasLeftCorner: chain.closed || i > 0 });
    });
  }
  for (const observation of observations) {
    const problem = refuseOne(observation, walls);
    if (problem) problems.push(problem);
  }
  return problems;
}

function refuseOne(
  observation: RoomObservation,
  walls: Map<string, { hasLeftCorner: boolean }>,
): Problem | null {
  const named = wallsNamed(observation);
  const unknown = named.filter((wallId) => !walls.has(wallId));
  if (unknown.length > 0) {
    return refusal('unknown-wall', 'names a wall that this room has not got', observation);
  }
  if (observation.kind === 'corner' && !walls.get(observation.cornerWallId)?.hasLeftCorner) {
    return refusal('unknown-wall', 'names a corner where the wall begins in the open', observation);
  }
  if (named.length === 2 && isSamePlace(observation)) {
    return refusal('reading-impossible', 'goes from a place to the same place', observation);
  }
  if (!numbersOf(observation).every(isOfARoom) || !isPossible(observation)) {
    return refusal('reading-impossible', 'cannot be true', observation);
  }
  return null;
}

function refusal(code: string, what: string, observation: RoomObservation): Problem {
  return {
    code,
    message: `This ${nameOf(observation)} ${what}. Take it again, or withdraw it.`,
    about: observation.readingIds,
    severity: 'error',
  };
}

function nameOf(observation: RoomObservation): string {
  const names = {
    length: 'length',
    corner: 'corner angle',
    diagonal: 'diagonal',
    width: 'width across the room',
    plumb: 'plumb reading',
  };
  return names[observation.kind];
}

function wallsNamed(observation: RoomObservation): string[] {
  switch (observation.kind) {
    case 'corner':
      return [observation.cornerWallId];
    case 'diagonal':
      return [observation.from.wallId, observation.to.wallId];
    case 'width':
      return [observation.wallId, observation.toWallId];
    default:
      return [observation.wallId];
  }
}

function isSamePlace(observation: RoomObservation): boolean {
  if (observation.kind === 'width') return observation.wallId === observation.toWallId;
  if (observation.kind !== 'diagonal') return false;
  const { from, to } = observation;
  return from.wallId === to.wallId && from.end === to.end;
}

function numbersOf(observation: RoomObservation): number[] {
  const share = observation.tool?.uCommon ?? 0;
  switch (observation.kind) {
    case 'length':
      return [observation.valueMm, observation.uMm, observation.zMm, observation.yMm, share];
    case 'corner':
      return [
        observation.angleDeg,
        observation.uDeg,
        observation.armLeftMm,
        observation.armRightMm,
        observation.proudLeft?.valueMm ?? 0,
        observation.proudLeft?.uMm ?? 0,
        observation.proudRight?.valueMm ?? 0,
        observation.proudRight?.uMm ?? 0,
        share,
      ];
    case 'diagonal':
      return [observation.valueMm, observation.uMm, observation.zMm, share];
    case 'width':
      return [observation.valueMm, observation.uMm, observation.zMm, observation.xMm, share];
    case 'plumb':
      return [observation.leanMmPerMm, observation.u, share];
  }
}

function isPossible(observation: RoomObservation): boolean {
  switch (observation.kind) {
    case 'corner':
      return (
        observation.angleDeg > 0 &&
        observation.angleDeg < 360 &&
        observation.uDeg > 0 &&
        observation.armLeftMm > 0 &&
        observation.armRightMm > 0
      );
    case 'plumb':
      return observation.u > 0 && Math.abs(observation.leanMmPerMm) < 0.5;
    default:
      return observation.valueMm > 0 && observation.uMm > 0;
  }
}
