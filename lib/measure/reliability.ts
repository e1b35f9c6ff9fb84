/** How readings check each other: redundancy numbers and the correlation of their tests. */
import type { SparseRow } from './adjusted-room';
import { project, spreadInto } from './row-products';

/** Below this a redundancy is rounding: nothing checks the reading at all. */
export const UNCHECKED = 1e-9;

export type Reliability = {
  sigmas: Float64Array;
  /** aᵢ·Q·aⱼᵀ for the observations i, j. */
  shared: Float64Array[];
  /** 0: nothing checks it; 1: fully checked by the others. */
  redundancies: Float64Array;
};

/** Reliability of the first `count` rows of a solved system (the rest are priors). */
export function reliabilityOf(
  rows: SparseRow[],
  count: number,
  cofactor: Float64Array[],
): Reliability {
  const sigmas = new Float64Array(count);
  const redundancies = new Float64Array(count);
  const shared: Float64Array[] = [];
  for (let i = 0; i < count; i++) shared.push(new Float64Array(count));
  const spreadRow = new Float64Array(cofactor.length);
  for (let i = 0; i < count; i++) {
    const [row, line] = [rows[i], shared[i]];
    if (!row || !line) continue;
    spreadInto(spreadRow, cofactor, row);
    // Both halves are one: the cofactor matrix is symmetric.
    for (let j = i; j < count; j++) {
      const value = project(rows[j] ?? row, spreadRow);
      const other = shared[j];
      line[j] = value;
      if (other) other[i] = value;
    }
    sigmas[i] = row.sigma;
    redundancies[i] = redundancyFrom(line[i] ?? 0, row.sigma);
  }
  return { sigmas, shared, redundancies };
}

export function redundancyFrom(variance: number, sigma: number): number {
  return Math.min(1, Math.max(0, 1 - variance / (sigma * sigma)));
}

export type Ties = {
  /** Greatest |correlation| of each observation's test with another's. */
  closest: Float64Array;
  /** As many independent tests would raise as many false alarms: tests that move together count once. */
  independentTests: number;
};

export function tiesOf({ sigmas, shared, redundancies }: Reliability): Ties {
  const count = redundancies.length;
  const closest = new Float64Array(count);
  const together = new Float64Array(count);
  // 1 / (σ √r), or 0 for what is unchecked: a tie is then a product of three numbers.
  const scale = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    const r = redundancies[i] ?? 0;
    if (r <= UNCHECKED) continue;
    together[i] = 1;
    scale[i] = 1 / ((sigmas[i] ?? 1) * Math.sqrt(r));
  }
  for (let i = 0; i < count; i++) {
    const line = shared[i];
    for (let j = i + 1; j < count; j++) {
      const tie = Math.abs((line?.[j] ?? 0) * (scale[i] ?? 0) * (scale[j] ?? 0));
      if (tie > (closest[i] ?? 0)) closest[i] = tie;
      if (tie > (closest[j] ?? 0)) closest[j] = tie;
      together[i] = (together[i] ?? 0) + tie * tie;
      together[j] = (together[j] ?? 0) + tie * tie;
    }
  }
  let independentTests = 0;
  for (const n of together) if (n >= 1) independentTests += 1 / n;
  return { closest, independentTests };
}
