import { expect, test } from 'vitest';
import { fuzzReadings } from './fuzz-trials';

test('readings of any shape and number are refused, fitted or named, and never thrown over or lost', () => {
  const counts = fuzzReadings(4_000, 20261201);
  expect(counts.threw).toEqual([]);
  expect(counts.notNumbers).toEqual([]);
  expect(counts.silent).toEqual([]);
  expect(counts.refused).toBeGreaterThan(1_000);
  expect(counts.fitted).toBeGreaterThan(1_000);
}, 30_000);
