/** Gauss–Newton on the observation equations of a room, with the priors that keep weak unknowns honest. */
import type { SparseRow } from './adjusted-room';
import { choleskyOf, invertCholesky, solveCholesky } from './cholesky';
import { equationOf, observedValue } from './room-equations';
import { FIXED, type RoomLayout } from './room-layout';
import type { AdjustOptions, RoomObservation } from './room-observations';
import type { Equation, RoomState } from './room-state';
import { project } from './row-products';

/** Standard uncertainty of an unread wall's lean: 6 mm/m, a wall at the edge of what warranties allow. */
export const USUAL_LEAN = 0.006;
/**
 * Standard uncertainty of how much more a wall leans at one end than at the other: 1 mm/m, a judgement.
 * Without it one true room in four, its walls twisted that much, fails the test (tests/bench).
 */
export const USUAL_TWIST = 0.001;
/** Where a facing chain stands along its walls when only widths tie it: within a metre, or nearly so. */
const TIED_PLACE_MM = 1_000;
const MOST_STEPS = 40;
/** A slip of a metre bends the room so far that the last steps creep: after these, near is enough. */
const PATIENCE = 8;
const SLOW_GAIN = 1e-3;
/** After a step this small (mm) the next would be lost in the rounding of the outputs. */
const SMALL_STEP = 1e-4;
/** Pivot of the scaled normal matrix below which an unknown hangs on rounding alone. */
const LEAST_PIVOT = 1e-6;

export type Solution = {
  state: RoomState;
  /** Rows of the observations, then of the priors. */
  rows: SparseRow[];
  /** adjusted − read, by row, in the row's own unit. */
  residuals: Float64Array;
  cofactor: Float64Array[];
};

/** Solves the room from the state given, in place; null when the readings do not determine it. */
export function solveRoom(
  state: RoomState,
  observations: RoomObservation[],
  options: AdjustOptions,
): Solution | null {
  const priors = priorsOf(state, observations, options);
  const observed = observations.map(observedValue);
  let linear = linearise(state, observations, observed, priors);
  let misfit = linear ? weightedSquares(linear) : 0;
  for (let step = 1; linear; step++) {
    const normal = factorise(linear.rows, linear.residuals, state.layout.unknownCount);
    if (!normal) return null;
    const change = normal.change();
    const largest = change.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
    if (!Number.isFinite(largest)) return null;
    const next = descend(state, change, misfit, () =>
      linearise(state, observations, observed, priors),
    );
    if (!next) return null;
    const gained = misfit - next.misfit;
    ({ linear, misfit } = next);
    if (largest < SMALL_STEP) return solved(state, linear, normal.inverse());
    if (step >= PATIENCE && gained < SLOW_GAIN * misfit) {
      const last = factorise(linear.rows, linear.residuals, state.layout.unknownCount);
      return last ? solved(state, linear, last.inverse()) : null;
    }
    if (step === MOST_STEPS) return null;
  }
  return null;
}

/**
 * The residuals of the adjustment as they would be if the equations were straight, seen from a state.
 * Seen from a sound state a gross slip does not bend the room, and the tests keep their meaning.
 */
export function linearSolution(
  state: RoomState,
  observations: RoomObservation[],
  options: AdjustOptions,
): Solution | null {
  const priors = priorsOf(state, observations, options);
  const linear = linearise(state, observations, observations.map(observedValue), priors);
  const normal = linear && factorise(linear.rows, linear.residuals, state.layout.unknownCount);
  if (!linear || !normal) return null;
  const change = normal.change();
  const residuals = linear.residuals.map(
    (residual, i) => residual + project(linear.rows[i] ?? emptyRow, change),
  );
  return { state, rows: linear.rows, residuals, cofactor: normal.inverse() };
}

const solved = (state: RoomState, linear: Linear, cofactor: Float64Array[]): Solution => ({
  state,
  ...linear,
  cofactor,
});

type Linear = { rows: SparseRow[]; residuals: Float64Array };

/** Takes the step, or the half, quarter … of it that does not make the fit worse (gross slips need it). */
function descend(
  state: RoomState,
  change: Float64Array,
  misfitBefore: number,
  linearised: () => Linear | null,
): { linear: Linear; misfit: number } | null {
  const worst = misfitBefore * (1 + 1e-9) + 1e-9;
  moveState(state, change, 1);
  for (let share = 0.5; ; share /= 2) {
    const linear = linearised();
    if (!linear) return null;
    const misfit = weightedSquares(linear);
    if (misfit <= worst || share < 0.01) return { linear, misfit };
    moveState(state, change, -share);
  }
}

export function weightedSquares({ rows, residuals }: Linear): number {
  return rows.reduce((sum, row, i) => sum + ((residuals[i] ?? 0) / row.sigma) ** 2, 0);
}

type Prior = { column: number; now: () => number; value: number; sigma: number };

