/** The trials of the blunder study: rooms, readings, one slip in each, and what the search says of it. */
import { adjustRoom } from '@/lib/measure/adjust-room';
import { findBlunder } from '@/lib/measure/find-blunder';
import { swappedDigits } from '@/lib/measure/known-slips';
import type { RoomObservation, RoomShape } from '@/lib/measure/room-observations';
import { settle } from '@/lib/measure/settle';
import { SLIP_LENGTHS_MM } from '@/lib/measure/slip-lengths';
import {
  cornerByLegs,
  findAngle,
  looseTape,
  oneTape,
  readDiagonal,
  readLegs,
  readLength,
  type Tape,
  tapeMpe,
} from '../lib/measure/random-readings';
import {
  drawnShape,
  type OutOfTrue,
  type Random,
  randomPlan,
  type TruePlan,
} from '../lib/measure/random-room';
import { seeded } from '../lib/measure/seeded';

export type Condition = {
  name: string;
  title: string;
  out: OutOfTrue;
  heightsMm: number[];
  /** Left out: corners are read at every height too. */
  cornerHeightsMm?: number[];
  corners: 'finder' | 'legs';
  usualBowMm: number;
  slipIn: RoomObservation['kind'][];
};
export type StudyRow = {
  slip: string;
  diagonals: number;
  trials: number;
  alarmed: number;
  /** The slipped reading is named first. */
  first: number;
  /** It is one of several that are named together, not the first. */
  among: number;
  /** Alarmed, and it is not named. */
  wrong: number;
  /** Named first once the one further reading that `settle` asks for has been taken. */
  settled: number;
};

const SLIP_NAMES = [...SLIP_LENGTHS_MM.map(({ name }) => name), 'digits swapped'];
/** Each room is tried without a slip and with two of the six kinds in turn, so that rooms go further. */
const SLIPS_PER_ROOM = 2;
const FINDER_U_DEG = 0.12;
/** Own part of a reading by the one tape: to the millimetre, repeating to 0.5. */
const CORNER_U_MM = Math.hypot(0.5, 1 / Math.sqrt(12));
const LEAST_WALLS = 4;
const MOST_WALLS = 10;

export type StudySize = {
  rooms: number;
  seed: number;
  /** Number of the first room: slices of one study are other rooms. */
  from?: number;
  mostDiagonals: number;
};

export function studyCondition(
  condition: Condition,
  { rooms, seed, from = 0, mostDiagonals }: StudySize,
): StudyRow[] {
  const rows = new Map<string, StudyRow>();
  for (const slip of ['none', ...SLIP_NAMES]) {
    for (let diagonals = 0; diagonals <= mostDiagonals; diagonals++) rowOf(rows, slip, diagonals);
  }
  for (let n = from; n < from + rooms; n++) {
    const random = seeded(seed * 1_000_003 + n);
    const wallCount = LEAST_WALLS + (n % (MOST_WALLS - LEAST_WALLS + 1));
    const trial = beginRoom(condition, random, wallCount);
    for (let diagonals = 0; diagonals <= mostDiagonals; diagonals++) {
      if (diagonals > 0) takeDiagonal(trial);
      for (const slip of slipsOf(n)) tryOne(trial, rowOf(rows, slip, diagonals));
    }
  }
  return [...rows.values()];
}

function slipsOf(room: number): string[] {
  const turn = Math.floor(room / (MOST_WALLS - LEAST_WALLS + 1)) * SLIPS_PER_ROOM;
  const slips = Array.from({ length: SLIPS_PER_ROOM }, (_, i) => (turn + i) % SLIP_NAMES.length);
  return ['none', ...slips.map((slip) => SLIP_NAMES[slip] ?? '')];
}

function rowOf(rows: Map<string, StudyRow>, slip: string, diagonals: number): StudyRow {
  const key = `${slip} ${diagonals}`;
  const blank = { trials: 0, alarmed: 0, first: 0, among: 0, wrong: 0, settled: 0 };
  const row = rows.get(key) ?? { slip, diagonals, ...blank };
  rows.set(key, row);
  return row;
}

type Trial = {
  condition: Condition;
  random: Random;
  plan: TruePlan;
  shape: RoomShape;
  tape: Tape;
  observations: RoomObservation[];
};

function beginRoom(condition: Condition, random: Random, wallCount: number): Trial {
  const zRefMm = middle(condition.heightsMm);
  const plan = { ...randomPlan(random, wallCount, condition.out), zRefMm };
  const tape = condition.corners === 'finder' ? looseTape(random) : oneTape(random);
  const observations = plan.corners.flatMap((_, i) =>
    condition.heightsMm.flatMap((zMm) => {
      const length = readLength(plan, tape, i, zMm);
      if (condition.cornerHeightsMm?.includes(zMm) === false) return [length];
      const corner =
        condition.corners === 'finder'
          ? findAngle(plan, random, i, zMm, FINDER_U_DEG)
          : readLegs(plan, random, tape, i, zMm);
      return [length, corner];
    }),
  );
  return { condition, random, plan, shape: drawnShape(plan), tape, observations };
}

