/** The slips people make with a tape, as data, and what each would do to one reading. */
import type { RoomObservation } from './room-observations';
import { SLIP_LENGTHS_MM } from './slip-lengths';

export type KnownSlip = {
  /** "1 in", "digits swapped". */
  name: string;
  /** Read less true, in the reading's own unit: mm, or degrees for a corner. */
  size: number;
};

/**
 * Every known slip that could lie in a reading, with sign and size.
 *
 * Edge: swapped digits are those of the whole part as it stands in the reading's unit (feet and inches
 * count as inches); equal neighbours give none; a swap that leaves nothing to read gives none.
 * Example: a length of 876 mm: ±10, ±12.7, ±25.4, ±100, ±304.8, and 786, 867 as swapped digits: the
 * slips are 90 (true 786) and 9 (true 867).
 * A corner by legs is slipped in its diagonal or a leg, carried to degrees. Source: common practice.
 */
export function knownSlips(observation: RoomObservation): KnownSlip[] {
  switch (observation.kind) {
    case 'corner':
      return cornerSlips(observation);
    case 'plumb':
      return [];
    case 'length':
      return observation.piecesMm
        ? piecesSlips(observation.piecesMm, observation.unit)
        : lengthSlips(observation.valueMm, observation.unit);
    default:
      return lengthSlips(observation.valueMm, observation.unit);
  }
}

function lengthSlips(valueMm: number, unit: RoomObservation['unit']): KnownSlip[] {
  const whole = SLIP_LENGTHS_MM.flatMap(({ name, lengthMm }) =>
    [lengthMm, -lengthMm].filter((size) => valueMm - size > 0).map((size) => ({ name, size })),
  );
  return [...whole, ...swappedDigits(valueMm, unit)];
}

/** Each size once: a whole inch is the same slip in whichever piece it lies. */
function piecesSlips(piecesMm: readonly number[], unit: RoomObservation['unit']): KnownSlip[] {
  const slips = piecesMm.flatMap((piece) => lengthSlips(piece, unit));
  return slips.filter(
    ({ name, size }, at) =>
      slips.findIndex((other) => other.name === name && other.size === size) === at,
  );
}

/** Slips by two neighbouring digits of the whole inches or millimetres typed the wrong way round. */
export function swappedDigits(valueMm: number, unit: RoomObservation['unit']): KnownSlip[] {
  const perUnit = unit === 'in' ? 25.4 : 1;
  const whole = Math.floor(valueMm / perUnit + 1e-6);
  const digits = String(whole);
  const slips: KnownSlip[] = [];
  for (let i = 0; i + 1 < digits.length; i++) {
    const swapped = Number(
      `${digits.slice(0, i)}${digits[i + 1]}${digits[i]}${digits.slice(i + 2)}`,
    );
    if (swapped === whole || swapped === 0) continue;
    slips.push({ name: 'digits swapped', size: (whole - swapped) * perUnit });
  }
  return slips;
}

function cornerSlips(observation: RoomObservation & { kind: 'corner' }): KnownSlip[] {
  const { legs } = observation;
  if (!legs) return [];
  const read = angleOf(legs.leftMm, legs.rightMm, legs.diagonalMm);
  if (read === null) return [];
  const slips: KnownSlip[] = [];
  for (const side of ['leftMm', 'rightMm', 'diagonalMm'] as const) {
    for (const slip of lengthSlips(legs[side], observation.unit)) {
      const mended = { ...legs, [side]: legs[side] - slip.size };
      const angle = angleOf(mended.leftMm, mended.rightMm, mended.diagonalMm);
      if (angle !== null) slips.push({ name: slip.name, size: read - angle });
    }
  }
  return slips;
}

/** The angle between two legs by their diagonal, degrees; null where no triangle has them. */
function angleOf(left: number, right: number, diagonal: number): number | null {
  const cosine = (left * left + right * right - diagonal * diagonal) / (2 * left * right);
  if (!(Math.abs(cosine) < 1)) return null;
  return (Math.acos(cosine) * 180) / Math.PI;
}
