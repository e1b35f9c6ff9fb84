/**
 * Cholesky decomposition of a small positive definite matrix, on one flat array by rows.
 * The library's takes 17.8 of the 40 kB that the phone may load for the engine, and five times as long;
 * the tests hold this one against it.
 */

/** Lower triangle L with L·Lᵀ = the matrix, of which only the lower half is read; null: not definite. */
export function choleskyOf(
  matrix: Float64Array,
  size: number,
  leastPivot = 0,
): Float64Array | null {
  const lower = new Float64Array(size * size);
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * size + j] ?? 0;
      for (let k = 0; k < j; k++) sum -= (lower[i * size + k] ?? 0) * (lower[j * size + k] ?? 0);
      if (i !== j) lower[i * size + j] = sum / (lower[j * size + j] ?? 1);
      else if (sum > leastPivot * leastPivot) lower[i * size + i] = Math.sqrt(sum);
      else return null;
    }
  }
  return lower;
}

/** x with L·Lᵀ·x = right. */
export function solveCholesky(
  lower: Float64Array,
  size: number,
  right: Float64Array,
): Float64Array {
  const x = right.slice();
  for (let i = 0; i < size; i++) {
    let sum = x[i] ?? 0;
    for (let k = 0; k < i; k++) sum -= (lower[i * size + k] ?? 0) * (x[k] ?? 0);
    x[i] = sum / (lower[i * size + i] ?? 1);
  }
  for (let i = size - 1; i >= 0; i--) {
    let sum = x[i] ?? 0;
    for (let k = i + 1; k < size; k++) sum -= (lower[k * size + i] ?? 0) * (x[k] ?? 0);
    x[i] = sum / (lower[i * size + i] ?? 1);
  }
  return x;
}

/** Inverse of L·Lᵀ, as rows. */
export function invertCholesky(lower: Float64Array, size: number): Float64Array[] {
  const half = new Float64Array(size * size);
  for (let i = 0; i < size; i++) {
    const pivot = lower[i * size + i] ?? 1;
    half[i * size + i] = 1 / pivot;
    for (let j = 0; j < i; j++) {
      let sum = 0;
      for (let k = j; k < i; k++) sum -= (lower[i * size + k] ?? 0) * (half[k * size + j] ?? 0);
      half[i * size + j] = sum / pivot;
    }
  }
  const rows = Array.from({ length: size }, () => new Float64Array(size));
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = 0;
      for (let k = i; k < size; k++) sum += (half[k * size + i] ?? 0) * (half[k * size + j] ?? 0);
      const [row, other] = [rows[i], rows[j]];
      if (row) row[j] = sum;
      if (other) other[i] = sum;
    }
  }
  return rows;
}
