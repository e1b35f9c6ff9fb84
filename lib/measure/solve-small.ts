/**
 * Solves a small square system by Gaussian elimination with row pivoting; null where it is singular.
 * For the three or four unknowns of a plane; larger systems go to `cholesky`.
 */
export function solveSmall(matrix: number[][], right: number[]): number[] | null {
  const size = right.length;
  const rows = matrix.map((row, index) => row.concat(right[index] ?? 0));
  for (let column = 0; column < size; column += 1) {
    let best = column;
    for (let row = column + 1; row < size; row += 1) {
      if (Math.abs(rows[row]?.[column] ?? 0) > Math.abs(rows[best]?.[column] ?? 0)) best = row;
    }
    const [pivotRow, swapped] = [rows[best], rows[column]];
    if (!pivotRow || !swapped) return null;
    rows[best] = swapped;
    rows[column] = pivotRow;
    const pivot = pivotRow[column] ?? 0;
    if (!(Math.abs(pivot) > 1e-12)) return null;
    for (let row = 0; row < size; row += 1) {
      const current = rows[row];
      if (row === column || !current) continue;
      const factor = (current[column] ?? 0) / pivot;
      if (factor === 0) continue;
      for (let at = column; at <= size; at += 1) {
        current[at] = (current[at] ?? 0) - factor * (pivotRow[at] ?? 0);
      }
    }
  }
  return rows.map((row, index) => (row[size] ?? 0) / (row[index] ?? 1));
}
