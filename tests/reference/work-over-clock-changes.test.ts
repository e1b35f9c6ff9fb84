import { describe, expect, test } from 'vitest';
import { noWishes } from '@/lib/contracts/openings';
import { crewCalendar, findOpenings, splitOverCalendar, usualOpeningWeights } from '@/lib/schedule';
import { addDays } from '@/lib/time/civil';
import { fromLocal, localDate, toLocal } from '@/lib/time/local-moment';
import data from './data/time-zones.json';

const changes = Object.entries(data.transitions).flatMap(([zone, list]) =>
  list.map(({ utc }) => ({ zone, utc })),
);
const hours = { start: '08:00', end: '16:00' };
/** Every day of the week is worked, so that the install is at work across the night of the change. */
const weeks = [[1, 2, 3, 4, 5, 6, 7].map((weekday) => ({ weekday, ...hours }))];
const calendar = crewCalendar({ pattern: { weeks, firstWeekOf: '2026-01-05' }, closedDays: [] });

describe('an install of 24 work-hours over a published clock change', () => {
  test.each(changes)(
    'in $zone at $utc is 24 hours, at the same hours by the clock',
    ({ zone, utc }) => {
      const dayOfChange = localDate(new Date(utc), zone);
      const startsAt = fromLocal(addDays(dayOfChange, -1), '08:00', zone);
      const { value } = splitOverCalendar({ workMinutes: 1_440, startsAt, calendar, zone });
      const minutes = value?.map(({ startsAt: from, endsAt: until }) => (+until - +from) / 60_000);
      expect(minutes).toEqual([480, 480, 480]);
      for (const piece of value ?? []) {
        expect(toLocal(piece.startsAt, zone).time).toBe('08:00');
        expect(toLocal(piece.endsAt, zone).time).toBe('16:00');
      }
      const [opening] = findOpenings({
        crews: [{ id: 'a', name: 'A', calendar, base: null, busy: [], workMinutes: 1_440 }],
        site: null,
        driveMinutes: () => 0,
        driveWhenUnknownMinutes: 0,
        from: addDays(dayOfChange, -1),
        until: addDays(dayOfChange, -1),
        now: startsAt,
        zone,
        windowMinutes: 120,
        wishes: noWishes,
        weights: usualOpeningWeights,
      });
      expect(opening?.pieces).toEqual(value);
    },
  );
});
