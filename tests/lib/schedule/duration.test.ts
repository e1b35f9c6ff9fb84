import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { durationSources, durationTable, estimateVisit, type VisitWork } from '@/lib/schedule';

const minutesFor = (work: VisitWork) => estimateVisit(work).value?.minutes;

/** A kitchen of 15 boxes with what belongs to it. */
const kitchen: VisitWork = {
  kind: 'install',
  crewSize: 2,
  units: { base: 4, drawers: 2, sink: 1, corner: 1, wall: 6, tall: 1, dishwasher: 1, range: 1 },
  items: { filler: 4, panel: 2, refrigeratorSurround: 1, crown: 4, kick: 7, front: 30 },
};

describe('an install', () => {
  test('adds up its units and pieces, and is shared by the crew', () => {
    const work = {
      kind: 'install' as const,
      crewSize: 2,
      units: { base: 6, sink: 1, corner: 1, wall: 6, tall: 1 },
      items: { filler: 4, panel: 2, kick: 7 },
    };
    expect(estimateVisit(work).value).toMatchObject({
      personMinutes: 1455,
      minutes: 735,
      lowMinutes: 405,
      highMinutes: 1035,
    });
    expect(minutesFor({ ...work, crewSize: 1 })).toBe(1455);
  });

  test('of a kitchen of 15 boxes lies in the published 25 to 35 hours of labour', () => {
    const hours = (estimateVisit(kitchen).value?.personMinutes ?? 0) / 60;
    expect(hours).toBeGreaterThan(25);
    expect(hours).toBeLessThan(35);
  });

  test('takes longer by what the walls add, and says so', () => {
    const square = estimateVisit(kitchen).value;
    const crooked = estimateVisit({ ...kitchen, fitExtraMinutes: 120 }).value;
    expect((crooked?.personMinutes ?? 0) - (square?.personMinutes ?? 0)).toBe(120);
    expect(crooked?.parts.at(-1)).toEqual({
      item: 'Walls out of true',
      count: 1,
      personMinutes: 120,
      basis: 'the fit',
    });
  });

  test('counts no appliances: another trade fills those places', () => {
    const { dishwasher, range, ...boxes } = kitchen.units ?? {};
    expect([dishwasher, range]).toEqual([1, 1]);
    expect(minutesFor({ ...kitchen, units: boxes })).toBe(minutesFor(kitchen));
  });

  test('takes longer by stairs, for each unit and floor', () => {
    const up = estimateVisit({ ...kitchen, stairFloors: 2 }).value?.personMinutes ?? 0;
    expect(up - (estimateVisit(kitchen).value?.personMinutes ?? 0)).toBe(15 * 2 * 4);
  });

  test('goes by the number of units while no run is laid out', () => {
    const work = { kind: 'install' as const, crewSize: 2, unitsNotLaidOut: 12 };
    expect(estimateVisit(work).value?.personMinutes).toBe(120 + 12 * 75 + 90);
  });

  test("goes by the shop's own minutes where there are any", () => {
    const work = { kind: 'install' as const, crewSize: 1, unitsNotLaidOut: 10 };
    const own = estimateVisit({ ...work, ownMinutes: { anyUnit: 60 } }).value;
    expect(own?.personMinutes).toBe(120 + 600 + 90);
    expect(own?.parts[1]).toMatchObject({ count: 10, basis: "the shop's own" });
  });

  test('of nothing is set-up and cleaning, with a warning', () => {
    const { value, problems } = estimateVisit({ kind: 'install', crewSize: 2 });
    expect(value?.personMinutes).toBe(210);
    expect(problems).toMatchObject([{ code: 'no-units', severity: 'warning' }]);
  });
});

describe('other visits', () => {
  test('a measure goes by its rooms, and two people are no faster', () => {
    expect(minutesFor({ kind: 'site-measure', crewSize: 1 })).toBe(90);
    const rooms = ['kitchen', 'one-wall'] as const;
    expect(minutesFor({ kind: 'site-measure', crewSize: 1, rooms })).toBe(135);
    expect(minutesFor({ kind: 'site-measure', crewSize: 2, rooms })).toBe(135);
  });
  test('a check measure, a template, a delivery and a return visit have their own', () => {
    expect(minutesFor({ kind: 'check-measure', crewSize: 1 })).toBe(45);
    expect(minutesFor({ kind: 'worktop-template', crewSize: 1 })).toBe(90);
    expect(minutesFor({ kind: 'delivery', crewSize: 2, unitsNotLaidOut: 15 })).toBe(60);
    expect(minutesFor({ kind: 'return', crewSize: 2, snags: 6 })).toBe(120);
  });
});

test.each([
  { units: { base: -1 } },
  { units: { base: Number.NaN } },
  { unitsNotLaidOut: Number.POSITIVE_INFINITY },
  { crewSize: 0 },
  { crewSize: 1.5 },
  { fitExtraMinutes: -10 },
  { ownMinutes: { base: Number.NaN } },
])('nothing is guessed from %o', (wrong) => {
  expect(estimateVisit({ kind: 'install', crewSize: 2, ...wrong })).toMatchObject({
    value: null,
    problems: [{ code: 'count-out-of-range', severity: 'error' }],
  });
});

test('an estimate lies between its low and its high, in quarters of an hour', () => {
  const count = fc.integer({ min: 0, max: 40 });
  const work = fc.record({
    kind: fc.constant('install' as const),
    crewSize: fc.integer({ min: 1, max: 4 }),
    units: fc.record({ base: count, wall: count, tall: count, sink: count, corner: count }),
    items: fc.record({ filler: count, panel: count, crown: count, kick: count }),
    stairFloors: fc.integer({ min: 0, max: 4 }),
    fitExtraMinutes: fc.integer({ min: 0, max: 600 }),
  });
  fc.assert(
    fc.property(work, (sample) => {
      const estimate = estimateVisit(sample).value;
      if (!estimate) throw new Error('no estimate');
      expect(estimate.lowMinutes).toBeLessThanOrEqual(estimate.minutes);
      expect(estimate.minutes).toBeLessThanOrEqual(estimate.highMinutes);
      expect(estimate.minutes % 15).toBe(0);
      const parts = estimate.parts.reduce((sum, part) => sum + part.personMinutes, 0);
      expect(parts).toBe(estimate.personMinutes);
    }),
  );
});

test('every row of the table lies in its range and names its basis', () => {
  for (const row of Object.values(durationTable)) {
    expect(row.low).toBeLessThanOrEqual(row.minutes);
    expect(row.minutes).toBeLessThanOrEqual(row.high);
    const named = row.basis.match(/[TM]\d\d/g) ?? [];
    expect(named.length > 0 || row.basis.startsWith('common practice')).toBe(true);
    for (const id of named) expect(Object.keys(durationSources)).toContain(id);
  }
});
