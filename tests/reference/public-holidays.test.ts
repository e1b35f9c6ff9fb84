import { expect, test } from 'vitest';
import { publicHolidays } from '@/lib/schedule/holidays';
import { weekdayOf } from '@/lib/time/civil';
import data from './data/public-holidays.json';

test.each(data.values)(
  'the weekdays off in $country $part in $year are those published',
  ({ country, part, year, observed }) => {
    const place = part === '' ? { country } : { country, part };
    const dates = publicHolidays(place, year).map(({ date }) => date);
    expect(dates).toEqual(dates.toSorted());
    expect(new Set(dates).size).toBe(dates.length);
    const onWeekdays = dates.filter((date) => weekdayOf(date) <= 5);
    expect(onWeekdays.filter((date) => date.startsWith(`${year}`))).toEqual(
      expect.arrayContaining(observed),
    );
    // Eves of a year to come are all that is beside them.
    const more = onWeekdays.filter((date) => !observed.includes(date));
    expect(more.filter((date) => !date.endsWith('-12-31'))).toEqual([]);
  },
);

test('an unknown country has no holidays', () => {
  expect(publicHolidays({ country: 'ZZ' }, 2026)).toEqual([]);
});
