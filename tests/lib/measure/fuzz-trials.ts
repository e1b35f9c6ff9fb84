/** Fuzzed readings through the contract and the fit: counts of what became of them, and of what must not be. */

import { type Reading, reading as readingContract } from '@/lib/contracts/readings';
import { fitRules } from '@/lib/contracts/shop-rules';
import type { Fit } from '@/lib/measure/fit';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { fuzzedReading, grossSlip, notNumbers } from './fuzzed-readings';
import { sampleRun } from './sample-runs';
import { seeded } from './seeded';
import { bookOf, type TrueRoom } from './true-room';

export type FuzzCounts = {
  readings: number;
  /** By the contract, before anything is kept. */
  refused: number;
  /** They stand in a book that was fitted. */
  fitted: number;
  /** Slips past doubt (100 mm and more) in a room that was read true; told by a problem or as the suspect. */
  gross: number;
  told: number;
  /** None of these may be. */
  threw: string[];
  notNumbers: string[];
  silent: string[];
};

const rules = fitRules.parse(defaultShopRules('UK').fit);
const room: TrueRoom = {
  closed: true,
  zRefMm: 910,
  floor: (xMm, yMm) => -0.002 * xMm + 0.001 * yMm,
  walls: ['A', 'B', 'C', 'D'].map((name, i) => ({
    name,
    lengthMm: [3_004, 2_398, 2_995, 2_401][i] ?? 0,
    cornerDeg: [89.8, 90.3, 89.9, 90][i] ?? 90,
    lean: [0.002, -0.001, 0.003, 0][i] ?? 0,
    bowMm: [2, -1, 3, 0][i] ?? 0,
  })),
};
const book = bookOf(room, {
  diagonals: [
    [0, 2],
    [1, 3],
  ],
  noiseMm: 0.3,
  seed: 4,
});
const runs = [sampleRun(1, 0), sampleRun(2, 2, { right: { kind: 'open', limitMm: 2_600 } })];
/** Readings put into one book together, beside the true ones. */
const IN_ONE_BOOK = 40;

export function fuzzReadings(count: number, seed: number): FuzzCounts {
  const random = seeded(seed);
  const counts: FuzzCounts = {
    readings: count,
    refused: 0,
    fitted: 0,
    gross: 0,
    told: 0,
    threw: [],
    notNumbers: [],
    silent: [],
  };
  let batch: Reading[] = [];
  const flush = () => {
    if (batch.length > 0) fitted(counts, [...book.readings, ...batch], batch);
    batch = [];
  };
  for (let n = 0; n < count; n++) {
    // One in a hundred is a slip past doubt in the true book, where it must not go unseen.
    if (n % 100 === 0) tellsOf(counts, grossSlip(random, book, n));
    const given = fuzzedReading(random, book, n);
    const parsed = guarded(counts, given, () => readingContract.safeParse(given));
    if (!parsed?.success) {
      counts.refused++;
      continue;
    }
    batch.push(parsed.data);
    if (batch.length === IN_ONE_BOOK) flush();
  }
  flush();
  return counts;
}

function guarded<T>(counts: FuzzCounts, given: unknown, act: () => T): T | null {
  try {
    return act();
  } catch (error) {
    counts.threw.push(`${error}: ${String(JSON.stringify(given, writable)).slice(0, 300)}`);
    return null;
  }
}

const writable = (_key: string, value: unknown) =>
  typeof value === 'bigint' ? `${value}n` : value;

function fitted(counts: FuzzCounts, readings: Reading[], strange: Reading[]): Fit | null {
  const fit = guarded(counts, strange, () => fitRoom({ ...book, readings }, runs, rules));
  if (!fit) return null;
  const bad = notNumbers(fit);
  if (bad.length > 0) counts.notNumbers.push(`${bad[0]}: ${JSON.stringify(strange).slice(0, 300)}`);
  const standing = new Set(fit.readingIds);
  const named = new Set(fit.problems.flatMap(({ about }) => about));
  for (const one of strange) {
    const struck = one.kind === 'withdrawal' || one.kind === 'skip' || one.replaces !== undefined;
    if (standing.has(one.id) || named.has(one.id) || struck) counts.fitted++;
    else counts.silent.push(`neither stands nor is named: ${JSON.stringify(one).slice(0, 300)}`);
  }
  return fit;
}

function tellsOf(counts: FuzzCounts, { of, slipped }: { of: Reading; slipped: Reading }): void {
  const readings = book.readings.map((one) => (one === of ? slipped : one));
  const fit = fitted(counts, readings, [slipped]);
  if (!fit) return;
  counts.gross++;
  const isNamed = fit.problems.some(({ about }) => about.includes(slipped.id));
  if (isNamed || fit.closure.suspect !== null) counts.told++;
  else counts.silent.push(`gross and untold: ${JSON.stringify(slipped).slice(0, 300)}`);
}
