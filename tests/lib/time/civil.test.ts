import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { addDays, daysBetween, isLocalDate, isLocalTime, weekdayOf } from '@/lib/time/civil';
import { addWorkdays, isWorkday, workdayOnOrAfter } from '@/lib/time/workdays';

const days = { workdays: [1, 2, 3, 4, 5], closedDays: ['2026-05-18'] };
const anyDate = fc
  .date({ min: new Date('2000-01-01'), max: new Date('2060-12-31'), noInvalidDate: true })
  .map((date) => date.toISOString().slice(0, 10));

describe('dates and times', () => {
  test.each(['2026-05-12', '2028-02-29', '2000-02-29'])('%s is a date', (text) => {
    expect(isLocalDate(text)).toBe(true);
  });
  test.each([
    '2026-02-29',
    '2100-02-29',
    '2026-13-01',
    '2026-00-10',
    '2026-5-1',
    '12/05/2026',
    '',
    '2026-05-12T00:00',
  ])('"%s" is no date', (text) => expect(isLocalDate(text)).toBe(false));
  test('times run from 00:00 to 23:59', () => {
    expect(['00:00', '07:30', '23:59'].map(isLocalTime)).toEqual([true, true, true]);
    expect(['24:00', '7:30', '07:60', '07:30:00', ''].some(isLocalTime)).toBe(false);
  });

  test('days are counted over month ends and leap days', () => {
    expect(addDays('2026-02-27', 3)).toBe('2026-03-02');
    expect(addDays('2028-02-28', 1)).toBe('2028-02-29');
    expect(addDays('2026-01-01', -1)).toBe('2025-12-31');
    expect(daysBetween('2026-05-12', '2026-05-19')).toBe(7);
    expect(() => addDays('2026-02-30', 1)).toThrow('"2026-02-30"');
  });

  test('adding days and counting them agree', () => {
    fc.assert(
      fc.property(anyDate, fc.integer({ min: -2000, max: 2000 }), (date, count) => {
        expect(daysBetween(date, addDays(date, count))).toBe(count);
      }),
    );
  });

  test('weekdays are those of ISO 8601', () => {
    expect(weekdayOf('2026-05-11')).toBe(1);
    expect(weekdayOf('2026-05-17')).toBe(7);
    expect(weekdayOf('2000-01-01')).toBe(6);
  });
});

describe('working days', () => {
  test('leave out weekends and closed days', () => {
    expect(isWorkday('2026-05-12', days)).toBe(true);
    expect(isWorkday('2026-05-10', days)).toBe(false);
    expect(isWorkday('2026-05-18', days)).toBe(false);
    expect(workdayOnOrAfter('2026-05-16', days)).toBe('2026-05-19');
  });

  test('are added without counting the day itself', () => {
    expect(addWorkdays('2026-05-12', 3, days)).toBe('2026-05-15');
    expect(addWorkdays('2026-05-12', 4, days)).toBe('2026-05-19');
    expect(addWorkdays('2026-05-16', 1, days)).toBe('2026-05-19');
    expect(addWorkdays('2026-05-16', 0, days)).toBe('2026-05-19');
    expect(addWorkdays('2026-05-15', 0, days)).toBe('2026-05-15');
  });

  test('never come when none is worked', () => {
    expect(addWorkdays('2026-05-12', 1, { workdays: [], closedDays: [] })).toBeNull();
    expect(workdayOnOrAfter('2026-05-12', { workdays: [8], closedDays: [] })).toBeNull();
  });

  test('agree with a count day by day', () => {
    fc.assert(
      fc.property(anyDate, fc.integer({ min: 1, max: 60 }), (date, count) => {
        const added = addWorkdays(date, count, days) ?? '';
        let worked = 0;
        for (let day = addDays(date, 1); day <= added; day = addDays(day, 1)) {
          if (isWorkday(day, days)) worked += 1;
        }
        expect(worked).toBe(count);
        expect(isWorkday(added, days)).toBe(true);
      }),
    );
  });
});
