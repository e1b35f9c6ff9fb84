import { expect, test } from 'vitest';
import { fuzzReadings } from './fuzz-trials';

test('readings of any shape and number are refused, fitted or named, and never thrown over or lost', () => {
  const counts = fuzzReadings(2_000, 20261201);
  expect(counts.threw).toEqual([]);
  expect(counts.notNumbers).toEqual([]);
  expect(counts.silent).toEqual([]);
  expect(counts.refused).toBeGreaterThan(500);
  expect(counts.fitted).toBeGreaterThan(500);
}, 30_000);
