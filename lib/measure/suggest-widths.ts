/** The smallest change of widths that turns a run into one that fits. */
import { centredIndex, type FillRunInput, fillRun, widthSums } from '@/lib/measure/fill-run';
import {
  type Alterable,
  type Change,
  type LeastChange,
  leastChange,
} from '@/lib/measure/least-change';
import {
  ON_THE_LIMIT_MM,
  type ShareLimits,
  shareSlack,
  sumsThatFit,
  type WidthSums,
} from '@/lib/measure/share-slack';
import type { Outcome } from '@/lib/problem';

export type UnitChoice = {
  id: string;
  widthMm: number;
  /** Null: fixed. Else every width between min and max in steps from the present one, or the stock widths. */
  alterable: { minMm: number; maxMm: number; stepMm: number; stockMm?: number[] } | null;
};

export type SuggestWidthsInput = Omit<FillRunInput, 'units'> & { units: UnitChoice[] };

export type SuggestedWidths = {
  /** False: no change of these units can do it. */
  possible: boolean;
  changes: { unitId: string; fromMm: number; toMm: number }[];
  /** Fillers' faces with the change; null where none is possible or the end is open. */
  leftFillerMm: number | null;
  rightFillerMm: number | null;
};

/**
 * The fewest units changed, then the least Σ|Δ|, then the most even fillers, ties leftmost, that make the
 * run `fits`. Exact: every choice is weighed, none is skipped.
 *
 * Edge rule: a run that fits needs no change; stock widths outside min and max are left out.
 * Units: mm. Example: 2400 wide, units 900 + 900 + 650 (the last 300–650 in steps of 50), leasts 25:
 * the last becomes 550, fillers 25 and 25. Problems: those of `fillRun`. Source: common practice.
 */
export function suggestWidths(input: SuggestWidthsInput): Outcome<SuggestedWidths> {
  const filled = fillRun(input);
  if (!filled.value) return { value: null, problems: filled.problems };
  const { limits } = filled.value;
  const sums = widthSums(input);
  const found = searchAround(input, limits, sums);
  if (!found) {
    const none = { possible: false, changes: [], leftFillerMm: null, rightFillerMm: null };
    return { value: none, problems: [] };
  }
  const changedUnits = input.units.map((unit, i) => {
    const by = found.find((change) => change.index === i)?.byMm ?? 0;
    return { ...unit, widthMm: unit.widthMm + by };
  });
  const shared = shareSlack(limits, widthSums({ ...input, units: changedUnits }));
  return {
    value: {
      possible: true,
      changes: found.flatMap(({ index, byMm }) => {
        const unit = input.units[index];
        return unit ? [{ unitId: unit.id, fromMm: unit.widthMm, toMm: unit.widthMm + byMm }] : [];
      }),
      leftFillerMm: input.left.isOpen ? null : shared.leftFaceMm,
      rightFillerMm: input.right.isOpen ? null : shared.rightFaceMm,
    },
    problems: [],
  };
}

/** Widths a unit may be built to, as changes from its present one; the present one left out. */
export function changesOf(unit: UnitChoice): number[] {
  const { alterable } = unit;
  if (!alterable) return [];
  const { minMm, maxMm, stepMm, stockMm } = alterable;
  const isAllowed = (widthMm: number) =>
    widthMm > 0 && widthMm >= minMm - ON_THE_LIMIT_MM && widthMm <= maxMm + ON_THE_LIMIT_MM;
  if (stockMm && stockMm.length > 0) {
    const widths = [...new Set(stockMm)].filter(isAllowed).sort((a, b) => a - b);
    return widths
      .map((width) => width - unit.widthMm)
      .filter((by) => Math.abs(by) > ON_THE_LIMIT_MM);
  }
  if (!(stepMm > 0)) return [];
  const changes: number[] = [];
  const down = Math.floor((unit.widthMm - minMm + ON_THE_LIMIT_MM) / stepMm);
  const up = Math.floor((maxMm - unit.widthMm + ON_THE_LIMIT_MM) / stepMm);
  for (let k = -down; k <= up; k++) {
    if (k !== 0 && isAllowed(unit.widthMm + k * stepMm)) changes.push(k * stepMm);
  }
  return changes;
}

type Side = { units: Alterable[]; range: readonly [number, number]; sumMm: number };

