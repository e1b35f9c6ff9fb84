import { describe, expect, it } from 'vitest';
import { adjustRoom } from '@/lib/measure/adjust-room';
import { findBlunder } from '@/lib/measure/find-blunder';
import { knownSlips, swappedDigits } from '@/lib/measure/known-slips';
import type { RoomObservation } from '@/lib/measure/room-observations';
import { settle } from '@/lib/measure/settle';
import { studyCondition } from '../../bench/blunder-trials';
import { oneTape, readDiagonal, readLegs, readLength } from './random-readings';
import { CROOKED, drawnShape, randomPlan, type TruePlan } from './random-room';
import { seeded } from './seeded';

function readRoom(seed: number, walls: number, heights: number[]) {
  const random = seeded(seed);
  const plan: TruePlan = { ...randomPlan(random, walls, CROOKED), zRefMm: 910 };
  const tape = oneTape(random);
  const observations = plan.corners.flatMap((_, i) =>
    heights.flatMap((zMm) => [
      readLength(plan, tape, i, zMm),
      readLegs(plan, random, tape, i, zMm),
    ]),
  );
  const adjust = (read: RoomObservation[]) => {
    const { value } = adjustRoom(drawnShape(plan), read, { usualBowMm: 3, zRefMm: 910 });
    if (!value) throw new Error('The room was not adjusted.');
    return value;
  };
  return { plan, tape, observations, adjust };
}

const longer = (o: RoomObservation, byMm: number): RoomObservation =>
  o.kind === 'length' || o.kind === 'diagonal' ? { ...o, valueMm: o.valueMm + byMm } : o;

describe('the search for a wrong reading', () => {
  it('says nothing of a room that holds together', () => {
    const { observations, adjust } = readRoom(1, 4, [100, 910, 1_450]);
    expect(findBlunder(adjust(observations))).toBeNull();
  });

  it.each([
    [100, '100 mm'],
    [-100, '100 mm'],
    [25.4, '1 in'],
    [-12.7, '1/2 in'],
    [304.8, '1 ft'],
  ])('names the wall read %d mm wrong at one of three heights, and the slip', (byMm, known) => {
    const { observations, adjust } = readRoom(2, 6, [100, 910, 1_450]);
    const at = observations.findIndex((o) => o.readingIds[0] === 'length-3-910');
    const blunder = findBlunder(
      adjust(observations.map((o, i) => (i === at ? longer(o, byMm) : o))),
    );
    expect(blunder?.suspects[0]?.readingIds).toEqual(['length-3-910']);
    expect(blunder?.suspects[0]?.known).toBe(known);
    expect(blunder?.suspects[0]?.slip).toBeCloseTo(byMm, -1);
    expect(blunder?.alarm).toBe('both');
  });

  it('names the walls together that one height alone cannot tell apart', () => {
    const { observations, adjust } = readRoom(3, 4, [910]);
    const at = observations.findIndex((o) => o.readingIds[0] === 'length-0-910');
    const blunder = findBlunder(
      adjust(observations.map((o, i) => (i === at ? longer(o, 100) : o))),
    );
    const named = blunder?.suspects.flatMap(({ readingIds }) => readingIds) ?? [];
    expect(named).toEqual(expect.arrayContaining(['length-0-910', 'length-2-910']));
    expect(named).not.toContain('length-1-910');
  });

  it('puts first the reading that swapped digits explain', () => {
    const { observations, adjust } = readRoom(4, 4, [910]);
    const at = observations.findIndex((o) => o.readingIds[0] === 'length-0-910');
    const read = observations[at];
    if (read?.kind !== 'length') throw new Error('No length was read.');
    const [swap] = swappedDigits(read.valueMm, 'mm').filter(({ size }) => Math.abs(size) >= 90);
    if (!swap) throw new Error('No digits to swap.');
    const wrong = longer(read, -swap.size);
    const blunder = findBlunder(adjust(observations.map((o, i) => (i === at ? wrong : o))));
    expect(blunder?.suspects[0]?.readingIds).toEqual(['length-0-910']);
    expect(blunder?.suspects[0]?.known).toBe('digits swapped');
  });

  it('names a diagonal that was read wrong', () => {
    const { plan, tape, observations, adjust } = readRoom(5, 4, [910]);
    const diagonals = [readDiagonal(plan, tape, 0, 2, 910), readDiagonal(plan, tape, 1, 3, 910)];
    const wrong = diagonals.map((o, i) => (i === 0 ? longer(o, 100) : o));
    const blunder = findBlunder(adjust([...observations, ...wrong]));
    expect(blunder?.suspects[0]?.readingIds).toEqual(['diagonal-0-2']);
  });

  it('raises no more than two false alarms in a hundred true rooms, crooked as they are', () => {
    let alarms = 0;
    for (let seed = 0; seed < 100; seed++) {
      const { observations, adjust } = readRoom(9_000 + seed, 4 + (seed % 7), [100, 910, 1_450]);
      if (findBlunder(adjust(observations))) alarms++;
    }
    expect(alarms).toBeLessThanOrEqual(2);
  });

  it('reaches the promised shares on a small sample of rooms', { timeout: 20_000 }, () => {
    const rows = studyCondition(
      {
        name: 'sample',
        title: '',
        out: CROOKED,
        heightsMm: [100, 910, 1_450],
        corners: 'legs',
        usualBowMm: 3,
        slipIn: ['length', 'diagonal'],
      },
      { rooms: 21, seed: 3, mostDiagonals: 1 },
    );
    const share = (slips: string[], count: 'first' | 'alarmed') => {
      const chosen = rows.filter(({ slip }) => slips.includes(slip));
      const trials = chosen.reduce((sum, row) => sum + row.trials, 0);
      return chosen.reduce((sum, row) => sum + row[count], 0) / trials;
    };
    expect(share(['1 in', '100 mm', '1 ft'], 'first')).toBeGreaterThanOrEqual(0.97);
    expect(share(['1/2 in'], 'first')).toBeGreaterThanOrEqual(0.9);
  });
});

