/** Which one further reading would tell most: a diagonal, or the same reading again. */
import type { AdjustedRoom, FurtherReading, SparseRow } from './adjusted-room';
import { furtherReadings, isTaped } from './further-readings';
import { type Reliability, redundancyFrom, reliabilityOf, UNCHECKED } from './reliability';
import { project, spread } from './row-products';

/** Steps that gain at least this share of the best are as good; the cheapest of them comes first. */
const AS_GOOD = 0.9;
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
 * Ranks the further readings by how much they raise the least redundancy (over all lengths, corners,
 * diagonals and widths; with suspects, over these, less what cannot be told from another suspect).
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
  const { rows, cofactor, observations } = room.system;
  const reliability = reliabilityOf(rows, observations.length, cofactor);
  const weighed = observations.flatMap((o, i) =>
    isTaped(o) && (!options.suspects || options.suspects.includes(i)) ? [i] : [],
  );
  const tellApart = options.suspects ? weighed : [];
  const before = worthOf(reliability, weighed, tellApart, null);
  const steps = furtherReadings(room, options).map(({ reading, row }) => {
    const after = worthOf(reliability, weighed, tellApart, changeBy(room, row));
    return { reading, before, after };
  });
  const helping = steps.filter(({ after }) => after.least > before.least + 1e-6);
  const ranked =
    helping.length > 0 ? helping : steps.filter((s) => s.after.sum > before.sum + 1e-6);
  const by = helping.length > 0 ? 'least' : 'sum';
  const best = ranked.reduce((most, { after }) => Math.max(most, after[by] - before[by]), 0);
  return ranked
    .map((step, order) => ({ ...step, order, gain: step.after[by] - before[by] }))
    .sort(
      (one, other) =>
        Number(other.gain >= AS_GOOD * best) - Number(one.gain >= AS_GOOD * best) ||
        (one.gain >= AS_GOOD * best ? COST[one.reading.kind] - COST[other.reading.kind] : 0) ||
        other.gain - one.gain ||
        one.order - other.order,
    )
    .slice(0, options.most ?? 5)
    .map(({ reading, after }) => ({
      reading,
      leastRedundancy: before.leastRedundancy,
      leastRedundancyAfter: after.leastRedundancy,
    }));
}

type Worth = { least: number; sum: number; leastRedundancy: number };
/** What one more reading takes from aᵢQaⱼ: pullᵢ·pullⱼ/total, a rank-one change of the cofactor matrix. */
type Change = { pull: Float64Array; total: number };

function changeBy(room: AdjustedRoom, row: SparseRow): Change {
  const { rows, cofactor, observations } = room.system;
  const spreadRow = spread(cofactor, row);
  const pull = new Float64Array(observations.length);
  for (let i = 0; i < pull.length; i++) pull[i] = project(rows[i] ?? row, spreadRow);
  return { pull, total: row.sigma ** 2 + project(row, spreadRow) };
}

/** Worth of a set of readings: the least redundancy (clear of the other suspects), and their sum. */
function worthOf(
  { sigmas, shared }: Reliability,
  weighed: number[],
  tellApart: number[],
  change: Change | null,
): Worth {
  const sharedBy = (i: number, j: number) => {
    const now = shared[i]?.[j] ?? 0;
    return change ? now - ((change.pull[i] ?? 0) * (change.pull[j] ?? 0)) / change.total : now;
  };
  const redundancies = sigmas.map((sigma, i) => redundancyFrom(sharedBy(i, i), sigma));
  const worth = { least: 1, sum: 0, leastRedundancy: 1 };
  for (const i of weighed) {
    const redundancy = redundancies[i] ?? 0;
    let tied = 0;
    for (const j of tellApart) {
      const other = redundancies[j] ?? 0;
      if (j === i || redundancy <= UNCHECKED || other <= UNCHECKED) continue;
      const scale = (sigmas[i] ?? 1) * (sigmas[j] ?? 1);
      tied = Math.max(tied, (sharedBy(i, j) / scale) ** 2 / (redundancy * other));
    }
    const clear = redundancy * Math.max(0, 1 - tied);
    worth.least = Math.min(worth.least, clear);
    worth.leastRedundancy = Math.min(worth.leastRedundancy, redundancy);
    worth.sum += clear;
  }
  return worth;
}
