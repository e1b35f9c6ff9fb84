import { describe, expect, test } from 'vitest';
import {
  formatAtLocalTime,
  formatLocalDay,
  formatLocalDayShort,
  formatLocalDayWithYear,
  formatLocalTime,
  formatLocalWindow,
  formatLocalWindowShort,
} from '@/lib/time/format-civil';
import {
  formatDay,
  formatDayAndTime,
  formatDayShort,
  formatTime,
  formatWindow,
  formatWindowShort,
} from '@/lib/time/format-instant';
import { languages, type TextLocale } from '@/lib/time/text-locale';

const us: TextLocale = { language: 'en', region: 'US' };
const uk: TextLocale = { language: 'en', region: 'UK' };
const au: TextLocale = { language: 'en', region: 'AU' };
const usEs: TextLocale = { language: 'es', region: 'US' };
const euEs: TextLocale = { language: 'es', region: 'EU' };

describe('days', () => {
  test('are written as the region writes them', () => {
    expect(formatLocalDay('2026-05-12', us)).toBe('Tuesday, May 12');
    expect(formatLocalDay('2026-05-12', uk)).toBe('Tuesday 12 May');
    expect(formatLocalDay('2026-09-02', usEs)).toBe('miércoles 2 de septiembre');
  });
  test('have a short form', () => {
    expect(formatLocalDayShort('2026-05-12', us)).toBe('Tue, May 12');
    expect(formatLocalDayShort('2026-05-12', au)).toBe('Tue 12 May');
    expect(formatLocalDayShort('2026-05-16', euEs)).toBe('sáb 16 may');
  });
  test('have a form with the year', () => {
    expect(formatLocalDayWithYear('2026-05-12', us)).toBe('Tuesday, May 12, 2026');
    expect(formatLocalDayWithYear('2026-05-12', uk)).toBe('Tuesday 12 May 2026');
    expect(formatLocalDayWithYear('2026-05-12', usEs)).toBe('martes 12 de mayo de 2026');
  });
});

describe('times', () => {
  test.each([
    ['00:05', us, '12:05 AM'],
    ['07:30', us, '7:30 AM'],
    ['12:00', us, '12:00 PM'],
    ['23:59', us, '11:59 PM'],
    ['13:00', au, '1:00 pm'],
    ['07:30', uk, '07:30'],
    ['13:00', usEs, '1:00 p.m.'],
    ['13:00', euEs, '13:00'],
  ] as const)('%s for %o is %s', (time, locale, text) => {
    expect(formatLocalTime(time, locale)).toBe(text);
  });

  test('take the Spanish article of their hour', () => {
    expect(formatAtLocalTime('13:00', usEs)).toBe('a la 1:00 p.m.');
    expect(formatAtLocalTime('13:00', euEs)).toBe('a las 13:00');
    expect(formatAtLocalTime('01:15', euEs)).toBe('a la 01:15');
    expect(formatAtLocalTime('08:00', us)).toBe('at 8:00 AM');
  });
});

describe('windows', () => {
  test('say the half of the day once where they can', () => {
    expect(formatLocalWindow('08:00', '10:00', us)).toBe('between 8:00 and 10:00 AM');
    expect(formatLocalWindow('11:00', '13:00', us)).toBe('between 11:00 AM and 1:00 PM');
    expect(formatLocalWindow('22:00', '08:00', us)).toBe('between 10:00 PM and 8:00 AM');
    expect(formatLocalWindow('08:00', '10:00', uk)).toBe('between 08:00 and 10:00');
    expect(formatLocalWindow('08:00', '10:00', usEs)).toBe('entre las 8:00 y las 10:00 a.m.');
    expect(formatLocalWindow('11:00', '13:00', usEs)).toBe('entre las 11:00 a.m. y la 1:00 p.m.');
  });
  test('have a short form with a plain hyphen', () => {
    expect(formatLocalWindowShort('08:00', '10:00', us)).toBe('8:00-10:00 AM');
    expect(formatLocalWindowShort('11:00', '13:00', uk)).toBe('11:00-13:00');
  });
});

test('instants are written as they are shown in the zone, over a clock change too', () => {
  const zone = 'America/Denver';
  const from = new Date('2026-11-01T15:00:00Z');
  const until = new Date('2026-11-01T17:00:00Z');
  expect(formatDay(from, zone, us)).toBe('Sunday, November 1');
  expect(formatDayShort(from, zone, us)).toBe('Sun, Nov 1');
  expect(formatTime(from, zone, us)).toBe('8:00 AM');
  expect(formatDayAndTime(from, zone, us)).toBe('Sunday, November 1 at 8:00 AM');
  expect(formatDayAndTime(from, zone, usEs)).toBe('domingo 1 de noviembre a las 8:00 a.m.');
  expect(formatWindow({ from, until }, zone, us)).toBe('between 8:00 and 10:00 AM');
  expect(formatWindowShort({ from, until }, zone, us)).toBe('8:00-10:00 AM');
  const dayBefore = new Date('2026-10-31T14:00:00Z');
  expect(formatTime(dayBefore, zone, us)).toBe('8:00 AM');
});

test('no text holds a space that SMS does not carry', () => {
  for (const language of languages) {
    for (const region of ['US', 'UK', 'AU', 'EU'] as const) {
      const locale = { language, region };
      const text = [
        formatLocalDayWithYear('2026-05-12', locale),
        formatAtLocalTime('08:00', locale),
        formatLocalWindow('08:00', '10:00', locale),
      ].join(' ');
      expect(text).not.toMatch(/[\u00a0\u2009\u202f\u2013]/);
    }
  }
});
