/** Which one further reading would tell most: a diagonal, or the same reading again. */
import type { AdjustedRoom, FurtherReading } from './adjusted-room';
import { type FurtherRow, furtherReadings, isTaped } from './further-readings';
import { type Reliability, redundancyFrom, UNCHECKED } from './reliability';
import { project, spread } from './row-products';

/** Steps that gain at least this share of the best are as good; the cheapest of them comes first. */
const AS_GOOD = 0.9;
/** Suspects whose χ² would differ by this much are told apart for certain (five standard uncertainties). */
const TOLD_APART = 25;
/** Less than this is rounding, not help. */
const LEAST_GAIN = 1e-6;
/** Work for the measurer: one reading, or one reading with two ends to hold. */
const COST = { again: 1, diagonal: 2 };

export type SettleOptions = {
  /** Observations under suspicion (`findBlunder`); then the step that tells them apart is sought. */
  suspects?: number[];
  /** Which readings may be asked for; left out: all. */
  kinds?: FurtherReading['kind'][];
  /** Standard uncertainty of a diagonal of this length; left out: the greatest of the lengths read. */
  uOfLengthMm?: (lengthMm: number) => number;
  /** How many steps to return. */
  most?: number;
};

export type SettleStep = {
  reading: FurtherReading;
  /** Least redundancy over the readings weighed, before and with the step. */
  leastRedundancy: number;
  leastRedundancyAfter: number;
};

/**
 * Ranks the further readings by how much they raise the least redundancy over all lengths, corners,
 * diagonals and widths. With suspects: by how surely a slip of the size found in each of them could then
 * be told from one in another, the least sure of them counting.
 *
 * Edge: an observation without a reading behind it is not weighed; only diagonals that run free through
 * the room are offered; a step that raises nothing is not; steps within a tenth of the best gain count
 * as equal and the cheapest comes first.
 * Example: a square room read at one height without diagonals: the first step is a diagonal, for a
 * second look at one wall leaves the other three unchecked.
 * Problems: none; an empty list when nothing would help. Source: Baarda's internal reliability (1968),
 * recalled; the ranking is ours.
 */
export function settle(room: AdjustedRoom, options: SettleOptions = {}): SettleStep[] {
  const { observations, reliability } = room.system;
  const weighed = observations.flatMap((o, i) =>
    isTaped(o) && (!options.suspects || options.suspects.includes(i)) ? [i] : [],
  );
  const slips = room.checks.map(({ residual, redundancy, u }) =>
    redundancy > UNCHECKED ? (residual / redundancy / u) ** 2 : 0,
  );
  const ask: Ask = { weighed, slips: options.suspects ? slips : null };
  const before = worthOf(reliability, ask, null);
  const steps = furtherReadings(room, options).map((further) => ({
    reading: further.reading,
    after: worthOf(reliability, ask, changeBy(room, further)),
  }));
  return inOrder(steps, before, options).map(({ reading, after }) => ({
    reading,
    leastRedundancy: before.leastRedundancy,
    leastRedundancyAfter: after.leastRedundancy,
  }));
}

type Weighed = { reading: FurtherReading; after: Worth };

/** Steps that help, the cheapest of the best first; where all suspects stand clear, the first again. */
function inOrder(
  steps: Weighed[],
  before: Worth,
  { suspects, most = 5 }: SettleOptions,
): Weighed[] {
  const raising = (by: 'least' | 'sum') =>
    steps
      .map((step, order) => ({ ...step, order, gain: step.after[by] - before[by] }))
      .filter(({ gain }) => gain > LEAST_GAIN);
  const least = raising('least');
  const helping = least.length > 0 ? least : raising('sum');
  if (helping.length === 0) {
    return steps.filter(
      ({ reading }) => reading.kind === 'again' && reading.observation === suspects?.[0],
    );
  }
  const enough = AS_GOOD * Math.max(...helping.map(({ gain }) => gain));
  const costOf = ({ reading, gain }: (typeof helping)[number]) =>
    gain >= enough ? COST[reading.kind] : Number.POSITIVE_INFINITY;
  return helping
    .sort((one, other) => {
      const [cost, otherCost] = [costOf(one), costOf(other)];
      if (cost !== otherCost) return cost < otherCost ? -1 : 1;
      return other.gain - one.gain || one.order - other.order;
    })
    .slice(0, most);
}

type Worth = { least: number; sum: number; leastRedundancy: number };
/** What one more reading takes from aᵢQaⱼ: pullᵢ·pullⱼ/total, a rank-one change of the cofactor matrix. */
type Change = { pull: Float64Array; total: number };

function changeBy(room: AdjustedRoom, { reading, row }: FurtherRow): Change {
  const { rows, cofactor, observations, reliability } = room.system;
  if (reading.kind === 'again') {
    const pull = reliability.shared[reading.observation] ?? new Float64Array(observations.length);
    return { pull, total: row.sigma ** 2 + (pull[reading.observation] ?? 0) };
  }
  const spreadRow = spread(cofactor, row);
  const pull = new Float64Array(observations.length);
  for (let i = 0; i < pull.length; i++) pull[i] = project(rows[i] ?? row, spreadRow);
  return { pull, total: row.sigma ** 2 + project(row, spreadRow) };
}

/** The readings weighed; among suspects also the slip found in each, squared and in units of its u. */
type Ask = { weighed: number[]; slips: number[] | null };

/** The least redundancy and the sum of them; among suspects, how surely each is told from the others. */
function worthOf({ sigmas, shared }: Reliability, ask: Ask, change: Change | null): Worth {
  const { weighed, slips } = ask;
  const sharedBy = (i: number, j: number) => {
    const now = shared[i]?.[j] ?? 0;
    return change ? now - ((change.pull[i] ?? 0) * (change.pull[j] ?? 0)) / change.total : now;
  };
  const redundancyOf = (i: number) => redundancyFrom(sharedBy(i, i), sigmas[i] ?? 1);
  const worth = { least: 1, sum: 0, leastRedundancy: 1 };
  for (const i of weighed) {
    const redundancy = redundancyOf(i);
    let clear = redundancy;
    if (slips) {
      let tied = 0;
      for (const j of weighed) {
        const other = redundancyOf(j);
        if (j === i || redundancy <= UNCHECKED || other <= UNCHECKED) continue;
        const scale = (sigmas[i] ?? 1) * (sigmas[j] ?? 1);
        tied = Math.max(tied, (sharedBy(i, j) / scale) ** 2 / (redundancy * other));
      }
      clear = Math.min(1, ((slips[i] ?? 0) * redundancy * Math.max(0, 1 - tied)) / TOLD_APART);
    }
    worth.least = Math.min(worth.least, clear);
    worth.leastRedundancy = Math.min(worth.leastRedundancy, redundancy);
    worth.sum += clear;
  }
  return worth;
}
