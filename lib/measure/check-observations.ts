/** Beside every reading: its residual, how well the others check it, and the least slip they would show. */
import type { ObservationCheck } from './adjusted-room';
import { chiSquareLimit } from './chi-square';
import { type Reliability, reliabilityOf, tiesOf, UNCHECKED } from './reliability';
import type { RoomObservation } from './room-observations';
import { degrees } from './room-state';
import type { Solution } from './solve-room';

/** Non-centrality √17.07 for a test of 1 in 1000 with a power of 80 % (Baarda 1968, recalled). */
export const SEEN_WITH_POWER = 4.1;
/** Candidates whose w² is within this of the largest fit equally well. */
export const EQUAL_FIT = 6;
/** Below this hardly anything checks a reading. */
export const HARDLY_CHECKED = 0.1;
/**
 * Chance that all the tests w of a sound room together raise an alarm; with the 1 in 100 of the global test
 * no more than 2 in 100 of true rooms are doubted (tests/bench).
 */
const FALSE_ALARM = 0.003;

/** Checks in the order of the observations, the |w| that raises an alarm in this room, and what both rest on. */
export function checkObservations(
  observations: RoomObservation[],
  { rows, residuals, cofactor }: Pick<Solution, 'rows' | 'residuals' | 'cofactor'>,
): { checks: ObservationCheck[]; alarmW: number; reliability: Reliability } {
  const reliability = reliabilityOf(rows, observations.length, cofactor);
  const { closest, independentTests } = tiesOf(reliability);
  const checks = observations.map((observation, i) => {
    const sigma = reliability.sigmas[i] ?? 1;
    const redundancy = reliability.redundancies[i] ?? 0;
    const residual = residuals[i] ?? 0;
    const checked = redundancy > UNCHECKED;
    const scale = observation.kind === 'corner' ? degrees(1) : 1;
    const read = readValue(observation);
    return {
      observation,
      read,
      adjusted: read + residual * scale,
      residual: residual * scale,
      u: sigma * scale,
      w: checked ? residual / (sigma * Math.sqrt(redundancy)) : 0,
      redundancy,
      smallestSlip: checked ? (SEEN_WITH_POWER * sigma * scale) / Math.sqrt(redundancy) : null,
      hardlyChecked: redundancy < HARDLY_CHECKED,
      // A slip that is just seen raises the neighbour's w by ρ·4.1: told apart if w² then differs enough.
      tellable: checked && SEEN_WITH_POWER ** 2 * (1 - (closest[i] ?? 0) ** 2) > EQUAL_FIT,
    };
  });
  return { checks, alarmW: alarmLevel(independentTests), reliability };
}

/**
 * The usual 3.29 is one false alarm in a thousand for ONE reading: four in a hundred for a room of forty.
 * Šidák's correction keeps it where it is for the room, few readings or many.
 */
function alarmLevel(independentTests: number): number {
  const each = 1 - (1 - FALSE_ALARM) ** (1 / Math.max(1, independentTests));
  return Math.sqrt(chiSquareLimit(1, each));
}

function readValue(observation: RoomObservation): number {
  if (observation.kind === 'corner') return observation.angleDeg;
  if (observation.kind === 'plumb') return observation.leanMmPerMm;
  return observation.valueMm;
}
