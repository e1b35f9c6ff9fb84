import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { adjustRoom } from '@/lib/measure/adjust-room';
import type { AdjustedRoom } from '@/lib/measure/adjusted-room';
import { findBlunder } from '@/lib/measure/find-blunder';
import type { RoomObservation, RoomShape } from '@/lib/measure/room-observations';
import { looseTape, readDiagonal, readLegs, readLength, type Tape } from './random-readings';
import {
  angleAt,
  CROOKED,
  drawnShape,
  lengthAt,
  randomPlan,
  type TruePlan,
  wallId,
} from './random-room';
import { seeded } from './seeded';

const exactTape: Tape = { read: (trueMm) => ({ valueMm: trueMm, uMm: 0.6, tool: null }) };
const quiet = { ...seeded(0), normal: () => 0 };
const heights = [100, 910, 1_450];

function readAll(plan: TruePlan, tape: Tape, random = quiet, zs = heights): RoomObservation[] {
  return plan.corners.flatMap((_, i) =>
    zs.flatMap((zMm) => [readLength(plan, tape, i, zMm), readLegs(plan, random, tape, i, zMm)]),
  );
}

function adjusted(room: RoomShape, observations: RoomObservation[], usualBowMm = 3): AdjustedRoom {
  const { value, problems } = adjustRoom(room, observations, { usualBowMm, zRefMm: 910 });
  if (!value) throw new Error(JSON.stringify(problems));
  return value;
}

const planOf = (seed: number, walls: number): TruePlan => ({
  ...randomPlan(seeded(seed), walls, { ...CROOKED, bowMm: 0, bowGrowthSd: 0, twistSd: 0 }),
  zRefMm: 910,
});

function square(lengths: number[]): { room: RoomShape; observations: RoomObservation[] } {
  const ids = ['a', 'b', 'c', 'd'];
  return {
    room: {
      chains: [
        {
          closed: true,
          walls: ids.map((id) => ({ id, nominalLengthMm: 2_500, leftCornerDeg: 90 })),
        },
      ],
    },
    observations: ids.flatMap((id, i): RoomObservation[] => [
      {
        kind: 'length',
        readingIds: [`length ${id}`],
        unit: 'mm',
        wallId: id,
        zMm: 910,
        yMm: 0,
        valueMm: lengths[i] ?? 0,
        uMm: 0.6,
      },
      {
        kind: 'corner',
        readingIds: [`corner ${id}`],
        unit: 'mm',
        cornerWallId: id,
        zMm: 910,
        angleDeg: 90,
        uDeg: 0.12,
        armLeftMm: 900,
        armRightMm: 900,
        proudLeft: { valueMm: 0, uMm: 0 },
        proudRight: { valueMm: 0, uMm: 0 },
        legs: null,
      },
    ]),
  };
}