function priorsOf(
  state: RoomState,
  observations: RoomObservation[],
  options: AdjustOptions,
): Prior[] {
  const { layout } = state;
  const plumbed = new Set<number>();
  for (const observation of observations) {
    if (observation.kind === 'plumb') plumbed.add(layout.wallById.get(observation.wallId) ?? FIXED);
  }
  const priors: Prior[] = [];
  const lean = options.leanPrior ?? USUAL_LEAN;
  // A bow within ±β with equal chance of any: β/√3 (GUM 4.3.7).
  const bow = Math.max(options.usualBowMm, 1e-3) / Math.sqrt(3);
  const hold = (column: number, sigma: number) =>
    priors.push({ column, now: () => state.nuisance[column] ?? 0, value: 0, sigma });
  layout.walls.forEach((wall, i) => {
    if (wall.leanColumn !== FIXED && !plumbed.has(i)) hold(wall.leanColumn, lean);
    if (wall.twistColumn !== FIXED) hold(wall.twistColumn, USUAL_TWIST);
    if (wall.bowColumn !== FIXED) hold(wall.bowColumn, bow);
  });
  for (const column of layout.toolColumns.values()) hold(column, 1);
  priors.push(...tiePriors(state, layout));
  return priors;
}

/** A tied chain may still slide along its walls: its first two points are held loosely. */
function tiePriors(state: RoomState, layout: RoomLayout): Prior[] {
  const priors: Prior[] = [];
  layout.chainStarts.forEach((start, chain) => {
    if (!layout.chainTied[chain]) return;
    for (const point of [start.point, start.point + 1]) {
      const place = layout.points[point];
      if (!place) continue;
      for (const [column, from] of [
        [place.xColumn, state.x],
        [place.yColumn, state.y],
      ] as const) {
        const now = () => from[point] ?? 0;
        priors.push({ column, now, value: now(), sigma: TIED_PLACE_MM });
      }
    }
  });
  return priors;
}

function linearise(
  state: RoomState,
  observations: RoomObservation[],
  observed: { value: number; sigma: number }[],
  priors: Prior[],
): Linear | null {
  const rows: SparseRow[] = [];
  const residuals = new Float64Array(observations.length + priors.length);
  for (const [i, observation] of observations.entries()) {
    const equation = equationOf(state, observation);
    const read = observed[i];
    if (!equation || !read) return null;
    const sigma = Math.sqrt(read.sigma ** 2 + (equation.leftOut ?? 0));
    rows.push({ columns: equation.columns, partials: equation.partials, sigma });
    residuals[i] = difference(equation, read.value, observation.kind === 'corner');
  }
  priors.forEach((prior, i) => {
    rows.push({ columns: [prior.column], partials: [1], sigma: prior.sigma });
    residuals[observations.length + i] = prior.now() - prior.value;
  });
  return { rows, residuals };
}

function difference(equation: Equation, read: number, isAngle: boolean): number {
  const plain = equation.predicted - read;
  if (!isAngle) return plain;
  return plain - 2 * Math.PI * Math.round(plain / (2 * Math.PI));
}

/** Normal equations scaled to a unit diagonal and decomposed; null when they determine nothing. */
function factorise(rows: SparseRow[], residuals: Float64Array, count: number) {
  const matrix = new Float64Array(count * count);
  const right = new Float64Array(count);
  // Plain loops: this and the product below are most of the time of a fit.
  for (let r = 0; r < rows.length; r++) {
    const { columns, partials, sigma } = rows[r] ?? emptyRow;
    const weight = 1 / (sigma * sigma);
    for (let i = 0; i < columns.length; i++) {
      const column = columns[i] ?? 0;
      const weighted = (partials[i] ?? 0) * weight;
      right[column] = (right[column] ?? 0) - weighted * (residuals[r] ?? 0);
      // The decomposition reads the lower half alone.
      for (let j = 0; j < columns.length; j++) {
        const other = columns[j] ?? 0;
        if (other > column) continue;
        const place = column * count + other;
        matrix[place] = (matrix[place] ?? 0) + weighted * (partials[j] ?? 0);
      }
    }
  }
  const scale = new Float64Array(count);
  for (let i = 0; i < count; i++) scale[i] = 1 / Math.sqrt(matrix[i * count + i] ?? 0);
  if (!scale.every(Number.isFinite)) return null;
  for (let i = 0; i < count; i++) {
    right[i] = (right[i] ?? 0) * (scale[i] ?? 0);
    for (let j = 0; j <= i; j++) {
      const place = i * count + j;
      matrix[place] = (matrix[place] ?? 0) * (scale[i] ?? 0) * (scale[j] ?? 0);
    }
  }
  const lower = choleskyOf(matrix, count, LEAST_PIVOT);
  if (!lower) return null;
  return {
    change: () => solveCholesky(lower, count, right).map((value, i) => value * (scale[i] ?? 0)),
    inverse: () => {
      const inverse = invertCholesky(lower, count);
      inverse.forEach((row, i) => {
        for (let j = 0; j < count; j++) row[j] = (row[j] ?? 0) * (scale[i] ?? 0) * (scale[j] ?? 0);
      });
      return inverse;
    },
  };
}

const emptyRow: SparseRow = { columns: [], partials: [], sigma: 1 };

function moveState(state: RoomState, change: Float64Array, share: number): void {
  const by = (column: number) => share * (change[column] ?? 0);
  state.layout.points.forEach((point, i) => {
    if (point.xColumn !== FIXED) state.x[i] = (state.x[i] ?? 0) + by(point.xColumn);
    if (point.yColumn !== FIXED) state.y[i] = (state.y[i] ?? 0) + by(point.yColumn);
  });
  for (let column = 0; column < state.nuisance.length; column++) {
    state.nuisance[column] = (state.nuisance[column] ?? 0) + by(column);
  }
}
