import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { adjustRoom } from '@/lib/measure/adjust-room';
import { closeTraverse } from '@/lib/measure/close-traverse';
import { findBlunder } from '@/lib/measure/find-blunder';
import type { RoomObservation, RoomShape } from '@/lib/measure/room-observations';
import { settle } from '@/lib/measure/settle';
import { studCatch } from '@/lib/measure/studs';

/** Numbers a phone may send: sane, absurd, and none at all. */
const number = fc.oneof(
  { weight: 6, arbitrary: fc.double({ min: 1, max: 6_000, noNaN: true }) },
  fc.constantFrom(0, -1, 1e-9, 1e12, Number.NaN, Number.POSITIVE_INFINITY, Number.MIN_VALUE),
);
const wallId = fc.constantFrom('a', 'b', 'c', 'd', 'e', 'not here');
const common = {
  readingIds: fc.constant<string[]>(['r']),
  unit: fc.constantFrom<('in' | 'mm')[]>('in', 'mm'),
};
const proud = fc.option(fc.record({ valueMm: number, uMm: number }));
const cornerEnd = fc.record({
  wallId,
  end: fc.constantFrom<('left' | 'right')[]>('left', 'right'),
});

const observation: fc.Arbitrary<RoomObservation> = fc.oneof(
  fc.record({
    ...common,
    kind: fc.constant<'length'>('length'),
    wallId,
    zMm: number,
    yMm: number,
    valueMm: number,
    uMm: number,
  }),
  fc.record({
    ...common,
    kind: fc.constant<'corner'>('corner'),
    cornerWallId: wallId,
    zMm: number,
    angleDeg: fc.oneof(fc.double({ min: 1, max: 359, noNaN: true }), number),
    uDeg: number,
    armLeftMm: number,
    armRightMm: number,
    proudLeft: proud,
    proudRight: proud,
    legs: fc.option(
      fc.record({ leftMm: number, rightMm: number, diagonalMm: number, carriedPast: fc.boolean() }),
    ),
  }),
  fc.record({
    ...common,
    kind: fc.constant<'diagonal'>('diagonal'),
    from: cornerEnd,
    to: cornerEnd,
    zMm: number,
    valueMm: number,
    uMm: number,
  }),
  fc.record({
    ...common,
    kind: fc.constant<'width'>('width'),
    wallId,
    xMm: number,
    toWallId: wallId,
    zMm: number,
    valueMm: number,
    uMm: number,
  }),
  fc.record({
    ...common,
    kind: fc.constant<'plumb'>('plumb'),
    wallId,
    leanMmPerMm: fc.oneof(fc.double({ min: -0.02, max: 0.02, noNaN: true }), number),
    u: number,
  }),
);

const room: fc.Arbitrary<RoomShape> = fc
  .tuple(fc.boolean(), fc.integer({ min: 1, max: 5 }), fc.integer({ min: 0, max: 2 }))
  .map(([closed, one, other]) => {
    const walls = ['a', 'b', 'c', 'd', 'e'].map((id, i) => ({
      id,
      nominalLengthMm: 1_000 * i,
      leftCornerDeg: i === 0 ? null : 90,
    }));
    const chains = [{ closed, walls: walls.slice(0, one) }];
    if (other > 0 && one + other <= 5) {
      chains.push({ closed: false, walls: walls.slice(one, one + other) });
    }
    return { chains };
  });

function allNumbers(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (value instanceof Float64Array) return Array.from(value);
  if (value === null || typeof value !== 'object') return [];
  return Object.values(value).flatMap(allNumbers);
}

