import { describe, expect, it } from 'vitest';
import { closeTraverse, type TraverseLeg } from '@/lib/measure/close-traverse';
import type { Measured } from '@/lib/measure/measured';
import { monteCarlo, seeded } from './seeded';

const read = (value: number, u: number, id: string): Measured => ({ value, u, from: [id] });

function room(lengths: number[], angles: (number | null)[], uMm = 0, uDeg = 0): TraverseLeg[] {
  return lengths.map((length, i) => {
    const angle = angles[i];
    return {
      length: read(length, uMm, `length ${i}`),
      leftAngle: angle === null || angle === undefined ? null : read(angle, uDeg, `angle ${i}`),
    };
  });
}

describe('walking a room round', () => {
  it('says by how much four walls miss, and shares it', () => {
    const legs = room([3_000, 2_000, 3_000, 2_003], [90, 90, 90, 90]);
    const { value } = closeTraverse({ closed: true, legs });
    expect(value?.angleMisclosure?.value).toBe(0);
    expect(value?.linearMisclosure?.value).toBeCloseTo(3, 9);
    expect(value?.relativePrecision).toBeCloseTo(10_003 / 3, 6);
    expect(value?.areaMm2).toBeCloseTo(6_004_500, -2);
    expect(value?.walk.at(-1)?.yMm).toBeCloseTo(-3, 9);
    expect(value?.points).toHaveLength(4);
  });

  it('keeps a re-entrant corner in the sum of the angles', () => {
    const legs = room([4_000, 1_500, 2_000, 1_500, 2_000, 3_000], [90, 90, 90, 270, 90, 90.3]);
    const { value } = closeTraverse({ closed: true, legs });
    expect(value?.angleMisclosure?.value).toBeCloseTo(0.3, 9);
    expect(value?.balancedAnglesDeg[3]).toBeCloseTo(269.95, 9);
  });

  it('lays an open chain out as it was read', () => {
    const legs = room([3_000, 2_000], [null, 91]);
    const { value } = closeTraverse({ closed: false, legs });
    expect(value?.linearMisclosure).toBeNull();
    expect(value?.angleMisclosure).toBeNull();
    expect(value?.areaMm2).toBeNull();
    expect(value?.headingsDeg).toEqual([0, 89]);
    expect(value?.points).toEqual(value?.walk);
  });

  it('states the u that the misclosure shows', () => {
    const random = seeded(4);
    const lengths = [3_000, 1_800, 1_200, 700, 1_800, 2_500];
    const angles = [90, 90, 90, 270, 90, 90];
    const start = closeTraverse({ closed: true, legs: room(lengths, angles, 0.6, 0.12) }).value;
    const slipped = closeTraverse({
      closed: true,
      legs: room([3_040, ...lengths.slice(1)], angles, 0.6, 0.12),
    }).value;
    // Along the gap, and where the walk closes along its widest direction.
    const along = monteCarlo(4_000, () => {
      const legs = room(
        lengths.map((length, i) => length + (i === 0 ? 40 : 0) + 0.6 * random.normal()),
        angles.map((angle) => angle + 0.12 * random.normal()),
      );
      return closeTraverse({ closed: true, legs }).value?.gap.dxMm ?? Number.NaN;
    });
    expect(slipped?.linearMisclosure?.u).toBeDefined();
    expect(Math.abs((slipped?.linearMisclosure?.u ?? 0) / along.sd - 1)).toBeLessThan(0.05);
    expect(start?.linearMisclosure?.u).toBeGreaterThanOrEqual(along.sd * 0.95);
    expect(start?.angleMisclosure?.u).toBeCloseTo(0.12 * Math.sqrt(6), 9);
  });

  it('adds one angle finder’s own error n-fold to the sum, and takes it out by balancing', () => {
    const tool = { toolId: 'finder', uCommon: 0.1 };
    const shared = (uOwn: number) =>
      room([3_000, 2_000, 3_010, 2_000], [90, 90, 90, 90]).map((leg) => ({
        ...leg,
        leftAngle: leg.leftAngle && { ...leg.leftAngle, u: Math.hypot(uOwn, 0.1), tool },
      }));
    const only = closeTraverse({ closed: true, legs: shared(0) }).value;
    expect(only?.angleMisclosure?.u).toBeCloseTo(0.4, 9);
    expect(only?.linearMisclosure?.u).toBeCloseTo(0, 6);
    const both = closeTraverse({ closed: true, legs: shared(0.05) }).value;
    expect(both?.angleMisclosure?.u).toBeCloseTo(Math.hypot(0.4, 0.1), 9);
    expect(both?.linearMisclosure?.u).toBeGreaterThan(1);
  });

  it('gives the same misclosure and area wherever the walk begins', () => {
    const lengths = [3_000, 2_000, 3_010, 2_003];
    const angles = [90.2, 89.9, 90, 89.8];
    const turned = (list: number[]) => [...list.slice(2), ...list.slice(0, 2)];
    const one = closeTraverse({ closed: true, legs: room(lengths, angles) }).value;
    const other = closeTraverse({
      closed: true,
      legs: room(turned(lengths), turned(angles)),
    }).value;
    expect(other?.linearMisclosure?.value).toBeCloseTo(one?.linearMisclosure?.value ?? 0, 9);
    expect(other?.areaMm2).toBeCloseTo(one?.areaMm2 ?? 0, 4);
  });

  it.each([
    ['two walls', room([1, 2], [90, 90]), 'chain-too-short'],
    ['a corner not read', room([1, 2, 3], [90, null, 90]), 'angle-missing'],
    ['a length of nothing', room([1, 0, 3], [60, 60, 60]), 'reading-impossible'],
    ['a length that is no number', room([1, Number.NaN, 3], [60, 60, 60]), 'reading-impossible'],
    ['a whole turn', room([1, 2, 3], [360, 60, 60]), 'reading-impossible'],
  ])('refuses %s', (_, legs, code) => {
    const { value, problems } = closeTraverse({ closed: true, legs });
    expect(value).toBeNull();
    expect(problems[0]?.code).toBe(code);
  });
});