function searchAround(
  input: SuggestWidthsInput,
  limits: ShareLimits,
  sums: WidthSums,
): Change[] | null {
  const fit = sumsThatFit(limits);
  const centre = centredIndex(input);
  const alterables = input.units.map((unit, index) => ({ index, changesMm: changesOf(unit) }));
  const left: Side = {
    units: alterables.filter(({ index }) => centre === null || index < centre),
    range: fit.left,
    sumMm: sums.leftMm,
  };
  if (centre === null) {
    return mostEven([{ left: reach(left, 0), right: nothing, centre: null }], limits, sums);
  }
  const right: Side = {
    units: alterables.filter(({ index }) => index > centre),
    range: fit.right,
    sumMm: sums.rightMm,
  };
  const tries = [0, ...(alterables[centre]?.changesMm ?? [])].map((byMm) => ({
    left: reach(left, byMm / 2),
    right: reach(right, byMm / 2),
    centre: byMm === 0 ? null : { index: centre, byMm },
  }));
  return mostEven(tries, limits, sums);
}

const nothing: LeastChange = { count: 0, totalMm: 0, sumsMm: [0], changesFor: () => [] };

/** Least change of one side when the centred unit has already changed the sum by `alreadyMm`. */
function reach(side: Side, alreadyMm: number): LeastChange | null {
  const [least, most] = side.range;
  return leastChange(
    side.units,
    least - side.sumMm - alreadyMm - ON_THE_LIMIT_MM,
    most - side.sumMm - alreadyMm + ON_THE_LIMIT_MM,
  );
}

type Try = { left: LeastChange | null; right: LeastChange | null; centre: Change | null };

/** Among the tries with the fewest changes and the least total: the most even fillers, then leftmost. */
function mostEven(tries: Try[], limits: ShareLimits, sums: WidthSums): Change[] | null {
  let found: { changes: Change[]; rank: number[] } | null = null;
  for (const { left, right, centre } of tries) {
    if (!left || !right) continue;
    const count = left.count + right.count + (centre ? 1 : 0);
    const totalMm = left.totalMm + right.totalMm + Math.abs(centre?.byMm ?? 0);
    for (const leftMm of left.sumsMm) {
      for (const rightMm of right.sumsMm) {
        const half = (centre?.byMm ?? 0) / 2;
        const unevenMm = uneven(limits, {
          leftMm: sums.leftMm + leftMm + half,
          rightMm: sums.rightMm + rightMm + half,
        });
        const rank = [count, totalMm, unevenMm];
        if (found && compareRank(rank, found.rank) > 0) continue;
        const changes = [
          ...left.changesFor(leftMm),
          ...(centre ? [centre] : []),
          ...right.changesFor(rightMm),
        ];
        const isTie = found !== null && compareRank(rank, found.rank) === 0;
        if (!found || !isTie || isLeftOf(changes, found.changes)) found = { changes, rank };
      }
    }
  }
  return found?.changes ?? null;
}

function uneven(limits: ShareLimits, sums: WidthSums): number {
  if (limits.left.isOpen || limits.right.isOpen) return 0;
  const shared = shareSlack(limits, sums);
  return Math.abs(shared.leftFaceMm - shared.rightFaceMm);
}

function compareRank(a: number[], b: number[]): number {
  for (let i = 0; i < a.length; i++) {
    const difference = (a[i] ?? 0) - (b[i] ?? 0);
    if (Math.abs(difference) > ON_THE_LIMIT_MM) return difference;
  }
  return 0;
}

/** From the left: the first unit that differs, then its larger change, narrowing before widening. */
function isLeftOf(a: Change[], b: Change[]): boolean {
  for (let i = 0; i < Math.min(a.length, b.length); i++) {
    const one = a[i] ?? { index: 0, byMm: 0 };
    const other = b[i] ?? { index: 0, byMm: 0 };
    if (one.index !== other.index) return one.index < other.index;
    const larger = Math.abs(one.byMm) - Math.abs(other.byMm);
    if (Math.abs(larger) > ON_THE_LIMIT_MM) return larger > 0;
    if (Math.abs(one.byMm - other.byMm) > ON_THE_LIMIT_MM) return one.byMm < other.byMm;
  }
  return false;
}