describe('a room read badly', () => {
  it('gives a value without NaN, or a problem, and never throws', () => {
    fc.assert(
      fc.property(room, fc.array(observation, { maxLength: 14 }), (shape, observations) => {
        const { value, problems } = adjustRoom(shape, observations, { usualBowMm: 3 });
        if (!value) {
          expect(problems.length).toBeGreaterThan(0);
          return;
        }
        const { system: _system, checks, ...shown } = value;
        const figures = checks.map(({ observation: _observation, ...check }) => check);
        expect([shown, figures].flatMap(allNumbers).every(Number.isFinite)).toBe(true);
        const blunder = findBlunder(value);
        expect(allNumbers(blunder).every(Number.isFinite)).toBe(true);
        const suspects = blunder?.suspects.map((suspect) => suspect.observation);
        expect(allNumbers(settle(value, suspects ? { suspects } : {})).every(Number.isFinite)).toBe(
          true,
        );
      }),
      { numRuns: 3_000, seed: 7 },
    );
  });

  it('lays out rooms of sane readings that contradict each other', { timeout: 20_000 }, () => {
    const sane = fc.double({ min: 300, max: 5_000, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(sane, { minLength: 4, maxLength: 4 }),
        fc.array(fc.double({ min: 60, max: 120, noNaN: true }), { minLength: 4, maxLength: 4 }),
        (lengths, angles) => {
          const ids = ['a', 'b', 'c', 'd'];
          const shape = {
            chains: [
              {
                closed: true,
                walls: ids.map((id) => ({ id, nominalLengthMm: 2_000, leftCornerDeg: 90 })),
              },
            ],
          };
          const base = { zMm: 900, unit: 'mm' as const };
          const observations = ids.flatMap((id, i): RoomObservation[] => [
            {
              ...base,
              kind: 'length',
              readingIds: [`l${id}`],
              wallId: id,
              yMm: 0,
              valueMm: lengths[i] ?? 0,
              uMm: 0.6,
            },
            {
              ...base,
              kind: 'corner',
              readingIds: [`c${id}`],
              cornerWallId: id,
              angleDeg: angles[i] ?? 0,
              uDeg: 0.1,
              armLeftMm: 300,
              armRightMm: 300,
              proudLeft: null,
              proudRight: null,
              legs: null,
            },
          ]);
          const { value, problems } = adjustRoom(shape, observations, { usualBowMm: 3 });
          if (!value) expect(problems[0]?.code).toBe('room-not-determined');
          else expect(findBlunder(value)?.suspects.length ?? 1).toBeGreaterThan(0);
        },
      ),
      { numRuns: 300, seed: 8 },
    );
  });

  it('keeps the walk and the studs free of NaN', () => {
    const measured = fc.record({ value: number, u: number, from: fc.constant<string[]>(['r']) });
    const leg = fc.record({ length: measured, leftAngle: fc.option(measured) });
    fc.assert(
      fc.property(fc.boolean(), fc.array(leg, { maxLength: 8 }), (closed, legs) => {
        const { value, problems } = closeTraverse({ closed, legs });
        if (!value) expect(problems.length).toBeGreaterThan(0);
        else expect(allNumbers(value).some(Number.isNaN)).toBe(false);
      }),
      { numRuns: 2_000, seed: 9 },
    );
    const stud = fc.record({
      id: fc.constant('s'),
      xMm: number,
      u: number,
      at: fc.constantFrom('centre', 'left-edge', 'right-edge'),
    });
    fc.assert(
      fc.property(fc.array(stud, { maxLength: 8 }), number, (studs, wallLengthMm) => {
        const { value } = studCatch({
          studs: studs as Parameters<typeof studCatch>[0]['studs'],
          units: [{ unitId: 'u', leftMm: 0, rightMm: 600 }],
          openings: [],
          wallLengthMm: Math.min(wallLengthMm, 1e6),
          spacingsMm: [400, 600],
          studWidthMm: 38,
          screwEdgeMm: 19,
          studsNeeded: [{ toWidthMm: 900, studs: 2 }],
        });
        expect(allNumbers(value).some(Number.isNaN)).toBe(false);
      }),
      { numRuns: 1_000, seed: 10 },
    );
  });
});
