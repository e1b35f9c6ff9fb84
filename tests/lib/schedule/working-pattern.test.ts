import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  crewCalendar,
  hoursOn,
  patternOfShop,
  patternProblems,
  splitOverCalendar,
} from '@/lib/schedule';
import { addDays, weekdayOf } from '@/lib/time/civil';
import { fromLocal, toLocal } from '@/lib/time/local-moment';

const day = (weekday: number, start = '07:30', end = '16:00') => ({ weekday, start, end });
const mondayToFriday = [1, 2, 3, 4, 5].map((weekday) => day(weekday));
/** Each second Saturday in the morning: the first of them is 2026-05-09. */
const fortnight = {
  weeks: [[...mondayToFriday, day(6, '08:00', '12:00')], mondayToFriday],
  firstWeekOf: '2026-05-06',
};

describe('a working pattern', () => {
  test('has the second Saturday off, on and on, and before its first week too', () => {
    const saturdays = ['2026-04-25', '2026-05-02', '2026-05-09', '2026-05-16', '2026-05-23'];
    expect(saturdays.map((date) => hoursOn(fortnight, date)?.end ?? 'off')).toEqual([
      '12:00',
      'off',
      '12:00',
      'off',
      '12:00',
    ]);
  });

  test('begins its weeks on Monday, over the end of a year', () => {
    expect(hoursOn(fortnight, '2027-01-02')?.end).toBe('12:00');
    expect(hoursOn(fortnight, '2026-12-26')).toBeNull();
    expect(hoursOn(fortnight, '2027-01-03')).toBeNull();
  });

  test('comes again after as many weeks as it has, whatever the date', () => {
    const date = fc
      .integer({ min: -20_000, max: 40_000 })
      .map((days) => addDays('2026-05-06', days));
    fc.assert(
      fc.property(date, fc.integer({ min: 1, max: 4 }), (on, count) => {
        const weeks = Array.from({ length: count }, (_, week) => [
          day(weekdayOf(on), `0${week + 1}:00`),
        ]);
        const pattern = { weeks, firstWeekOf: '2026-05-06' };
        expect(hoursOn(pattern, addDays(on, 7 * count))).toEqual(hoursOn(pattern, on));
        const next = hoursOn(pattern, addDays(on, 7));
        expect(count === 1 || next?.start !== hoursOn(pattern, on)?.start).toBe(true);
      }),
    );
  });

  test('of a shop is its hours on its weekdays', () => {
    const pattern = patternOfShop({ dayStart: '08:00', dayEnd: '16:00', workdays: [2] });
    expect(hoursOn(pattern, '2026-05-12')).toEqual({ start: '08:00', end: '16:00' });
    expect(hoursOn(pattern, '2026-05-13')).toBeNull();
  });

  test.each([
    [[], 'pattern-weeks-out-of-range'],
    [[[]], 'no-working-hours'],
    [[[day(1, '16:00', '08:00')]], 'hours-end-before-start'],
    [[[day(1), day(1)]], 'weekday-twice'],
  ])('that makes no sense says so: %j', (weeks, code) => {
    const problems = patternProblems({ weeks, firstWeekOf: '2026-05-04' });
    expect(problems.map((problem) => problem.code)).toEqual([code]);
  });
});

describe('the days on which a crew goes out', () => {
  const away = [{ from: '2026-05-13', until: '2026-05-14' }];
  const days = (members: Parameters<typeof crewCalendar>[0]['members']) => {
    const calendar = crewCalendar({ pattern: fortnight, closedDays: ['2026-05-12'], members });
    const week = Array.from({ length: 7 }, (_, ahead) => addDays('2026-05-11', ahead));
    return week.filter((date) => calendar.hoursOn(date)).map((date) => weekdayOf(date));
  };

  test('leave out closed days, and the days off of one of its people', () => {
    expect(days(undefined)).toEqual([1, 3, 4, 5]);
    const both = [
      { weekdays: null, daysAway: away },
      { weekdays: null, daysAway: [] },
    ];
    expect(days(both)).toEqual([1, 5]);
  });

  test('do not mind the days off of somebody who goes with another crew that day', () => {
    const others = [
      { weekdays: [1, 2], daysAway: away },
      { weekdays: null, daysAway: [] },
    ];
    expect(days(others)).toEqual([1, 3, 4, 5]);
  });

  test('leave out the weekdays on which all its people go with others', () => {
    expect(days([{ weekdays: [1, 5], daysAway: [] }])).toEqual([1, 5]);
  });
});

test('an install goes over a short Saturday with the hours of that day', () => {
  const calendar = crewCalendar({ pattern: fortnight, closedDays: [] });
  const zone = 'America/Denver';
  const startsAt = fromLocal('2026-05-08', '07:30', zone);
  const { value } = splitOverCalendar({ workMinutes: 900, startsAt, calendar, zone });
  const shown = value?.map((piece) => {
    const [start, end] = [toLocal(piece.startsAt, zone), toLocal(piece.endsAt, zone)];
    return `${start.date} ${start.time}-${end.time}`;
  });
  expect(shown).toEqual([
    '2026-05-08 07:30-16:00',
    '2026-05-09 08:00-12:00',
    '2026-05-11 07:30-10:00',
  ]);
});
