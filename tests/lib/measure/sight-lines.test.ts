import { describe, expect, it } from 'vitest';
import { chiSquareLimit, chiSquareTail } from '@/lib/measure/chi-square';
import { errorEllipse } from '@/lib/measure/error-ellipse';
import { seesAcross, type WallLine } from '@/lib/measure/sight-lines';

/** An L: the corner at 2000, 1500 juts into the room. */
const plan = { x: [0, 4_000, 4_000, 2_000, 2_000, 0], y: [0, 0, 1_500, 1_500, 3_000, 3_000] };
const closed: WallLine[] = plan.x.map((_, i) => ({ left: i, right: (i + 1) % 6, closed: true }));
const sees = (from: number, to: number) => seesAcross(plan, closed, from, to);

describe('which corners see each other', () => {
  it('sees across the room and not through a wall', () => {
    expect(sees(0, 3)).toBe(true);
    expect(sees(1, 3)).toBe(true);
    expect(sees(0, 2)).toBe(true);
    expect(sees(2, 4)).toBe(false);
  });

  it('does not call a wall a diagonal, nor a line that touches another corner free', () => {
    expect(sees(0, 1)).toBe(false);
    // From 4000, 0 to 0, 3000 the line passes exactly through 2000, 1500.
    expect(sees(1, 5)).toBe(false);
  });

  it('is the same both ways', () => {
    for (let i = 0; i < 6; i++) for (let j = 0; j < 6; j++) expect(sees(i, j)).toBe(sees(j, i));
  });

  it('sees across an open chain, but not through what stands behind an outside corner', () => {
    const walls = [0, 1].map((i) => ({ left: i, right: i + 1, closed: false }));
    const inside = { x: [0, 3_000, 3_000], y: [0, 0, 2_000] };
    expect(seesAcross(inside, walls, 0, 2)).toBe(true);
    const outside = { x: [0, 3_000, 3_000], y: [0, 0, -2_000] };
    expect(seesAcross(outside, walls, 0, 2)).toBe(false);
  });

  it('sees from wall to wall of a galley', () => {
    const galley = { x: [0, 3_000, 3_000, 0], y: [0, 0, 2_400, 2_400] };
    const walls = [0, 2].map((i) => ({ left: i, right: i + 1, closed: false }));
    expect(seesAcross(galley, walls, 0, 2)).toBe(true);
    expect(seesAcross(galley, walls, 1, 2)).toBe(true);
    expect(seesAcross(galley, walls, 0, 1)).toBe(false);
  });
});

describe('the chi-square distribution', () => {
  it.each([
    [1, 0.05, 3.8415],
    [3, 0.01, 11.3449],
    [10, 0.01, 23.2093],
    [60, 0.01, 88.3794],
    [200, 0.01, 249.4451],
  ])('has its printed value for %d degrees of freedom at %d', (degrees, alpha, printed) => {
    expect(chiSquareLimit(degrees, alpha)).toBeCloseTo(printed, 3);
    expect(chiSquareTail(printed, degrees)).toBeCloseTo(alpha, 5);
  });

  it('has nothing to test without degrees of freedom', () => {
    expect(chiSquareLimit(0, 0.01)).toBe(0);
    expect(chiSquareTail(-1, 3)).toBe(1);
  });
});

describe('the error ellipse', () => {
  it('lies along the axis of the larger variance', () => {
    expect(errorEllipse(4, 1, 0)).toEqual({ aMm: 2, bMm: 1, angleDeg: 0 });
    expect(errorEllipse(1, 4, 0)).toEqual({ aMm: 2, bMm: 1, angleDeg: 90 });
    expect(errorEllipse(2, 2, 0)).toMatchObject({ angleDeg: 0 });
  });

  it('turns towards y with a positive covariance', () => {
    const { aMm, bMm, angleDeg } = errorEllipse(2.5, 2.5, 1.5);
    expect(aMm).toBeCloseTo(2, 12);
    expect(bMm).toBeCloseTo(1, 12);
    expect(angleDeg).toBeCloseTo(45, 12);
  });
});
