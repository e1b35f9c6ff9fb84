import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { DayCrew, DayStop } from '@/lib/schedule/routes/day-stops';
import { planDay } from '@/lib/schedule/routes/plan-day';
import { planDays } from '@/lib/schedule/routes/plan-days';
import { checkedDriving, solomonDay, solomonOptimum } from '../../help/solomon';

describe('a day of several crews', () => {
  const day = solomonDay('RC101', 25);

  test('is the same plan for the same seed, and another search for another', () => {
    const once = planDays({ ...day, seed: 7, iterations: 300 });
    expect(planDays({ ...day, seed: 7, iterations: 300 })).toEqual(once);
    expect(planDays({ ...day, seed: 8, iterations: 5 })).not.toEqual(
      planDays({ ...day, seed: 7, iterations: 5 }),
    );
  });

  test.each(['C103', 'R102', 'R109', 'RC106'])(
    'comes within half a percent of the published optimum of %s with 25 customers',
    (name) => {
      const published = solomonDay(name, 25);
      const { value } = planDays({ ...published, seed: 1, iterations: 4_000 });
      const driven = checkedDriving(published, value?.routes ?? []);
      expect(driven).toBeCloseTo(value?.driveMinutes ?? 0, 6);
      const optimum = solomonOptimum(name, 25);
      expect(driven).toBeGreaterThanOrEqual(optimum - 1e-6);
      expect(driven / optimum).toBeLessThan(1.005);
    },
  );

  test('keeps every promise of a hundred customers after a short search', () => {
    const published = solomonDay('R105', 100);
    const { value } = planDays({ ...published, seed: 1, iterations: 200 });
    expect(() => checkedDriving(published, value?.routes ?? [])).not.toThrow();
  });

  test('is never worse than the plan as it is', () => {
    const good = planDays({ ...day, seed: 1, iterations: 2_000 }).value;
    const now = good?.routes.map(({ stops }) => stops.map(({ id }) => id)) ?? [];
    const again = planDays({ ...day, now, seed: 3, iterations: 20 }).value;
    expect(again?.driveMinutes).toBeLessThanOrEqual((good?.driveMinutes ?? 0) + 1e-9);
  });

  test('names the stops that fit into no day', () => {
    const late = day.stops.map((stop, index) => (index === 3 ? { ...stop, latest: -1 } : stop));
    const { value, problems } = planDays({ ...day, stops: late, seed: 1, iterations: 50 });
    expect(value?.unplaced).toEqual(['4']);
    expect(problems[0]).toMatchObject({ code: 'stops-left-out', severity: 'warning' });
  });

  test('stops when its time is over, with a plan that holds', () => {
    let asked = 0;
    const isTimeOver = () => {
      asked += 1;
      return asked > 2;
    };
    const { value } = planDays({ ...day, seed: 1, iterations: 1e9, isTimeOver });
    expect(asked).toBe(3);
    expect(() => checkedDriving(day, value?.routes ?? [])).not.toThrow();
  });
});

describe('small days', () => {
  const crews: DayCrew[] = ['north', 'south'].map((id) => ({
    id,
    startPlace: 0,
    endPlace: 0,
    leavesAt: 0,
    homeBy: 480,
  }));
  const place = fc.record({
    x: fc.integer({ min: 0, max: 50 }),
    y: fc.integer({ min: 0, max: 50 }),
  });
  const stopsArbitrary = fc.array(
    fc.record({
      at: place,
      earliest: fc.integer({ min: 0, max: 240 }),
      width: fc.integer({ min: 0, max: 240 }),
      crew: fc.constantFrom(0, 1, null),
    }),
    { minLength: 1, maxLength: 6 },
  );
  const day = (
    given: { at: { x: number; y: number }; earliest: number; width: number; crew: number | null }[],
  ) => {
    const places = [{ x: 25, y: 25 }, ...given.map(({ at }) => at)];
    const driveMinutes = places.map((a) => places.map((b) => Math.hypot(a.x - b.x, a.y - b.y)));
    const stops = given.map(
      ({ earliest, width, crew }, index): DayStop => ({
        id: `${index}`,
        place: index + 1,
        workMinutes: 20,
        earliest,
        latest: earliest + width,
        ...(crew === null ? {} : { crews: [crew] }),
      }),
    );
    return { stops, driveMinutes };
  };

  test('of one crew are ordered as well as the exact search does', () => {
    const [crew] = crews;
    if (!crew) throw new Error('no crew');
    fc.assert(
      fc.property(stopsArbitrary, (given) => {
        const { stops: named, driveMinutes } = day(given);
        const stops = named.map(({ crews: _, ...stop }) => stop);
        const exact = planDay({ stops, crew, driveMinutes }).value;
        const { value } = planDays({
          stops,
          crews: [crew],
          driveMinutes,
          seed: 2,
          iterations: 200,
        });
        if (exact) expect(value?.driveMinutes).toBeCloseTo(exact.driveMinutes, 6);
        else expect(value?.unplaced.length).toBeGreaterThan(0);
      }),
      { numRuns: 60, seed: 3 },
    );
  });

  test('send nobody to a job that they do not do, and break no promise', () => {
    fc.assert(
      fc.property(stopsArbitrary, (given) => {
        const { stops, driveMinutes } = day(given);
        const { value } = planDays({ stops, crews, driveMinutes, seed: 2, iterations: 60 });
        const left = new Set(value?.unplaced);
        const placed = stops.filter(({ id }) => !left.has(id));
        checkedDriving({ stops: placed, crews, driveMinutes }, value?.routes ?? []);
        for (const [index, route] of (value?.routes ?? []).entries()) {
          for (const { id } of route.stops) {
            expect(stops[Number(id)]?.crews ?? [index]).toContain(index);
          }
        }
      }),
      { numRuns: 60, seed: 4 },
    );
  });
});
