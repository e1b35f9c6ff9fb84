import fc from 'fast-check';
import moment from 'moment-timezone';
import { describe, expect, test } from 'vitest';
import { fromLocal, localDate, startOfLocalDay, toLocal } from '@/lib/time/local-moment';
import { isZone, offsetMinutesAt, zonesOf } from '@/lib/time/zones';

const zones = [
  'America/Denver',
  'America/Vancouver',
  'America/St_Johns',
  'Europe/London',
  'Australia/Lord_Howe',
  'Asia/Kolkata',
  'Africa/Casablanca',
  'Pacific/Auckland',
  'America/Santiago',
];
const instant = fc.date({
  min: new Date('2020-01-01T00:00:00Z'),
  max: new Date('2034-12-31T00:00:00Z'),
  noInvalidDate: true,
});

describe('toLocal', () => {
  test('shows date, time and weekday of the zone', () => {
    expect(toLocal(new Date('2026-05-13T03:15:59Z'), 'America/Denver')).toEqual({
      date: '2026-05-12',
      time: '21:15',
      weekday: 2,
      offsetMinutes: -360,
    });
    expect(localDate(new Date('2026-05-13T03:15:59Z'), 'America/Denver')).toBe('2026-05-12');
  });

  test('agrees with the library that carries the data, at any instant', () => {
    fc.assert(
      fc.property(instant, fc.constantFrom(...zones), (at, zone) => {
        const { date, time, weekday } = toLocal(at, zone);
        const theirs = moment.tz(at, zone);
        expect(`${date} ${time} ${weekday}`).toBe(theirs.format('YYYY-MM-DD HH:mm E'));
      }),
    );
  });

  test('refuses what cannot be shown, naming it', () => {
    expect(() => toLocal(new Date(Number.NaN), 'America/Denver')).toThrow('invalid Date');
    expect(() => toLocal(new Date(0), 'Nowhere/At_All')).toThrow('"Nowhere/At_All"');
  });
});

describe('fromLocal', () => {
  test('is the way back from what a clock shows, but for the second pass of a repeated hour', () => {
    fc.assert(
      fc.property(instant, fc.constantFrom(...zones), (at, zone) => {
        const minute = new Date(Math.floor(at.getTime() / 60_000) * 60_000);
        const { date, time } = toLocal(minute, zone);
        const back = fromLocal(date, time, zone);
        expect(toLocal(back, zone)).toMatchObject({ date, time });
        expect(back.getTime()).toBeLessThanOrEqual(minute.getTime());
      }),
    );
  });

  test('agrees with the library on every quarter of an hour around every clock change', () => {
    for (const zone of zones) {
      for (const day of [
        '2026-03-08',
        '2026-03-29',
        '2026-04-05',
        '2026-10-04',
        '2026-11-01',
        '2027-09-05',
      ]) {
        for (let quarter = 0; quarter < 96; quarter++) {
          const [hour, minute] = [Math.floor(quarter / 4), (quarter % 4) * 15];
          const [year, month, date] = day.split('-').map(Number) as [number, number, number];
          const time = `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`;
          const theirs = moment.tz([year, month - 1, date, hour, minute], zone).toISOString();
          expect(fromLocal(day, time, zone).toISOString(), `${zone} ${day} ${time}`).toBe(theirs);
        }
      }
    }
  });

  test('takes the first pass of a repeated hour', () => {
    const first = fromLocal('2026-11-01', '01:30', 'America/New_York');
    expect(first.toISOString()).toBe('2026-11-01T05:30:00.000Z');
  });

  test('puts a skipped time as far after the gap as it was written into it', () => {
    const shown = toLocal(fromLocal('2026-03-08', '02:30', 'America/New_York'), 'America/New_York');
    expect(shown.time).toBe('03:30');
    const halfHour = fromLocal('2026-10-04', '02:15', 'Australia/Lord_Howe');
    expect(toLocal(halfHour, 'Australia/Lord_Howe').time).toBe('02:45');
  });

  test('keeps British Columbia and Alberta right in December 2026, where Node is an hour off', () => {
    const at = new Date('2026-12-15T12:00:00Z');
    expect(toLocal(at, 'America/Vancouver').time).toBe('05:00');
    expect(toLocal(at, 'America/Edmonton').time).toBe('06:00');
    expect(fromLocal('2026-12-15', '05:00', 'America/Vancouver')).toEqual(at);
    expect(fromLocal('2026-12-15', '06:00', 'America/Edmonton')).toEqual(at);
  });

  test.each([
    ['2026-02-30', '08:00'],
    ['2026-2-3', '08:00'],
    ['2026-05-12', '24:00'],
    ['2026-05-12', '8:00'],
  ])('refuses %s %s, naming it', (date, time) => {
    expect(() => fromLocal(date, time, 'America/Denver')).toThrow(/"2026-|"24:00"|"8:00"/);
  });
});

describe('startOfLocalDay', () => {
  test('is midnight, or the end of the gap where midnight is skipped', () => {
    expect(startOfLocalDay('2026-05-12', 'America/Denver').toISOString()).toBe(
      '2026-05-12T06:00:00.000Z',
    );
    const chile = startOfLocalDay('2024-09-08', 'America/Santiago');
    expect(chile.toISOString()).toBe('2024-09-08T04:00:00.000Z');
    expect(toLocal(chile, 'America/Santiago')).toMatchObject({ date: '2024-09-08', time: '01:00' });
  });
});

describe('zones', () => {
  test('are known by their names', () => {
    expect(isZone('America/Denver')).toBe(true);
    expect(isZone('US/Mountain')).toBe(true);
    expect(isZone('Denver')).toBe(false);
    expect(isZone('')).toBe(false);
  });

  test('are listed by country', () => {
    expect(zonesOf('GB')).toEqual(['Europe/London']);
    expect(zonesOf('US')).toContain('America/Denver');
    expect(zonesOf('ZZ')).toEqual([]);
  });

  test('have an offset at each instant', () => {
    expect(offsetMinutesAt(Date.UTC(2026, 6, 1, 12), 'America/New_York')).toBe(-240);
  });
});