describe('known slips', () => {
  it('lists every whole amount both ways and every swap of neighbours', () => {
    const read: RoomObservation = {
      kind: 'length',
      readingIds: ['a'],
      unit: 'mm',
      wallId: 'a',
      zMm: 0,
      yMm: 0,
      valueMm: 876,
      uMm: 1,
    };
    const slips = knownSlips(read);
    expect(slips.filter(({ name }) => name === '100 mm').map(({ size }) => size)).toEqual([
      100, -100,
    ]);
    expect(slips.filter(({ name }) => name === 'digits swapped').map(({ size }) => size)).toEqual([
      876 - 786,
      876 - 867,
    ]);
  });

  it('swaps the digits of whole inches in an inch shop', () => {
    const [swap] = swappedDigits(95.0625 * 25.4, 'in');
    expect(swap?.size).toBeCloseTo((95 - 59) * 25.4, 9);
    expect(swappedDigits(33 * 25.4, 'in')).toEqual([]);
  });

  it('carries a slip in a corner’s diagonal to degrees', () => {
    const read: RoomObservation = {
      kind: 'corner',
      readingIds: ['c'],
      unit: 'mm',
      cornerWallId: 'a',
      zMm: 0,
      angleDeg: 90,
      uDeg: 0.1,
      armLeftMm: 900,
      armRightMm: 1_200,
      proudLeft: null,
      proudRight: null,
      legs: { leftMm: 900, rightMm: 1_200, diagonalMm: 1_500, carriedPast: false },
    };
    const inches = knownSlips(read).filter(({ name }) => name === '1 in');
    // 25.4 · 1500/(900 · 1200) rad is 2.02°.
    expect(inches.some(({ size }) => Math.abs(size - 2.02) < 0.05)).toBe(true);
  });
});

describe('what would settle it', () => {
  it('asks for a diagonal first where no wall is checked', () => {
    const { observations, adjust } = readRoom(6, 4, [910]);
    const [step] = settle(adjust(observations));
    expect(step?.reading.kind).toBe('diagonal');
    expect(step?.leastRedundancyAfter).toBeGreaterThan(step?.leastRedundancy ?? 1);
  });

  it('promises the redundancy that the reading then gives', () => {
    const { plan, tape, observations, adjust } = readRoom(7, 5, [910]);
    const uOfLengthMm = () => Math.hypot(0.5, 1 / Math.sqrt(12));
    for (const { reading, leastRedundancyAfter } of settle(adjust(observations), { uOfLengthMm })) {
      if (reading.kind !== 'diagonal') continue;
      const [i, j] = [reading.from, reading.to].map(({ wallId }) => Number(wallId.split('-')[1]));
      const { tool: _tool, ...further } = readDiagonal(plan, tape, i ?? 0, j ?? 0, 910);
      const after = adjust([...observations, further]);
      const least = Math.min(
        ...after.checks.slice(0, observations.length).map(({ redundancy }) => redundancy),
      );
      expect(least).toBeCloseTo(leastRedundancyAfter, 3);
    }
  });

  it('asks for one of two suspects again, the cheapest way to tell them apart', () => {
    const { observations, adjust } = readRoom(3, 4, [910]);
    const at = observations.findIndex((o) => o.readingIds[0] === 'length-0-910');
    const room = adjust(observations.map((o, i) => (i === at ? longer(o, 100) : o)));
    const suspects = findBlunder(room)?.suspects.map(({ observation }) => observation) ?? [];
    expect(suspects.length).toBeGreaterThan(1);
    const [step] = settle(room, { suspects });
    expect(step?.reading.kind).toBe('again');
    expect(step?.reading.kind === 'again' && suspects.includes(step.reading.observation)).toBe(
      true,
    );
  });

  it('offers no diagonal that a wall stands in the way of', () => {
    for (let seed = 0; seed < 12; seed++) {
      const { plan, observations, adjust } = readRoom(seed, 8, [910]);
      for (const { reading } of settle(adjust(observations), { kinds: ['diagonal'], most: 99 })) {
        if (reading.kind !== 'diagonal') throw new Error('Only diagonals were asked for.');
        const [i, j] = [reading.from, reading.to].map(({ wallId }) => Number(wallId.split('-')[1]));
        expect(runsInside(plan, i ?? 0, j ?? 0)).toBe(true);
      }
    }
  });
});

/** The slow way: a hundred places along the line, each inside the room by winding. */
function runsInside(plan: TruePlan, i: number, j: number): boolean {
  const [from, to] = [plan.corners[i], plan.corners[j]];
  if (!from || !to) return false;
  return Array.from({ length: 99 }, (_, k) => (k + 1) / 100).every((share) => {
    const x = from.x + (to.x - from.x) * share;
    const y = from.y + (to.y - from.y) * share;
    const turns = plan.corners.reduce((sum, corner, n) => {
      const next = plan.corners[(n + 1) % plan.corners.length] ?? corner;
      const turn = Math.atan2(next.y - y, next.x - x) - Math.atan2(corner.y - y, corner.x - x);
      return sum + turn - 2 * Math.PI * Math.round(turn / (2 * Math.PI));
    }, 0);
    return Math.abs(turns) > 1;
  });
}
