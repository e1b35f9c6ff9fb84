import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hatch } from '@/lib/drawing/hatch';
import type { Point } from '@/lib/drawing/shape';

const square: Point[] = [
  [-5, -5],
  [5, -5],
  [5, 5],
  [-5, 5],
];
const notched: Point[] = [
  [0, 0],
  [30, 0],
  [30, 30],
  [20, 30],
  [20, 10],
  [10, 10],
  [10, 30],
  [0, 30],
];

function area(outline: readonly Point[]): number {
  const sum = outline.reduce((total, [x, y], index) => {
    const [nextX = 0, nextY = 0] = outline[(index + 1) % outline.length] ?? [];
    return total + x * nextY - nextX * y;
  }, 0);
  return Math.abs(sum) / 2;
}

describe('hatch', () => {
  it('draws three lines over a square of ten at 45° and a spacing of five', () => {
    expect(hatch(square, 5, 45)).toHaveLength(3);
  });

  it('covers an outline in proportion to its area, hollows left out, at any angle', () => {
    fc.assert(
      fc.property(fc.double({ min: -90, max: 90, noNaN: true }), (angle) => {
        for (const outline of [square, notched]) {
          const lines = hatch(outline, 0.05, angle);
          const length = lines.reduce(
            (sum, [from, to]) => sum + Math.hypot(to[0] - from[0], to[1] - from[1]),
            0,
          );
          expect(length * 0.05).toBeGreaterThan(area(outline) * 0.98);
          expect(length * 0.05).toBeLessThan(area(outline) * 1.02);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('draws nothing in a line or without a spacing', () => {
    expect(hatch(square.slice(0, 2), 5, 45)).toEqual([]);
    expect(hatch(square, 0, 45)).toEqual([]);
  });
});
