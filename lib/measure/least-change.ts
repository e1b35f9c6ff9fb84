/** The fewest, then smallest changes that bring a sum into an interval: exact, by tables over sums. */

/** One alterable width: the changes it allows, other than none. */
export type Alterable = { index: number; changesMm: number[] };

/** Changes in the units' order; a unit left as it is does not stand in it. */
export type Change = { index: number; byMm: number };

export type LeastChange = {
  count: number;
  totalMm: number;
  /** Every sum inside the interval that this count and total reach. */
  sumsMm: number[];
  /** The leftmost set of changes that gives the sum. */
  changesFor: (sumMm: number) => Change[];
};

/** Sums are kept to this, so that equal ones meet; a 1/64 in is a whole number of them. */
const GRAIN_MM = 1e-6;
/** One changed unit outweighs any total change in mm. */
const PER_UNIT = 1e6;
/** Totals this near are equal. */
const TIE_MM = 1e-6;

/**
 * Least change of the sum into [low, high]; null when no choice reaches it.
 * Edge rule: ends count as inside; 0 inside needs no change. Units: mm, the interval is of the change.
 * Example: two units that may each shrink by 50 or 100, interval [−160, −140]: the first by 100, the
 * second by 50. Problems: none. Source: common practice (exact dynamic programme).
 */
export function leastChange(units: Alterable[], lowMm: number, highMm: number): LeastChange | null {
  if (lowMm > highMm) return null;
  if (lowMm <= 0 && highMm >= 0) {
    return { count: 0, totalMm: 0, sumsMm: [0], changesFor: () => [] };
  }
  return (
    byOneUnit(units, lowMm, highMm) ??
    byTwoUnits(units, lowMm, highMm) ??
    byTable(units, lowMm, highMm)
  );
}

type Found = { sumMm: number; totalMm: number; changes: Change[] };

/** The best of those found, all of the same count; found in order of preference. */
function best(found: Found[], count: number): LeastChange | null {
  const totalMm = found.reduce((least, one) => Math.min(least, one.totalMm), Infinity);
  const kept = new Map<number, Change[]>();
  for (const one of found) {
    if (one.totalMm > totalMm + TIE_MM) continue;
    const key = Math.round(one.sumMm / GRAIN_MM);
    if (!kept.has(key)) kept.set(key, one.changes);
  }
  if (kept.size === 0) return null;
  return {
    count,
    totalMm,
    sumsMm: [...kept.values()].map(sumOf).sort((a, b) => a - b),
    changesFor: (sumMm) => kept.get(Math.round(sumMm / GRAIN_MM)) ?? [],
  };
}

function sumOf(changes: Change[]): number {
  return changes.reduce((sum, change) => sum + change.byMm, 0);
}

function byOneUnit(units: Alterable[], lowMm: number, highMm: number): LeastChange | null {
  const found: Found[] = [];
  for (const { index, changesMm } of units) {
    for (const byMm of changesMm) {
      if (byMm < lowMm || byMm > highMm) continue;
      found.push({ sumMm: byMm, totalMm: Math.abs(byMm), changes: [{ index, byMm }] });
    }
  }
  return best(found, 1);
}

function byTwoUnits(units: Alterable[], lowMm: number, highMm: number): LeastChange | null {
  const sorted = units.map((unit) => ({
    index: unit.index,
    // Larger changes first, so that among equals the left unit takes the larger part.
    first: [...unit.changesMm].sort((a, b) => Math.abs(b) - Math.abs(a) || a - b),
    upward: [...unit.changesMm].sort((a, b) => a - b),
  }));
  const found: Found[] = [];
  let leastTotalMm = Infinity;
  for (let i = 0; i < sorted.length; i++) {
    const one = sorted[i];
    for (const byMm of one?.first ?? []) {
      for (let j = i + 1; j < sorted.length; j++) {
        const other = sorted[j];
        if (!one || !other) continue;
        for (const also of inside(other.upward, lowMm - byMm, highMm - byMm)) {
          const totalMm = Math.abs(byMm) + Math.abs(also);
          if (totalMm > leastTotalMm + TIE_MM) continue;
          leastTotalMm = Math.min(leastTotalMm, totalMm);
          const changes = [
            { index: one.index, byMm },
            { index: other.index, byMm: also },
          ];
          found.push({ sumMm: byMm + also, totalMm, changes });
        }
      }
    }
  }
  return best(found, 2);
}

function inside(upward: number[], lowMm: number, highMm: number): number[] {
  let from = 0;
  let to = upward.length;
  while (from < to) {
    const middle = (from + to) >> 1;
    if ((upward[middle] ?? 0) < lowMm) from = middle + 1;
    else to = middle;
  }
  const found: number[] = [];
  for (let i = from; i < upward.length && (upward[i] ?? 0) <= highMm; i++)
    found.push(upward[i] ?? 0);
  return found;
}

/** Least cost of each sum that units from `at` on can still make; cost = PER_UNIT · count + Σ|Δ|. */
function byTable(units: Alterable[], lowMm: number, highMm: number): LeastChange | null {
  const tables: Map<number, number>[] = [new Map([[0, 0]])];
  for (let at = units.length - 1; at >= 0; at--) {
    const rest = tables[0] ?? new Map<number, number>();
    const here = new Map(rest);
    for (const byMm of units[at]?.changesMm ?? []) {
      const step = Math.round(byMm / GRAIN_MM);
      const cost = PER_UNIT + Math.abs(byMm);
      for (const [sum, restCost] of rest) {
        const total = restCost + cost;
        const known = here.get(sum + step);
        if (known === undefined || total < known - TIE_MM) here.set(sum + step, total);
      }
    }
    tables.unshift(here);
  }
  const reach = tables[0] ?? new Map<number, number>();
  const inInterval = [...reach].filter(
    ([sum]) => sum * GRAIN_MM >= lowMm && sum * GRAIN_MM <= highMm,
  );
  const least = inInterval.reduce((min, [, cost]) => Math.min(min, cost), Infinity);
  if (least === Infinity) return null;
  const sums = inInterval.filter(([, cost]) => cost <= least + TIE_MM).map(([sum]) => sum);
  const count = Math.round(least / PER_UNIT);
  return {
    count,
    totalMm: least - count * PER_UNIT,
    sumsMm: sums.sort((a, b) => a - b).map((sum) => sum * GRAIN_MM),
    changesFor: (sumMm) => walkTables(units, tables, Math.round(sumMm / GRAIN_MM)),
  };
}

/** Leftmost choice that keeps the least cost: change a unit as soon as that costs nothing more. */
function walkTables(units: Alterable[], tables: Map<number, number>[], target: number): Change[] {
  const changes: Change[] = [];
  let sum = target;
  units.forEach((unit, at) => {
    const here = tables[at]?.get(sum) ?? Infinity;
    const rest = tables[at + 1];
    const larger = [...unit.changesMm].sort((a, b) => Math.abs(b) - Math.abs(a) || a - b);
    for (const byMm of larger) {
      const left = rest?.get(sum - Math.round(byMm / GRAIN_MM));
      if (left === undefined || left + PER_UNIT + Math.abs(byMm) > here + TIE_MM) continue;
      changes.push({ index: unit.index, byMm });
      sum -= Math.round(byMm / GRAIN_MM);
      return;
    }
  });
  return changes;
}
