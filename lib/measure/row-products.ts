/** Products of sparse rows with the cofactor matrix: variances and how readings lean on each other. */
import type { SparseRow } from './adjusted-room';

type Row = Pick<SparseRow, 'columns' | 'partials'>;

/** Q·aᵀ as a dense vector. */
export function spread(cofactor: Float64Array[], row: Row): Float64Array {
  const result = new Float64Array(cofactor.length);
  spreadInto(result, cofactor, row);
  return result;
}

/** Q·aᵀ written over a vector that is used again and again. */
export function spreadInto(result: Float64Array, cofactor: Float64Array[], row: Row): void {
  const { columns, partials } = row;
  result.fill(0);
  for (let i = 0; i < columns.length; i++) {
    const line = cofactor[columns[i] ?? -1];
    const partial = partials[i] ?? 0;
    if (!line || partial === 0) continue;
    for (let k = 0; k < result.length; k++) result[k] = (result[k] ?? 0) + partial * (line[k] ?? 0);
  }
}

/** a·v for a sparse row and a dense vector. */
export function project(row: Row, vector: Float64Array): number {
  const { columns, partials } = row;
  let sum = 0;
  for (let i = 0; i < columns.length; i++) {
    sum += (partials[i] ?? 0) * (vector[columns[i] ?? 0] ?? 0);
  }
  return sum;
}

/** a·Q·aᵀ: the variance of a quantity that moves with the unknowns by this row. */
export function varianceOf(cofactor: Float64Array[], row: Row): number {
  return Math.max(0, project(row, spread(cofactor, row)));
}
