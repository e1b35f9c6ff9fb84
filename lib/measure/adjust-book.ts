/** The room of a wall book adjusted, whatever of it has been read so far. */
import { adjustRoom } from '@/lib/measure/adjust-room';
import type { AdjustedRoom } from '@/lib/measure/adjusted-room';
import { isDrawnOnly, type ObservedRoom, withoutReadings } from '@/lib/measure/observe-room';
import type { RoomObservation } from '@/lib/measure/room-observations';
import type { Problem } from '@/lib/problem';

export type AdjustedBook = {
  /** Null where not even the drawing lets it be laid out. */
  room: AdjustedRoom | null;
  problems: Problem[];
};

/** The drawing is only a place to start: where the readings say otherwise it is drawn again. */
const MOST_REDRAWN = 4;

/**
 * Adjusts the room; readings that cannot be true are named and left out, and what is only drawn gives way.
 * Edge rule: a room of which nothing was read is laid out as drawn, and every figure says how unsure it is.
 * Problems: those of `adjustRoom`, each once.
 */
export function adjustBook(observed: ObservedRoom, usualBowMm: number): AdjustedBook {
  const problems: Problem[] = [];
  let observations = observed.observations;
  for (let tries = 0; tries < MOST_REDRAWN; tries++) {
    const adjusted = adjustRoom(observed.shape, observations, { usualBowMm });
    if (!adjusted.value) {
      problems.push(...adjusted.problems);
      const named = new Set(adjusted.problems.flatMap(({ about }) => about));
      const left = withoutReadings(observations, named);
      if (left.length === observations.length) return { room: null, problems };
      observations = left;
      continue;
    }
    const redrawn = redraw(observations, adjusted.value);
    if (!redrawn || tries === MOST_REDRAWN - 1) return { room: adjusted.value, problems };
    observations = redrawn;
  }
  return { room: null, problems };
}

/** Draws again what the readings put elsewhere; null when nothing moved by more than its own u. */
function redraw(observations: RoomObservation[], room: AdjustedRoom): RoomObservation[] | null {
  let moved = false;
  const next = observations.map((observation, i): RoomObservation => {
    const check = room.checks[i];
    if (!check || !isDrawnOnly(observation) || Math.abs(check.residual) <= check.u) {
      return observation;
    }
    moved = true;
    if (observation.kind === 'corner') return { ...observation, angleDeg: check.adjusted };
    if (observation.kind === 'length') return { ...observation, valueMm: check.adjusted };
    return observation;
  });
  return moved ? next : null;
}
