/** Products of sparse rows with the cofactor matrix: variances and how readings lean on each other. */
import type { SparseRow } from './adjusted-room';

type Row = Pick<SparseRow, 'columns' | 'partials'>;

/** Q·aᵀ as a dense vector. */
export function spread(cofactor: Float64Array[], row: Row): Float64Array {
  const result = new Float64Array(cofactor.length);
  row.columns.forEach((column, i) => {
    const line = cofactor[column];
    const partial = row.partials[i] ?? 0;
    if (!line || partial === 0) return;
    for (let k = 0; k < result.length; k++) result[k] = (result[k] ?? 0) + partial * (line[k] ?? 0);
  });
  return result;
}

/** a·v for a sparse row and a dense vector. */
export function project(row: Row, vector: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < row.columns.length; i++) {
    sum += (row.partials[i] ?? 0) * (vector[row.columns[i] ?? 0] ?? 0);
  }
  return sum;
}

/** a·Q·aᵀ: the variance of a quantity that moves with the unknowns by this row. */
export function varianceOf(cofactor: Float64Array[], row: Row): number {
  return Math.max(0, project(row, spread(cofactor, row)));
}
