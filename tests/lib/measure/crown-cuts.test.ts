import { describe, expect, test } from 'vitest';
import type { Run } from '@/lib/contracts/runs';
import { fitRules } from '@/lib/contracts/shop-rules';
import { fitRoom } from '@/lib/measure/fit-room';
import { crownMitre } from '@/lib/measure/mitre';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { sampleRun } from './sample-runs';
import { bookOf, countedId, type TrueRoom } from './true-room';

const rules = fitRules.parse(defaultShopRules('UK').fit);
const room: TrueRoom = {
  closed: true,
  zRefMm: 910,
  ceilingMm: 2_400,
  walls: [3_000, 2_400, 3_000, 2_400].map((lengthMm, i) => ({
    name: 'ABCD'.charAt(i),
    lengthMm,
    cornerDeg: [90, 91.2, 88.8, 90][i] ?? 90,
  })),
};
const book = bookOf(room, { diagonals: [[0, 2]] });
const uppers = (n: number, wall: number, over: Partial<Run>) =>
  sampleRun(n, wall, {
    level: 'wall',
    z0Mm: 1_400,
    z1Mm: 2_300,
    carcassDepthMm: 300,
    overBoxes: 'crown',
    ...over,
  });
const along = uppers(1, 0, {
  left: { kind: 'open', limitMm: 500 },
  right: { kind: 'run', runId: countedId(1_002), through: 'this' },
});
const round = uppers(2, 1, { left: { kind: 'run', runId: countedId(1_001), through: 'other' } });
const crownOf = (given: typeof book, runs: Run[] = [along, round]) =>
  fitRoom(given, runs, rules).runs.map(({ ceiling }) => ceiling?.crown ?? []);

describe('a crown over hung boxes', () => {
  test('turns square round a finished end and by the corner as it is into the next run', () => {
    const [first = []] = crownOf(book);
    expect(first.map(({ end, corner }) => [end, corner])).toEqual([
      ['left', 'outside'],
      ['right', 'inside'],
    ]);
    expect(first[0]?.mitre.value).toBeCloseTo(31.62, 2);
    const spring = { value: 38, u: 0, from: [] };
    const table = crownMitre(spring, { value: 91.2, u: 0, from: [] }).value;
    expect(first[1]?.mitre.value).toBeCloseTo(table?.mitre.value ?? 0, 1);
    expect(first[1]?.bevel.value).toBeCloseTo(table?.bevel.value ?? 0, 1);
    expect(first[1]?.mitre.U).toBeGreaterThan(0);
  });

  test('both runs that meet are cut alike, and against a wall there is no mitre', () => {
    const [first = [], second = []] = crownOf(book);
    expect(second).toHaveLength(1);
    expect(second[0]?.mitre.value).toBe(first[1]?.mitre.value);
  });

  test('is not cut by a corner that nobody read', () => {
    const readings = book.readings.filter(({ kind }) => kind !== 'corner');
    const [first = []] = crownOf({ ...book, readings });
    expect(first.map(({ end }) => end)).toEqual(['left']);
  });
});
