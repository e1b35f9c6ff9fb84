/** Which reading is most likely wrong, by how much, and by which slip of the hand. */
import type { AdjustedRoom } from './adjusted-room';
import { checkObservations, EQUAL_FIT } from './check-observations';
import { type KnownSlip, knownSlips } from './known-slips';
import { type LeftOut, leaveOut } from './leave-out';
import type { RoomState } from './room-state';
import { linearSolution } from './solve-room';

/** Readings whose w² is this share of the largest are left out in turn and the room adjusted again. */
const WORTH_LEAVING_OUT = 0.8;
/** Times the room is looked at again from where the strongest suspect's leaving out puts it. */
const MOST_LOOKS = 4;
/** Share of slips that are none of the known ones, and how large those are: a judgement. */
const UNKNOWN_SHARE = 0.2;
const UNKNOWN_SLIP_MM = 150;
const UNKNOWN_SLIP_DEG = 3;

export type Blunder = {
  /** What raised the alarm. */
  alarm: 'chi-square' | 'residual' | 'both';
  /** Most likely first; those that fit equally well are named together. */
  suspects: BlunderSuspect[];
};

export type BlunderSuspect = {
  /** Index into the observations adjusted. */
  observation: number;
  readingIds: string[];
  /** Read less true: positive, read too long (mm) or too open (degrees). */
  slip: number;
  uSlip: number;
  unit: 'mm' | 'deg' | 'mm/mm';
  /** "1 in", "digits swapped": the known slip that this size matches; null where none does. */
  known: string | null;
  w: number;
};

/**
 * Searches an adjusted room for one wrong reading; null when nothing is wrong enough to say so.
 *
 * Alarm: the global test fails (α 0.01) or some |w| passes the room's own level (`alarmW`). Suspects: the reading whose leaving out
 * lowers χ² most, and all that lower it by as much within 6. Each is left out and the room adjusted
 * again, for w alone misleads where a large slip bends the room. Among the suspects the reading comes
 * first that a known slip explains best.
 * Edge: plumb readings are suspects like any other; priors never are. Two slips at once may hide each
 * other: read the suspect again, then search again.
 * Example: a room of four walls with three heights, wall A typed 3100 for 3000 at one of them: A at that
 * height is named, +100 mm, "100 mm".
 * Source: data snooping, Baarda (1968), recalled; the weighing by known slips is ours.
 */
export function findBlunder(room: AdjustedRoom): Blunder | null {
  const largest = room.checks.reduce((most, check) => Math.max(most, Math.abs(check.w)), 0);
  const byResidual = largest > room.alarmW;
  const byChiSquare = !room.chiSquare.passes;
  if (!byResidual && !byChiSquare) return null;
  const { candidates, sound } = worthLeavingOut(room);
  const weighed = candidates.flatMap((i) => weigh(room, i, sound) ?? []);
  const best = Math.max(...weighed.map(({ gain }) => gain));
  const suspects = weighed.filter(({ gain }) => gain >= best - EQUAL_FIT);
  suspects.sort(
    (one, other) => other.evidence - one.evidence || one.observation - other.observation,
  );
  return {
    alarm: byResidual && byChiSquare ? 'both' : byResidual ? 'residual' : 'chi-square',
    suspects: suspects.map(({ evidence: _evidence, gain: _gain, ...suspect }) => suspect),
  };
}

/**
 * Candidates by their tests. A gross slip bends the room until w points elsewhere, so the room is looked at
 * from where it stands without the strongest suspect, until that stays the same.
 */
function worthLeavingOut(room: AdjustedRoom): { candidates: number[]; sound: RoomState | null } {
  let squares = room.checks.map(({ w }) => w * w);
  let strongest = strongestOf(squares);
  let sound: RoomState | null = null;
  for (let look = 0; look < MOST_LOOKS; look++) {
    const without = leaveOut(room, strongest, sound);
    const seen = without && testsFrom(room, without.state);
    if (!seen) break;
    squares = seen;
    sound = without.state;
    const next = strongestOf(squares);
    if (next === strongest) break;
    strongest = next;
  }
  const enough = WORTH_LEAVING_OUT * (squares[strongest] ?? 0) - EQUAL_FIT;
  const candidates = squares.flatMap((square, i) => (square > 0 && square >= enough ? [i] : []));
  return { candidates, sound };
}

const strongestOf = (squares: number[]) => squares.indexOf(Math.max(...squares));

function testsFrom(room: AdjustedRoom, state: RoomState): number[] | null {
  const { observations, options } = room.system;
  const seen = linearSolution(state, observations, options);
  return seen && checkObservations(observations, seen).checks.map(({ w }) => w * w);
}

type Weighed = BlunderSuspect & { gain: number; evidence: number };

function weigh(room: AdjustedRoom, observation: number, sound: RoomState | null): Weighed | null {
  const check = room.checks[observation];
  const without =
    leaveOut(room, observation, sound) ??
    leaveOut(room, observation) ??
    asTheResidualSays(room, observation);
  if (!check || !without) return null;
  const gain = room.chiSquare.value - without.chiSquare;
  const slips = knownSlips(check.observation);
  const isCorner = check.observation.kind === 'corner';
  return {
    observation,
    readingIds: check.observation.readingIds,
    slip: without.slip,
    uSlip: without.uSlip,
    unit: isCorner ? 'deg' : check.observation.kind === 'plumb' ? 'mm/mm' : 'mm',
    known: matching(slips, without.slip, without.uSlip),
    w: check.w,
    gain,
    evidence:
      gain / 2 +
      evidenceOf(
        slips,
        without.slip / without.uSlip,
        without.uSlip,
        isCorner ? UNKNOWN_SLIP_DEG : UNKNOWN_SLIP_MM,
      ),
  };
}

/** To first order, where the room without the reading cannot be laid out. */
function asTheResidualSays(room: AdjustedRoom, observation: number): LeftOut | null {
  const check = room.checks[observation];
  if (!check) return null;
  return {
    state: room.system.state,
    chiSquare: room.chiSquare.value - check.w ** 2,
    slip: -check.residual / check.redundancy,
    uSlip: check.u / Math.sqrt(check.redundancy),
  };
}

/** Logarithm of the chance of the slip found, over the known slips and a broad share of unknown ones. */
function evidenceOf(slips: KnownSlip[], slipByU: number, uSlip: number, usualSlip: number): number {
  const spread = 1 + (usualSlip / uSlip) ** 2;
  const unknown = Math.log(UNKNOWN_SHARE / Math.sqrt(spread)) - slipByU ** 2 / (2 * spread);
  const known = slips.map(
    ({ size }) => Math.log((1 - UNKNOWN_SHARE) / slips.length) - (slipByU - size / uSlip) ** 2 / 2,
  );
  const logs = [unknown, ...known];
  const most = Math.max(...logs);
  return most + Math.log(logs.reduce((sum, log) => sum + Math.exp(log - most), 0));
}

/** The known slip nearest to the size found, if within two standard uncertainties. */
function matching(slips: KnownSlip[], slip: number, uSlip: number): string | null {
  let best: KnownSlip | null = null;
  for (const known of slips) {
    if (Math.abs(known.size - slip) > 2 * uSlip) continue;
    if (!best || Math.abs(known.size - slip) < Math.abs(best.size - slip)) best = known;
  }
  return best?.name ?? null;
}