describe('adjusting a room', () => {
  it('shares a misclosure between lengths and corners by their weights', () => {
    const { room, observations } = square([3_000, 2_000, 3_000, 2_003]);
    const result = adjusted(room, observations);
    expect(result.walls.map(({ lengthMm }) => Number(lengthMm.value.toFixed(2)))).toEqual([
      3000, 2000.03, 3000, 2002.97,
    ]);
    expect(result.angles.map(({ angleDeg }) => Number(angleDeg.value.toFixed(2)))).toEqual([
      89.97, 90.03, 90.03, 89.97,
    ]);
    expect(result.chiSquare.degreesOfFreedom).toBe(3);
    expect(result.walls[1]?.lengthMm.from).toEqual(['length b']);
  });

  it('finds lengths, angles and leans of a true room exactly', () => {
    for (let walls = 4; walls <= 10; walls++) {
      const plan = planOf(walls, walls);
      const result = adjusted(drawnShape(plan), [
        ...readAll(plan, exactTape),
        ...plan.leans.map(
          (lean, i): RoomObservation => ({
            kind: 'plumb',
            wallId: wallId(i),
            leanMmPerMm: lean,
            u: 1e-4,
            readingIds: [`plumb ${i}`],
            unit: 'mm',
          }),
        ),
      ]);
      expect(result.chiSquare.value).toBeLessThan(0.05);
      for (const i of plan.corners.keys()) {
        expect(result.walls[i]?.lengthMm.value).toBeCloseTo(lengthAt(plan, i, 910), 1);
        expect(result.angles[i]?.angleDeg.value).toBeCloseTo(angleAt(plan, i), 2);
        expect(result.walls[i]?.leanMmPerMm?.value).toBeCloseTo(plan.leans[i] ?? 0, 4);
      }
    }
  });

  it('checks lengths at three heights by one another, the middle one best', () => {
    const plan = planOf(12, 4);
    const { checks } = adjusted(
      drawnShape(plan),
      readAll(plan, exactTape, quiet, [100, 910, 1_720]),
    );
    const at = (zMm: number) =>
      checks.filter(({ observation: o }) => o.kind === 'length' && o.zMm === zMm);
    for (const { redundancy } of at(910)) {
      expect(redundancy).toBeGreaterThan(0.6);
      expect(redundancy).toBeLessThan(0.72);
    }
    for (const { redundancy, hardlyChecked } of [...at(100), ...at(1_720)]) {
      expect(redundancy).toBeGreaterThan(0.22);
      expect(hardlyChecked).toBe(false);
    }
  });

  it('states the u that its lengths show over many readings of one room', () => {
    const plan = planOf(7, 6);
    const random = seeded(11);
    const room = drawnShape(plan);
    let squares = 0;
    let count = 0;
    for (let trial = 0; trial < 60; trial++) {
      const tape = looseTape(random);
      const readings = readAll(plan, tape, random, [910]);
      const result = adjusted(room, [...readings, readDiagonal(plan, tape, 0, 2, 910)], 0);
      for (const [i, { lengthMm }] of result.walls.entries()) {
        squares += ((lengthMm.value - lengthAt(plan, i, 910)) / lengthMm.u) ** 2;
        count++;
      }
    }
    expect(Math.sqrt(squares / count)).toBeGreaterThan(0.88);
    expect(Math.sqrt(squares / count)).toBeLessThan(1.12);
  });

  it('accepts true rooms with bowed walls at the rate it promises', () => {
    let failed = 0;
    const trials = 150;
    for (let trial = 0; trial < trials; trial++) {
      const random = seeded(500 + trial);
      const plan = { ...randomPlan(random, 4 + (trial % 7), CROOKED), zRefMm: 910 };
      const tape = looseTape(random);
      const result = adjusted(drawnShape(plan), readAll(plan, tape, random));
      if (!result.chiSquare.passes) failed++;
    }
    expect(failed / trials).toBeLessThanOrEqual(0.03);
  });

  it('gives the same room wherever the walk begins', () => {
    const plan = planOf(3, 8);
    const observations = readAll(plan, looseTape(seeded(5)), seeded(6));
    const room = drawnShape(plan);
    const walls = room.chains[0]?.walls ?? [];
    const turned = {
      chains: [{ closed: true, walls: [...walls.slice(3), ...walls.slice(0, 3)] }],
    };
    const one = adjusted(room, observations);
    const other = adjusted(turned, observations);
    for (const { wallId: id, lengthMm } of one.walls) {
      const match = other.walls.find((wall) => wall.wallId === id);
      expect(match?.lengthMm.value).toBeCloseTo(lengthMm.value, 4);
      expect(match?.lengthMm.u).toBeCloseTo(lengthMm.u, 4);
    }
    expect(other.chiSquare.value).toBeCloseTo(one.chiSquare.value, 4);
  });

  it('gives a mirrored room as the mirror of the room', () => {
    const plan = planOf(4, 6);
    const random = seeded(8);
    const readings = readAll(plan, looseTape(random), random);
    const names = plan.corners.map((_, i) => wallId(i));
    const count = names.length;
    // Walked the other way round, wall i's right corner becomes its left.
    const rightCorner = (id: string) => wallId((names.indexOf(id) - 1 + count) % count);
    const mirrored = readings.map((o): RoomObservation => {
      if (o.kind !== 'corner') return o;
      const { armLeftMm, armRightMm } = o;
      return {
        ...o,
        cornerWallId: rightCorner(o.cornerWallId),
        armLeftMm: armRightMm,
        armRightMm: armLeftMm,
      };
    });
    const room = drawnShape(plan);
    const walls = room.chains[0]?.walls ?? [];
    const mirroredRoom = {
      chains: [
        {
          closed: true,
          walls: walls
            .map((wall, i) => ({
              ...wall,
              leftCornerDeg: walls[(i + 1) % count]?.leftCornerDeg ?? 90,
            }))
            .reverse(),
        },
      ],
    };
    const one = adjusted(room, readings);
    const other = adjusted(mirroredRoom, mirrored);
    expect(other.chiSquare.value).toBeCloseTo(one.chiSquare.value, 3);
    for (const { wallId: id, lengthMm } of one.walls) {
      const match = other.walls.find((wall) => wall.wallId === id);
      expect(match?.lengthMm.value).toBeCloseTo(lengthMm.value, 4);
    }
  });

  it('gives the same room, checks and suspects from whichever corner it is walked', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1_000 }), fc.nat(9), (seed, turn) => {
        const random = seeded(seed);
        const plan = { ...randomPlan(random, 4 + (seed % 7), CROOKED), zRefMm: 910 };
        const readings = readAll(plan, looseTape(random), random);
        const wrong = readings.map((o, i) =>
          i === seed % 7 && o.kind === 'length' ? { ...o, valueMm: o.valueMm + 25.4 } : o,
        );
        const room = drawnShape(plan);
        const walls = room.chains[0]?.walls ?? [];
        const by = turn % walls.length;
        const turned = {
          chains: [{ closed: true, walls: [...walls.slice(by), ...walls.slice(0, by)] }],
        };
        const [one, other] = [adjusted(room, wrong), adjusted(turned, wrong)];
        expect(other.chiSquare.value).toBeCloseTo(one.chiSquare.value, 3);
        for (const [i, { w, redundancy }] of one.checks.entries()) {
          expect(other.checks[i]?.w).toBeCloseTo(w, 3);
          expect(other.checks[i]?.redundancy).toBeCloseTo(redundancy, 5);
        }
        for (const { wallId: id, lengthMm } of one.walls) {
          const match = other.walls.find((wall) => wall.wallId === id)?.lengthMm;
          expect(match?.value).toBeCloseTo(lengthMm.value, 3);
          expect(match?.u).toBeCloseTo(lengthMm.u, 4);
        }
        const named = (adjustment: AdjustedRoom) =>
          findBlunder(adjustment)?.suspects.map(({ readingIds }) => readingIds);
        expect(named(other)).toEqual(named(one));
      }),
      { numRuns: 25, seed: 2 },
    );
  });

  it('never grows a U by one more reading that agrees', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1_000 }), (seed) => {
        const random = seeded(seed);
        const plan = { ...randomPlan(random, 4 + (seed % 5), CROOKED), zRefMm: 910 };
        const readings = readAll(plan, exactTape, quiet, [910]);
        const room = drawnShape(plan);
        const before = adjusted(room, readings);
        const further = [...readings, readLength(plan, exactTape, 0, 1_450)];
        const after = adjusted(room, further);
        for (const [i, { lengthMm }] of before.walls.entries()) {
          expect(after.walls[i]?.lengthMm.u).toBeLessThanOrEqual(lengthMm.u + 1e-6);
        }
      }),
      { numRuns: 25, seed: 1 },
    );
  });

  it('keeps a tool’s own error in U however often the tool is read', () => {
    const { room, observations } = square([3_000, 2_000, 3_000, 2_000]);
    const shared = observations.map(
      (o): RoomObservation =>
        o.kind === 'length' ? { ...o, tool: { toolId: 'tape', uCommon: 0.5 } } : o,
    );
    const repeats = [...shared, ...shared, ...shared, ...shared].filter((o) => o.kind === 'length');
    const many = adjusted(room, [...shared, ...repeats]);
    expect(many.walls[0]?.lengthMm.u).toBeGreaterThan(0.5);
    expect(many.walls[0]?.lengthMm.u).toBeLessThan(0.6);
  });

  it('needs no angle for a length read at the front depth', () => {
    const { room, observations } = square([3_000, 2_000, 3_000, 2_000]);
    const front = { zMm: 910, yMm: 600, readingIds: ['front'], unit: 'mm' as const };
    const lengths = observations.filter((o) => o.kind === 'length' && 'ad'.includes(o.wallId));
    const read: RoomObservation = {
      ...front,
      kind: 'length',
      wallId: 'a',
      // The corner is open by 1°: at 600 the wall before stands back by 600/tan 91°.
      valueMm: 3_000 - 600 / Math.tan((91 * Math.PI) / 180),
      uMm: 0.6,
    };
    const [a, , , d] = room.chains[0]?.walls ?? [];
    if (!a || !d) throw new Error('The square has four walls.');
    const open = { chains: [{ closed: false, walls: [{ ...d, leftCornerDeg: null }, a] }] };
    const result = adjusted(open, [...lengths, read]);
    expect(result.angles[0]?.angleDeg.value).toBeCloseTo(91, 6);
  });

  it('ties the two chains of a galley by the widths read between them', () => {
    const wall = (id: string) => ({ id, nominalLengthMm: 3_000, leftCornerDeg: null });
    const room: RoomShape = {
      chains: [
        { closed: false, walls: [wall('north')] },
        { closed: false, walls: [wall('south')] },
      ],
    };
    const common = { unit: 'mm' as const, zMm: 910 };
    const length = (id: string, valueMm: number): RoomObservation => ({
      ...common,
      kind: 'length',
      readingIds: [id],
      wallId: id,
      yMm: 0,
      valueMm,
      uMm: 0.6,
    });
    const width = (xMm: number, valueMm: number): RoomObservation => ({
      ...common,
      kind: 'width',
      readingIds: [`width ${xMm}`],
      wallId: 'north',
      xMm,
      toWallId: 'south',
      valueMm,
      uMm: 0.6,
    });
    const result = adjusted(room, [
      length('north', 3_000),
      length('south', 3_010),
      width(100, 2_400),
      width(2_900, 2_428),
    ]);
    const south = result.corners.filter(({ chain }) => chain === 1);
    const slope =
      ((south[0]?.yMm ?? 0) - (south[1]?.yMm ?? 0)) / ((south[0]?.xMm ?? 0) - (south[1]?.xMm ?? 0));
    expect(slope).toBeCloseTo(28 / 2_800, 4);
    expect(Math.min(...south.map(({ ellipse }) => ellipse.aMm))).toBeGreaterThan(500);
    expect(Math.max(...south.map(({ ellipse }) => ellipse.bMm))).toBeLessThan(15);
    expect(result.walls[1]?.lengthMm.value).toBeCloseTo(3_010, 3);
  });

  it('names what is still to be read when the room cannot be laid out', () => {
    const { room, observations } = square([3_000, 2_000, 3_000, 2_000]);
    const few = observations.filter((o) => o.kind === 'length' && o.wallId !== 'b');
    const { value, problems } = adjustRoom(room, few, { usualBowMm: 3 });
    expect(value).toBeNull();
    expect(problems[0]?.code).toBe('room-not-determined');
    expect(problems[0]?.about).toContain('b');
  });

  it.each([
    ['not a number', Number.NaN],
    ['below nothing', -3_000],
    ['endless', Number.POSITIVE_INFINITY],
  ])('refuses a length that is %s and names the reading', (_, valueMm) => {
    const { room, observations } = square([valueMm, 2_000, 3_000, 2_000]);
    const { value, problems } = adjustRoom(room, observations, { usualBowMm: 3 });
    expect(value).toBeNull();
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatchObject({ code: 'reading-impossible', about: ['length a'] });
  });

  it('leaves what it was given as it was', () => {
    const { room, observations } = square([3_000, 2_000, 3_000, 2_003]);
    const before = structuredClone({ room, observations });
    adjusted(room, observations);
    expect({ room, observations }).toEqual(before);
  });
});
