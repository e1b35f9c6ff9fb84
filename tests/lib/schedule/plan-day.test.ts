import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { DayCrew, DayStop, DriveMatrix } from '@/lib/schedule/routes/day-stops';
import { missedBy, planDay } from '@/lib/schedule/routes/plan-day';

const crew: DayCrew = { id: 'north', startPlace: 0, endPlace: 0, leavesAt: 0, homeBy: 600 };
/** One road: place n lies 10 n minutes from the base. */
const oneRoad: DriveMatrix = Array.from({ length: 6 }, (_, from) =>
  Array.from({ length: 6 }, (_, to) => Math.abs(from - to) * 10),
);
const stopAt = (place: number, given: Partial<DayStop> = {}): DayStop => ({
  id: `stop ${place}`,
  place,
  workMinutes: 30,
  earliest: 0,
  latest: 600,
  ...given,
});
const plan = (stops: DayStop[]) => planDay({ stops, crew, driveMinutes: oneRoad });
const orderOf = (stops: DayStop[]) => plan(stops).value?.stops.map(({ id }) => id);

describe('the order of a day', () => {
  test('goes out along a road and home again', () => {
    const { value } = plan([stopAt(3), stopAt(1), stopAt(2)]);
    expect(value?.driveMinutes).toBe(60);
    expect(value?.stops.map(({ id }) => id)).toEqual(['stop 1', 'stop 2', 'stop 3']);
    expect(value?.stops.map(({ arrivesAt }) => arrivesAt)).toEqual([10, 50, 90]);
  });

  test('drives farther to keep a promised window', () => {
    const early = stopAt(3, { latest: 30 });
    expect(orderOf([stopAt(1), stopAt(2), early])).toEqual(['stop 3', 'stop 2', 'stop 1']);
  });

  test('waits at a door that opens later', () => {
    const { value } = plan([stopAt(1, { earliest: 120 })]);
    expect(value?.stops).toEqual([{ id: 'stop 1', arrivesAt: 120 }]);
  });

  test('turns round for a wish where that costs less than missing it', () => {
    const wished = (missedMinutes: number) =>
      stopAt(1, { wish: { from: 0, until: 10, missedMinutes } });
    const far = stopAt(2, { latest: 20 });
    // The far one is promised first, so the wish is missed and counted.
    expect(plan([wished(15), far]).value).toMatchObject({ driveMinutes: 40, missedMinutes: 15 });
    const later = stopAt(1, { wish: { from: 200, until: 300, missedMinutes: 25 } });
    expect(plan([later]).value?.stops).toEqual([{ id: 'stop 1', arrivesAt: 200 }]);
  });

  test('says that no order keeps the windows', () => {
    const { value, problems } = plan([stopAt(1, { latest: 10 }), stopAt(5, { latest: 50 })]);
    expect(value).toBeNull();
    expect(problems.map(({ code }) => code)).toEqual(['no-order-keeps-the-windows']);
  });

  test('refuses more stops than it can order exactly', () => {
    const many = Array.from({ length: 13 }, (_, index) => stopAt(1, { id: `${index}` }));
    expect(plan(many).problems.map(({ code }) => code)).toEqual(['too-many-stops']);
  });

  test('drives nowhere on a day with no stops', () => {
    expect(plan([]).value).toEqual({
      crewId: 'north',
      stops: [],
      driveMinutes: 0,
      missedMinutes: 0,
    });
  });

  test('orders twelve stops in well under a second', () => {
    const stops = Array.from({ length: 12 }, (_, index) =>
      stopAt(index % 6, { id: `${index}`, workMinutes: 10 }),
    );
    const began = performance.now();
    expect(plan(stops).value?.driveMinutes).toBe(100);
    expect(performance.now() - began).toBeLessThan(3_000);
  });
});

describe('against all permutations', () => {
  const minute = fc.integer({ min: 0, max: 60 });
  const stopArbitrary = fc.record({
    earliest: fc.integer({ min: 0, max: 200 }),
    width: fc.integer({ min: 0, max: 250 }),
    workMinutes: fc.integer({ min: 0, max: 40 }),
    wish: fc.option(
      fc.record({
        from: fc.integer({ min: 0, max: 200 }),
        width: fc.integer({ min: 0, max: 100 }),
        missedMinutes: fc.integer({ min: 1, max: 60 }),
      }),
      { nil: undefined },
    ),
  });
  const dayOf = (count: number) =>
    fc.record({
      stops: fc.array(stopArbitrary, { minLength: count, maxLength: count }),
      // Not a map: one-way streets, and a way round that is shorter.
      drives: fc.array(fc.array(minute, { minLength: count + 1, maxLength: count + 1 }), {
        minLength: count + 1,
        maxLength: count + 1,
      }),
    });

  function check(numRuns: number, most: number) {
    const anyDay = fc.integer({ min: 1, max: most }).chain(dayOf);
    fc.assert(
      fc.property(anyDay, ({ stops: given, drives }) => {
        const stops = given.map(({ earliest, width, workMinutes, wish }, index): DayStop => {
          const stop = stopAt(index + 1, { earliest, latest: earliest + width, workMinutes });
          if (!wish) return stop;
          const { from, missedMinutes } = wish;
          return { ...stop, wish: { from, until: from + wish.width, missedMinutes } };
        });
        const day = { stops, crew: { ...crew, homeBy: 480 }, driveMinutes: drives };
        const { value } = planDay(day);
        const least = leastByPermutation(day);
        expect(value ? value.driveMinutes + value.missedMinutes : null).toBe(least);
      }),
      { numRuns, seed: 8 },
    );
  }

  test('costs the same up to six stops', () => check(120, 6));
  test('costs the same at eight stops', () => check(3, 8));
});

/** Each order in turn; at each stop at once, or waiting for what the customer wished. */
function leastByPermutation(day: {
  stops: readonly DayStop[];
  crew: DayCrew;
  driveMinutes: DriveMatrix;
}): number | null {
  const { stops, crew: driver, driveMinutes } = day;
  const drive = (from: number, to: number) => driveMinutes[from]?.[to] ?? Number.NaN;
  let least: number | null = null;
  function go(at: number, time: number, cost: number, left: readonly DayStop[]): void {
    if (least !== null && cost >= least) return;
    if (left.length === 0) {
      const home = drive(at, driver.endPlace);
      const total = cost + home;
      if (time + home <= driver.homeBy && (least === null || total < least)) least = total;
      return;
    }
    for (const stop of left) {
      const minutes = drive(at, stop.place);
      const first = Math.max(time + minutes, stop.earliest);
      const waits = stop.wish ? [first, Math.max(first, stop.wish.from)] : [first];
      for (const arrival of waits) {
        if (arrival > stop.latest) continue;
        const total = cost + minutes + missedBy(stop, arrival);
        const rest = left.filter((other) => other !== stop);
        go(stop.place, arrival + stop.workMinutes, total, rest);
      }
    }
  }
  go(driver.startPlace, driver.leavesAt, 0, stops);
  return least;
}