const middle = (heights: number[]) => heights[Math.floor((heights.length - 1) / 2)] ?? 0;
const uOfLengthMm = (lengthMm: number) => tapeMpe(lengthMm) / Math.sqrt(3);
const cornerIndex = (wallId: string) => Number(wallId.split('-')[1]);

function adjust({ shape, condition }: Trial, observations: RoomObservation[]) {
  return adjustRoom(shape, observations, {
    usualBowMm: condition.usualBowMm,
    zRefMm: middle(condition.heightsMm),
  }).value;
}

/** Takes the diagonal that `settle` asks for; none where no corner sees another any more. */
function takeDiagonal(trial: Trial): void {
  const room = adjust(trial, trial.observations);
  const [step] = room ? settle(room, { kinds: ['diagonal'], uOfLengthMm }) : [];
  if (step?.reading.kind !== 'diagonal') return;
  const { from, to, zMm } = step.reading;
  const ends = [cornerIndex(from.wallId), cornerIndex(to.wallId)] as const;
  trial.observations.push(readDiagonal(trial.plan, trial.tape, ...ends, zMm));
}

function tryOne(trial: Trial, row: StudyRow): void {
  const { random, condition } = trial;
  const targets = trial.observations.flatMap((o, i) =>
    condition.slipIn.includes(o.kind) ? [i] : [],
  );
  const target = targets[Math.floor(random.uniform() * targets.length)] ?? 0;
  const sound = trial.observations[target];
  const wrong = sound && slipped(sound, row.slip, random);
  if (!wrong) return;
  const observations = trial.observations.map((o, i) => (i === target ? wrong : o));
  row.trials++;
  const room = adjust(trial, observations);
  const blunder = room && findBlunder(room);
  if (!room || !blunder) return;
  row.alarmed++;
  const place = blunder.suspects.findIndex(({ observation }) => observation === target);
  if (place === 0) row.first++;
  else if (place > 0) row.among++;
  else row.wrong++;
  const suspects = blunder.suspects.map(({ observation }) => observation);
  const [step] = settle(room, { suspects, uOfLengthMm });
  const further = step && takeAgain(trial, step.reading);
  const settled = further && adjust(trial, [...observations, further]);
  if (settled && findBlunder(settled)?.suspects[0]?.observation === target) row.settled++;
}

function takeAgain(trial: Trial, reading: ReturnType<typeof settle>[number]['reading']) {
  const { plan, tape, random, observations, condition } = trial;
  if (reading.kind === 'diagonal') {
    const { from, to, zMm } = reading;
    return readDiagonal(plan, tape, cornerIndex(from.wallId), cornerIndex(to.wallId), zMm);
  }
  const again = observations[reading.observation];
  switch (again?.kind) {
    case 'length':
      return readLength(plan, tape, cornerIndex(again.wallId), again.zMm);
    case 'corner': {
      const i = cornerIndex(again.cornerWallId);
      return condition.corners === 'finder'
        ? findAngle(plan, random, i, again.zMm, FINDER_U_DEG)
        : readLegs(plan, random, tape, i, again.zMm);
    }
    case 'diagonal':
      return readDiagonal(
        plan,
        tape,
        cornerIndex(again.from.wallId),
        cornerIndex(again.to.wallId),
        again.zMm,
      );
    default:
      return null;
  }
}

/**
 * The reading with the slip in it: in its length, or in the diagonal of a corner's legs. Null where the
 * slip makes a triangle that cannot be: the pad refuses it before it reaches the adjustment.
 */
function slipped(
  observation: RoomObservation,
  slip: string,
  random: Random,
): RoomObservation | null {
  if (slip === 'none') return observation;
  if (observation.kind === 'plumb') return null;
  if (observation.kind !== 'corner') {
    return { ...observation, valueMm: slippedLength(observation.valueMm, slip, random) };
  }
  const { legs, cornerWallId, zMm } = observation;
  if (!legs) return null;
  const diagonalMm = slippedLength(legs.diagonalMm, slip, random);
  const isTriangle =
    diagonalMm < legs.leftMm + legs.rightMm && diagonalMm > Math.abs(legs.leftMm - legs.rightMm);
  if (!isTriangle) return null;
  const wrong = { ...legs, diagonalMm };
  const { tool = null } = observation;
  return {
    ...cornerByLegs(cornerIndex(cornerWallId), zMm, wrong, { uMm: CORNER_U_MM, tool }),
    tool,
  };
}

function slippedLength(valueMm: number, slip: string, random: Random): number {
  if (slip === 'digits swapped') {
    const swaps = swappedDigits(Math.round(valueMm), 'mm').map(({ size }) => valueMm - size);
    const possible = swaps.filter((swapped) => swapped >= 50);
    return possible[Math.floor(random.uniform() * possible.length)] ?? valueMm + 90;
  }
  const size = SLIP_LENGTHS_MM.find(({ name }) => name === slip)?.lengthMm ?? 0;
  const signed = random.uniform() < 0.5 ? -size : size;
  return valueMm + signed < 50 ? valueMm + size : valueMm + signed;
}
