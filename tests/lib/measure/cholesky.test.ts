import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { choleskyOf, invertCholesky, solveCholesky } from '@/lib/measure/cholesky';
import { seeded } from './seeded';

function definite(size: number, seed: number): Matrix {
  const random = seeded(seed);
  const root = Matrix.zeros(size, size + 2).apply(function (this: Matrix, i, j) {
    this.set(i, j, random.normal());
  });
  return root.mmul(root.transpose());
}

describe('the decomposition of a small matrix', () => {
  it.each([1, 2, 5, 12, 40])('agrees with the library for %d unknowns', (size) => {
    const matrix = definite(size, size);
    const right = Float64Array.from({ length: size }, (_, i) => i - 1);
    const lower = choleskyOf(Float64Array.from(matrix.to1DArray()), size);
    if (!lower) throw new Error('A definite matrix was refused.');
    const library = new CholeskyDecomposition(matrix);
    const expected = library.solve(Matrix.columnVector(Array.from(right))).to1DArray();
    const scale = Math.max(...expected.map(Math.abs));
    solveCholesky(lower, size, right).forEach((value, i) => {
      expect(Math.abs(value - (expected[i] ?? 0)) / scale).toBeLessThan(1e-8);
    });
    const product = new Matrix(invertCholesky(lower, size).map((row) => Array.from(row))).mmul(
      matrix,
    );
    expect(product.sub(Matrix.eye(size)).norm()).toBeLessThan(1e-7);
  });

  it('refuses a matrix that is not definite', () => {
    expect(choleskyOf(Float64Array.from([1, 2, 2, 1]), 2)).toBeNull();
    expect(choleskyOf(Float64Array.from([0]), 1)).toBeNull();
    expect(choleskyOf(Float64Array.from([Number.NaN]), 1)).toBeNull();
  });
});
