import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chordAngle } from '@/lib/measure/chord-angle';
import { cornerOffset } from '@/lib/measure/corner';
import { figure } from '@/lib/measure/figure';
import { kickHeights } from '@/lib/measure/heights';
import type { KickRun } from '@/lib/measure/kick-run';
import { meanOf } from '@/lib/measure/mean-of';
import { planeOf } from '@/lib/measure/minimum-zone-plane';
import { plumbOf } from '@/lib/measure/plumb';
import { scribeAllowance } from '@/lib/measure/scribe';
import { setLine } from '@/lib/measure/set-line';
import { straightedgeGap } from '@/lib/measure/straightedge-gap';
import { straightness } from '@/lib/measure/straightness';
import { topGap } from '@/lib/measure/top-gap';
import { underCounterHeight } from '@/lib/measure/under-counter';
import type { Outcome } from '@/lib/problem';

/** Mostly readings as they are, now and then one that cannot be. */
const wild = fc.oneof(
  { weight: 30, arbitrary: fc.integer({ min: -3000, max: 3000 }) },
  { weight: 6, arbitrary: fc.double({ min: -10, max: 10, noNaN: true }) },
  { weight: 1, arbitrary: fc.double() },
  { weight: 1, arbitrary: fc.constantFrom(0, -0, Number.NaN, Infinity, -Infinity, 1e308, 5e-324) },
);
const u = fc.oneof(
  { weight: 20, arbitrary: fc.constantFrom(0, 0.3, 1) },
  { weight: 1, arbitrary: wild },
);
const id = fc.constantFrom('a', 'b', 'c', 'd');
const setUpId = fc.oneof(
  { weight: 20, arbitrary: fc.constant('one') },
  { weight: 1, arbitrary: fc.constant('other') },
);
const some = <T>(of: fc.Arbitrary<T>) => fc.array(of, { maxLength: 9 });
const profile = some(fc.record({ id, atMm: wild, sMm: wild, u }));
const surface = some(fc.record({ id, xMm: wild, yMm: wild, sMm: wild, u }));
const face = some(fc.record({ id, xMm: wild, zMm: wild, sMm: wild, u, setUpId }));
const level = some(fc.record({ id, xMm: wild, yMm: wild, valueMm: wild, u, setUpId }));
const known = fc.tuple(wild, u).map(([value, sure]) => figure(value, sure, ['k']));
const rectangle = fc.record({ x0Mm: wild, x1Mm: wild, y0Mm: wild, y1Mm: wild });
const rules = fc.record({
  marginMm: u,
  leastMm: u,
  stepMm: fc.constantFrom(1, 0.5, 0, Number.NaN),
});
const toCome = fc.record({ valueMm: wild, u });

function sound(outcome: Outcome<unknown>): boolean {
  if (outcome.value === null) return outcome.problems.some(({ severity }) => severity === 'error');
  return everyNumber(outcome.value);
}

function everyNumber(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (value === null || typeof value !== 'object') return true;
  return Object.values(value).every(everyNumber);
}

function holds<T extends unknown[]>(
  of: (...args: T) => Outcome<unknown>,
  ...arbitraries: { [K in keyof T]: fc.Arbitrary<T[K]> }
) {
  let given = 0;
  const property = fc.property(fc.tuple(...arbitraries), (args) => {
    const outcome = of(...(args as T));
    if (outcome.value !== null) given += 1;
    return sound(outcome);
  });
  fc.assert(property, { numRuns: 600 });
  expect(given).toBeGreaterThan(10);
}

describe('readings that cannot be true', () => {
  it('never throw and never give NaN, along a wall', () => {
    holds(straightness, profile);
    holds(straightedgeGap, profile, wild);
    holds(
      (points, uReference, overMm) => plumbOf({ points, uReference, overMm }),
      profile,
      u,
      wild,
    );
  }, 30_000);

  it('never throw and never give NaN over a face, along an edge, and together', () => {
    holds(planeOf, surface);
    holds(
      (places, uShared, of) => scribeAllowance({ places, uShared, held: 'by-size', rules: of }),
      some(fc.record({ id, atMm: wild, gapMm: wild, u })),
      u,
      rules,
    );
    holds(meanOf, some(fc.record({ id, value: wild, uOwn: u, uCommon: u, toolId: id })), wild);
  }, 30_000);

  it('never throw and never give NaN behind cabinets', () => {
    const plane = fc.record({
      id,
      points: face,
      bands: fc.array(fc.record({ x0Mm: wild, x1Mm: wild, z0Mm: wild, z1Mm: wild }), {
        minLength: 1,
        maxLength: 2,
      }),
      edgesMm: some(wild),
      finishedEndMm: fc.option(wild),
      fixed: fc.option(fc.record({ atMm: wild, s: known }), { freq: 8 }),
    });
    const planes = fc.array(plane, { minLength: 1, maxLength: 2 });
    holds(
      (all, turn, uReference) => setLine({ planes: all, turn, uReference }),
      planes,
      fc.option(known, { freq: 3 }),
      u,
    );
  }, 30_000);

  it('never throw and never give NaN between floor and ceiling', () => {
    const run = fc.record({
      runId: id,
      drops: level,
      footprint: rectangle,
      faces: fc.constantFrom<KickRun['faces']>([{ side: 'front', atMm: 500 }], []),
      units: fc.array(fc.record({ unitId: id, footprint: rectangle }), { maxLength: 2 }),
    });
    const kicks = fc.record({
      runs: fc.array(run, { minLength: 1, maxLength: 2 }),
      nominalKickMm: wild,
      fixedDatumDrop: fc.option(known, { freq: 3 }),
      floorToCome: toCome,
      standsOn: fc.constantFrom('finished-floor' as const, 'rough-floor' as const),
      legs: fc.constant({ minMm: 95, maxMm: 115 }),
      uLevel: u,
      scribe: rules,
    });
    holds(kickHeights, kicks);
    const common = { datumDrop: known, datumSetUpId: fc.constant('one'), uLevel: u };
    holds(
      underCounterHeight,
      fc.record({
        unitId: id,
        drops: level,
        footprint: rectangle,
        undersideMm: wild,
        floorToCome: toCome,
        needMm: wild,
        ...common,
      }),
    );
    holds(
      topGap,
      fc.record({
        runId: id,
        rises: level,
        x0Mm: wild,
        x1Mm: wild,
        yMm: wild,
        topMm: wild,
        scribe: rules,
        ...common,
      }),
    );
  }, 30_000);

  it('never give NaN where the left arm stands', () => {
    holds(cornerOffset, known, wild);
  }, 30_000);

  it('carry a corner to its chord without NaN', () => {
    const arm = fc.record({
      armMm: fc.nat(3000),
      proud: fc.option(fc.record({ id, value: fc.integer(), u: fc.constant(0.3) })),
      wallLengthMm: fc.nat(5000),
      usualBowMm: fc.nat(10),
    });
    fc.assert(
      fc.property(arm, arm, (left, right) =>
        everyNumber(chordAngle(figure(90, 0.1, []), { left, right })),
      ),
    );
  }, 30_000);
});
