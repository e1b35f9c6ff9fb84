import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hoursText, readHours } from '@/components/crews/hours-text';
import { patternWords, weekdayWords } from '@/components/crews/pattern-words';

describe('hours as they are typed', () => {
  it.each([
    ['7:30-16:00', '07:30', '16:00'],
    [' 7.30 – 16 ', '07:30', '16:00'],
    ['0730-1530', '07:30', '15:30'],
    ['8am-4:30pm', '08:00', '16:30'],
    ['12am to 12pm', '00:00', '12:00'],
    ['8 — 12', '08:00', '12:00'],
  ])('%j is from %s to %s', (text, start, end) => {
    expect(readHours(text)).toEqual({ hours: { start, end }, error: null });
  });

  it.each(['', '  ', '-', 'off'])('%j is a day off', (text) => {
    expect(readHours(text)).toEqual({ hours: null, error: null });
  });

  it.each(['8', '8-', '16-8', '8-8', '25-26', '8:75-9', '8-12-16', 'morning', '13pm-14pm'])(
    '%j is asked for again',
    (text) => {
      const { hours, error } = readHours(text);
      expect(hours).toBeNull();
      expect(error).toMatch(/\.$/);
    },
  );

  it('are read back as they are shown', () => {
    const time = fc
      .tuple(fc.integer({ min: 0, max: 23 }), fc.integer({ min: 0, max: 59 }))
      .map((parts) => parts.map((part) => String(part).padStart(2, '0')).join(':'));
    fc.assert(
      fc.property(time, time, (start, end) => {
        fc.pre(start < end);
        expect(readHours(hoursText({ start, end })).hours).toEqual({ start, end });
      }),
    );
  });
});

describe('a pattern in words', () => {
  const on = (weekdays: number[], start = '07:30', end = '16:00') =>
    weekdays.map((weekday) => ({ weekday, start, end }));

  it('takes neighbouring days of the same hours together', () => {
    expect(patternWords({ weeks: [on([5, 1, 2, 3, 4])], firstWeekOf: '2026-05-04' })).toBe(
      'Mon–Fri 07:30–16:00',
    );
    const mixed = [...on([1, 2, 4]), ...on([6], '08:00', '12:00')];
    expect(patternWords({ weeks: [mixed, []], firstWeekOf: '2026-05-04' })).toBe(
      'Mon and Tue 07:30–16:00, Thu 07:30–16:00, Sat 08:00–12:00, then off',
    );
  });

  it('says weekdays as people do', () => {
    expect(weekdayWords([4, 1, 3, 2, 6])).toBe('Mon–Thu, Sat');
  });
});
