import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import { fitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { whatIsMissing } from '@/lib/measure/what-is-missing';
import { sampleRun, sampleUnit } from './sample-runs';
import { bookOf, countedId, squareRoom, type TrueRoom } from './true-room';

const rules = fitRules.parse(defaultShopRules('US').fit);
const room: TrueRoom = {
  ...squareRoom,
  walls: squareRoom.walls.map((wall) => ({ ...wall, lean: 0.002, bowMm: 2 })),
};
const book = bookOf(room, { diagonals: [[0, 2]] });
const runs: Run[] = [
  sampleRun(1, 1, { right: { kind: 'run', runId: countedId(1_002), through: 'other' } }),
  sampleRun(2, 2, {
    left: { kind: 'run', runId: countedId(1_001), through: 'this' },
    right: { kind: 'open', limitMm: 2_000 },
  }),
  sampleRun(3, 1, { level: 'tall', z1Mm: 2_100, units: [sampleUnit(31, { kind: 'tall' })] }),
  sampleRun(4, 0, { island: { offsetMm: 1_200, alongMm: 500, setLineRunId: countedId(1_001) } }),
];

/** Paths of numbers that are not finite. */
function notNumbers(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => notNumbers(inner, `${path}/${key}`));
}

function check(bad: WallBook, badRuns: Run[] = runs) {
  expect(notNumbers(fitRoom(bad, badRuns, rules))).toEqual([]);
  expect(notNumbers(whatIsMissing(bad, badRuns, rules))).toEqual([]);
}

const strange = fc.oneof(
  fc.constantFrom(0, -0, 1e-9, -1, 1e-300, 1e6, 1e12, -1e9, Number.NaN, Infinity, -Infinity),
  fc.double({ noNaN: true, min: -1e5, max: 1e5 }),
);

/** Puts other numbers in place of some of a reading's own. */
function spoiled(reading: Reading, values: number[]): Reading {
  let next = 0;
  const take = (field: unknown): unknown => {
    if (typeof field === 'number') return values[next++ % values.length] ?? field;
    if (field === null || typeof field !== 'object') return field;
    return Object.fromEntries(Object.entries(field).map(([key, inner]) => [key, take(inner)]));
  };
  return take(reading) as Reading;
}

test('readings of any numbers give problems, never a throw or a number that is none', () => {
  const some = fc.array(
    fc.record({
      at: fc.nat({ max: book.readings.length - 1 }),
      values: fc.array(strange, { minLength: 1, maxLength: 5 }),
    }),
    { minLength: 1, maxLength: 6 },
  );
  fc.assert(
    fc.property(some, (spoils) => {
      const readings = [...book.readings];
      for (const { at, values } of spoils) {
        const reading = readings[at];
        if (reading) readings[at] = spoiled(reading, values);
      }
      check({ ...book, readings });
    }),
    { seed: 8, numRuns: 40, endOnFailure: true },
  );
}, 60_000);

test('walls of any length and corner, drawn in any number, give problems', () => {
  const walls = fc.array(
    fc.record({
      length: fc.oneof(fc.constantFrom(0, 1, 1e5), fc.double({ min: 0, max: 1e4, noNaN: true })),
      corner: fc.oneof(fc.constant(null), fc.double({ min: 0.001, max: 359.9, noNaN: true })),
    }),
    { minLength: 1, maxLength: 6 },
  );
  fc.assert(
    fc.property(walls, fc.boolean(), fc.boolean(), (drawn, closed, keepReadings) => {
      const chain = {
        closed,
        walls: drawn.map(({ length, corner }, i) => ({
          id: countedId(100 + i),
          name: String.fromCharCode(65 + i),
          nominalLengthMm: length,
          leftCornerDeg: corner,
        })),
      };
      const readings = keepReadings ? book.readings : [];
      check({ ...book, room: { ...book.room, chains: [chain] }, readings });
    }),
    { seed: 9, numRuns: 40, endOnFailure: true },
  );
}, 60_000);

test('runs that cannot be give problems', () => {
  const end = fc.oneof(
    fc.constant({ kind: 'wall' as const }),
    fc.record({
      kind: fc.constant('open' as const),
      limitMm: fc.double({ min: 0, max: 1e5, noNaN: true }),
    }),
    fc.record({
      kind: fc.constant('casing' as const),
      xMm: fc.double({ min: 0, max: 1e5, noNaN: true }),
    }),
    fc.record({
      kind: fc.constant('existing' as const),
      xMm: fc.double({ min: 0, max: 1e4, noNaN: true }),
      standOffMm: fc.double({ min: -5e3, max: 1e5, noNaN: true }),
    }),
    fc.record({
      kind: fc.constant('run' as const),
      runId: fc.constantFrom(countedId(1_001), countedId(1_002), countedId(1_009)),
      through: fc.constantFrom(
        'this' as const,
        'other' as const,
        'both-stop' as const,
        'corner-unit' as const,
      ),
    }),
  );
  const run = fc
    .record({
      wall: fc.nat({ max: 4 }),
      left: end,
      right: end,
      depth: fc.double({ min: 1, max: 2_000, noNaN: true }),
      z0: fc.double({ min: -2_000, max: 3_000, noNaN: true }),
      z1: fc.double({ min: -2_000, max: 3_000, noNaN: true }),
      widths: fc.array(fc.double({ min: 0.1, max: 5_000, noNaN: true }), { maxLength: 5 }),
      level: fc.constantFrom('base' as const, 'wall' as const, 'tall' as const),
    })
    .map(({ wall, left, right, depth, z0, z1, widths, level }) =>
      sampleRun(1, wall, {
        left,
        right,
        level,
        carcassDepthMm: depth,
        z0Mm: z0,
        z1Mm: z1,
        units: widths.map((widthMm, i) => sampleUnit(i, { widthMm })),
      }),
    );
  fc.assert(
    fc.property(run, run, (one, other) => {
      check(book, [one, { ...other, id: countedId(1_002) }]);
    }),
    { seed: 10, numRuns: 50, endOnFailure: true },
  );
}, 60_000);

test('a book whose tools are lost is read as by a plain tape, and says so', () => {
  const fit = fitRoom({ ...book, tools: [] }, runs, rules);
  expect(fit.problems.map(({ code }) => code)).toContain('unknown-tool');
  expect(notNumbers(fit)).toEqual([]);
});
