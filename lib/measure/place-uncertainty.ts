/** How sure sums and differences of places on the end faces are: what they share is counted once. */
import { type FacePlace, NO_SLOPE } from '@/lib/measure/end-view';
import { PARAMETER_COUNT } from '@/lib/measure/run-frame';

/** A term of a sum of places; the sign may be any weight. */
export type PlaceTerm = { place: FacePlace; sign: number };

/** Standard u of Σ sign·x over places, with what they share counted once. */
export function combinedU(covariance: number[][], terms: PlaceTerm[], otherU = 0): number {
  const slope = [...NO_SLOPE];
  let variance = otherU * otherU;
  for (const { place, sign } of samePlacesMerged(terms)) {
    for (let i = 0; i < PARAMETER_COUNT; i++) {
      slope[i] = (slope[i] ?? 0) + sign * (place.slope[i] ?? 0);
    }
    variance += (sign * place.ownU) ** 2;
  }
  return Math.sqrt(Math.max(0, variance + dot(slope, timesCovariance(covariance, slope))));
}

/** One place named twice is one reading, not two. */
function samePlacesMerged(terms: PlaceTerm[]): PlaceTerm[] {
  const merged: PlaceTerm[] = [];
  for (const term of terms) {
    const same = merged.find(
      ({ place }) =>
        place.end === term.place.end &&
        place.yMm === term.place.yMm &&
        place.zMm === term.place.zMm,
    );
    if (same) same.sign += term.sign;
    else merged.push({ ...term });
  }
  return merged;
}

/** A place with what must be kept clear of it, ready for many pairings. */
export type WeighedPlace = {
  place: FacePlace;
  clearMm: number;
  variance: number;
  covarianceSlope: number[];
};

/** Places with what must be kept clear of each, their variances reckoned once for many pairings. */
export function weigh(
  covariance: number[][],
  places: { place: FacePlace; clearMm: number }[],
): WeighedPlace[] {
  return places.map(({ place, clearMm }) => {
    const covarianceSlope = timesCovariance(covariance, place.slope);
    const variance = dot(place.slope, covarianceSlope) + place.ownU ** 2;
    return { place, clearMm, variance, covarianceSlope };
  });
}

/** Least of (room between − 2u) over every pair of places, each clear of its end. */
export function leastSafe(lefts: WeighedPlace[], rights: WeighedPlace[], otherU = 0): number {
  let least = Number.POSITIVE_INFINITY;
  for (const left of lefts) {
    for (const right of rights) {
      const shared = dot(left.place.slope, right.covarianceSlope);
      const variance = left.variance + right.variance - 2 * shared + otherU * otherU;
      const roomMm = right.place.xMm - right.clearMm - left.place.xMm - left.clearMm;
      least = Math.min(least, roomMm - 2 * Math.sqrt(Math.max(0, variance)));
    }
  }
  return least;
}

function timesCovariance(covariance: number[][], slope: readonly number[]): number[] {
  return covariance.map((row) => dot(row, slope));
}

function dot(a: readonly number[], b: readonly number[]): number {
  let sum = 0;
  for (let i = 0; i < PARAMETER_COUNT; i++) sum += (a[i] ?? 0) * (b[i] ?? 0);
  return sum;
}
