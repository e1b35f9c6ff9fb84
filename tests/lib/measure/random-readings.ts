/** Readings of a made-up room, with the errors a measurer's tools have. */
import type {
  CornerObservation,
  RoomObservation,
  ToolShare,
} from '@/lib/measure/room-observations';
import {
  angleBetweenMarks,
  distanceAt,
  lengthAt,
  type Random,
  type TruePlan,
  wallId,
} from './random-room';

/** Class II tape: maximum permissible error by 2014/32/EU annex X. */
export const tapeMpe = (lengthMm: number) => 0.3 + 0.2 * Math.ceil(lengthMm / 1000);

export type Tape = {
  read: (trueMm: number) => { valueMm: number; uMm: number; tool: ToolShare | null };
};

/** Every reading errs for itself, by a standard uncertainty of a/√3. */
export function looseTape(random: Random): Tape {
  return {
    read: (trueMm) => {
      const uMm = tapeMpe(trueMm) / Math.sqrt(3);
      return { valueMm: trueMm + random.normal() * uMm, uMm, tool: null };
    },
  };
}

/** One tape with its own error in every reading; each is read to the millimetre and repeats to 0.5. */
export function oneTape(random: Random, toolId = 'tape'): Tape {
  const own = random.between(-1, 1);
  return {
    read: (trueMm) => {
      const valueMm = Math.round(trueMm + own * tapeMpe(trueMm) + random.normal() * 0.5);
      const uMm = Math.hypot(0.5, 1 / Math.sqrt(12));
      return { valueMm, uMm, tool: { toolId, uCommon: tapeMpe(trueMm) / Math.sqrt(3) } };
    },
  };
}

export function readLength(plan: TruePlan, tape: Tape, wall: number, zMm: number): RoomObservation {
  const read = tape.read(lengthAt(plan, wall, zMm));
  const readingIds = [`length-${wall}-${zMm}`];
  return { kind: 'length', wallId: wallId(wall), zMm, yMm: 0, readingIds, unit: 'mm', ...read };
}

export function readDiagonal(
  plan: TruePlan,
  tape: Tape,
  i: number,
  j: number,
  zMm: number,
): RoomObservation {
  return {
    kind: 'diagonal',
    from: { wallId: wallId(i), end: 'left' },
    to: { wallId: wallId(j), end: 'left' },
    zMm,
    readingIds: [`diagonal-${i}-${j}`],
    unit: 'mm',
    ...tape.read(distanceAt(plan, i, j, zMm)),
  };
}

const armsAt = (plan: TruePlan, i: number, most: number): [number, number] => {
  const count = plan.corners.length;
  const arm = (wall: number) => Math.min(most, 0.9 * lengthAt(plan, wall, plan.zRefMm));
  return [arm((i - 1 + count) % count), arm(i)];
};

/** An angle finder laid along arms of 900 mm, or as long as the walls let it be. */
export function findAngle(
  plan: TruePlan,
  random: Random,
  i: number,
  zMm: number,
  uDeg: number,
): CornerObservation {
  const [armLeftMm, armRightMm] = armsAt(plan, i, 900);
  const angleDeg = angleBetweenMarks(plan, i, armLeftMm, armRightMm, zMm) + random.normal() * uDeg;
  return corner(i, zMm, { angleDeg, uDeg, armLeftMm, armRightMm, legs: null });
}

/** Two legs marked off to 0.5 mm and the diagonal between the marks taped. */
export function readLegs(
  plan: TruePlan,
  random: Random,
  tape: Tape,
  i: number,
  zMm: number,
): CornerObservation {
  const [leftMm, rightMm] = armsAt(plan, i, 1_200).map((arm) => Math.floor(arm / 50) * 50);
  if (!leftMm || !rightMm) return findAngle(plan, random, i, zMm, 0.3);
  const angle = angleBetweenMarks(plan, i, leftMm, rightMm, zMm);
  const carriedPast = angle > 180;
  const inside = ((carriedPast ? angle - 180 : angle) * Math.PI) / 180;
  const mark = () => random.normal() * LEG_U_MM;
  const [a, b] = [leftMm + mark(), rightMm + mark()];
  const read = tape.read(Math.sqrt(a * a + b * b - 2 * a * b * Math.cos(inside)));
  const legs = { leftMm, rightMm, diagonalMm: read.valueMm, carriedPast };
  return cornerByLegs(i, zMm, legs, read);
}

const LEG_U_MM = 0.5;

/** The corner that three lengths give, as the engine is handed it. */
export function cornerByLegs(
  i: number,
  zMm: number,
  legs: NonNullable<CornerObservation['legs']>,
  diagonal: { uMm: number; tool: ToolShare | null },
): CornerObservation {
  const { leftMm: a, rightMm: b, diagonalMm: c, carriedPast } = legs;
  const cosine = Math.min(0.9999, Math.max(-0.9999, (a * a + b * b - c * c) / (2 * a * b)));
  const inside = Math.acos(cosine);
  const sine = Math.sin(inside);
  const byLeg = (one: number, other: number) => (other * cosine - one) / (one * other * sine);
  const byDiagonal = c / (a * b * sine);
  const u = Math.hypot(byDiagonal * diagonal.uMm, byLeg(a, b) * LEG_U_MM, byLeg(b, a) * LEG_U_MM);
  const angleDeg = (inside * 180) / Math.PI + (carriedPast ? 180 : 0);
  const degrees = (radians: number) => (radians * 180) / Math.PI;
  // The tape's own error goes into every corner of the room alike.
  const tool = diagonal.tool && {
    toolId: diagonal.tool.toolId,
    uCommon: degrees(byDiagonal * diagonal.tool.uCommon),
  };
  const read = { angleDeg, uDeg: degrees(u), armLeftMm: a, armRightMm: b, legs, tool };
  return corner(i, zMm, read);
}

function corner(
  i: number,
  zMm: number,
  read: Pick<CornerObservation, 'angleDeg' | 'uDeg' | 'armLeftMm' | 'armRightMm' | 'legs' | 'tool'>,
): CornerObservation {
  return {
    kind: 'corner',
    cornerWallId: wallId(i),
    zMm,
    readingIds: [`corner-${i}-${zMm}`],
    unit: 'mm',
    proudLeft: null,
    proudRight: null,
    ...read,
  };
}
