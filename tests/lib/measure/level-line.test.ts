import { expect, test } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import { fitRules } from '@/lib/contracts/shop-rules';
import { oneLevelLine } from '@/lib/measure/level-line';
import { openBook } from '@/lib/measure/room-book';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { bookOf, countedId, tape } from './true-room';

const rules = fitRules.parse(defaultShopRules('UK').fit);
const room = bookOf(
  { closed: false, zRefMm: 910, walls: [{ name: 'A', lengthMm: 3_000, cornerDeg: null }] },
  { faces: false, floors: false },
);

function level(
  n: number,
  setUp: number,
  xMm: number,
  mm: number,
  kind: 'floor' | 'ceiling' = 'floor',
): Reading {
  const base = {
    id: countedId(40_000 + n),
    roomId: countedId(1),
    toolId: tape.id,
    takenAt: '2026-01-05T09:00:00Z',
    typed: '',
    unit: 'mm' as const,
    touches: 'board' as const,
    wallId: countedId(100),
    xMm,
    yMm: 500,
    setUpId: countedId(6_000 + setUp),
  };
  return kind === 'floor' ? { ...base, kind, dropMm: mm } : { ...base, kind, riseMm: mm };
}

const lineOf = (...readings: Reading[]) => oneLevelLine(openBook({ ...room, readings }, rules));

test('a line that shares a place is brought to the one with more readings', () => {
  const line = lineOf(
    level(1, 1, 0, 1_000),
    level(2, 1, 1_000, 1_004),
    level(3, 1, 2_000, 1_006),
    level(4, 2, 2_000, 1_206),
    level(5, 2, 2_900, 1_209),
  );
  expect(line.drops.map(({ valueMm }) => valueMm)).toEqual([1_000, 1_004, 1_006, 1_006, 1_009]);
  expect(line.problems).toEqual([]);
  expect(line.drops[4]?.u ?? 0).toBeGreaterThan(line.drops[1]?.u ?? 0);
});

test('its rises move the other way, for clear heights stay', () => {
  const line = lineOf(
    level(1, 1, 0, 1_000),
    level(2, 1, 1_000, 1_000),
    level(3, 2, 1_000, 1_200),
    level(4, 2, 1_000, 1_240, 'ceiling'),
  );
  expect(line.rises[0]?.valueMm).toBe(1_440);
});

test('a line that shares no place is left out, and asked for', () => {
  const line = lineOf(level(1, 1, 0, 1_000), level(2, 1, 500, 1_000), level(3, 2, 2_500, 1_200));
  expect(line.drops).toHaveLength(2);
  expect(line.problems[0]).toMatchObject({ code: 'level-not-tied', about: [countedId(40_003)] });
});

test('nothing read is no line', () => {
  expect(lineOf()).toMatchObject({ setUpId: null, drops: [], rises: [], problems: [] });
});
