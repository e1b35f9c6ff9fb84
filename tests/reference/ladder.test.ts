import { describe, expect, it } from 'vitest';
import { turnsCorner } from '@/lib/measure/way-in';
import ladder from './data/ladder.json';

const FOOT_MM = 304.8;
const exact = (value: number) => ({ value, u: 0, from: [] });

/** The longest thin board that gets round the corner: what is tried and what the engine says is to spare; too long to stand. */
function longestMm(widthInMm: number, widthOutMm: number, tryMm: number): number {
  const board = { widthMm: tryMm, depthMm: 1e-6, heightMm: 500 };
  const passage = {
    widthIn: exact(widthInMm),
    widthOut: exact(widthOutMm),
    clearHeight: exact(2_000),
  };
  const { value } = turnsCorner(board, passage);
  return tryMm + (value?.margin.value ?? Number.NaN);
}

describe('a ladder round the corner of a hall as published', () => {
  it('is as long as the published one, from 3 ft into 4 ft', () => {
    const { inputs, published } = ladder.hall;
    const { widthInFt, widthOutFt } = inputs;
    const longest = longestMm(widthInFt * FOOT_MM, widthOutFt * FOOT_MM, 9 * FOOT_MM);
    expect(longest / FOOT_MM).toBeCloseTo(published.longestFt, 2);
  });

  it.each([
    [900, 900],
    [750, 1_200],
    [1_000, 2_400],
  ])('follows the textbook’s formula from %i into %i', (a, b) => {
    const published = (a ** (2 / 3) + b ** (2 / 3)) ** (3 / 2);
    // Longer than either hall is wide, so that it must turn.
    expect(longestMm(a, b, 0.95 * published)).toBeCloseTo(published, 1);
  });
});
