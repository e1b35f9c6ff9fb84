/** How readings check each other: redundancy numbers and the correlation of their tests. */
import type { SparseRow } from './adjusted-room';
import { project, spread } from './row-products';

/** Below this a redundancy is rounding: nothing checks the reading at all. */
export const UNCHECKED = 1e-9;

export type Reliability = {
  sigmas: number[];
  /** aᵢ·Q·aⱼᵀ for the observations i, j. */
  shared: Float64Array[];
  /** 0: nothing checks it; 1: fully checked by the others. */
  redundancies: number[];
};

/** Reliability of the first `count` rows of a solved system (the rest are priors). */
export function reliabilityOf(
  rows: SparseRow[],
  count: number,
  cofactor: Float64Array[],
): Reliability {
  const own = rows.slice(0, count);
  const sigmas = own.map((row) => row.sigma);
  const shared = own.map((row) => {
    const spreadRow = spread(cofactor, row);
    const line = new Float64Array(count);
    for (let j = 0; j < count; j++) line[j] = project(own[j] ?? row, spreadRow);
    return line;
  });
  const redundancies = shared.map((line, i) => redundancyFrom(line[i] ?? 0, sigmas[i] ?? 1));
  return { sigmas, shared, redundancies };
}

export function redundancyFrom(variance: number, sigma: number): number {
  return Math.min(1, Math.max(0, 1 - variance / (sigma * sigma)));
}

export type Ties = {
  /** Greatest |correlation| of each observation's test with another's. */
  closest: number[];
  /** As many independent tests would raise as many false alarms: tests that move together count once. */
  independentTests: number;
};

export function tiesOf({ sigmas, shared, redundancies }: Reliability): Ties {
  const count = redundancies.length;
  const closest = new Array<number>(count).fill(0);
  const together: number[] = redundancies.map((r) => (r > UNCHECKED ? 1 : 0));
  // 1 / (σ √r), or 0 for what is unchecked: a tie is then a product of three numbers.
  const scale = redundancies.map((r, i) =>
    r > UNCHECKED ? 1 / ((sigmas[i] ?? 1) * Math.sqrt(r)) : 0,
  );
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
  const independentTests = together.reduce((sum, n) => (n >= 1 ? sum + 1 / n : sum), 0);
  return { closest, independentTests };
}
