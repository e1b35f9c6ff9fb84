import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { splitIntoPieces } from '@/lib/schedule';
import { addDays, weekdayOf } from '@/lib/time/civil';
import { fromLocal, toLocal } from '@/lib/time/local-moment';
import { isWorkday } from '@/lib/time/workdays';

const zone = 'America/Denver';
const pattern = {
  dayStart: '08:00',
  dayEnd: '16:00',
  workdays: [1, 2, 3, 4, 5],
  closedDays: [] as string[],
};
const at = (date: string, time: string) => fromLocal(date, time, zone);
const shown = (pieces: { startsAt: Date; endsAt: Date }[] | null, inZone = zone) =>
  pieces?.map(({ startsAt, endsAt }) => {
    const [start, end] = [toLocal(startsAt, inZone), toLocal(endsAt, inZone)];
    return `${start.date} ${start.time}-${end.time}`;
  });
const minutesOf = (pieces: { startsAt: Date; endsAt: Date }[]) =>
  pieces.reduce(
    (sum, piece) => sum + (piece.endsAt.getTime() - piece.startsAt.getTime()) / 60_000,
    0,
  );

describe('splitting', () => {
  test('leaves a visit that fits into its day in one piece', () => {
    const { value, problems } = splitIntoPieces({
      workMinutes: 90,
      startsAt: at('2026-05-12', '09:30'),
      pattern,
      zone,
    });
    expect(shown(value)).toEqual(['2026-05-12 09:30-11:00']);
    expect(problems).toEqual([]);
  });

  test('goes on after the weekend', () => {
    const startsAt = at('2026-05-15', '08:00');
    expect(shown(splitIntoPieces({ workMinutes: 960, startsAt, pattern, zone }).value)).toEqual([
      '2026-05-15 08:00-16:00',
      '2026-05-18 08:00-16:00',
    ]);
  });

  test('passes over closed days and ends in the middle of the last', () => {
    const closed = { ...pattern, closedDays: ['2026-05-13'] };
    const startsAt = at('2026-05-12', '12:00');
    expect(
      shown(splitIntoPieces({ workMinutes: 600, startsAt, pattern: closed, zone }).value),
    ).toEqual(['2026-05-12 12:00-16:00', '2026-05-14 08:00-14:00']);
  });

  test('does not begin a piece of nothing when the work ends with the day', () => {
    const startsAt = at('2026-05-12', '08:00');
    expect(splitIntoPieces({ workMinutes: 480, startsAt, pattern, zone }).value).toHaveLength(1);
  });

  test('keeps 16 hours of work 16 hours over a clock change, at the same hours by the clock', () => {
    const everyDay = { ...pattern, workdays: [1, 2, 3, 4, 5, 6, 7] };
    for (const saturday of ['2026-03-07', '2026-10-31']) {
      const startsAt = at(saturday, '08:00');
      const pieces = splitIntoPieces({ workMinutes: 960, startsAt, pattern: everyDay, zone }).value;
      expect(shown(pieces)).toEqual([
        `${saturday} 08:00-16:00`,
        `${addDays(saturday, 1)} 08:00-16:00`,
      ]);
      expect(minutesOf(pieces ?? [])).toBe(960);
    }
  });

  test('counts real minutes where the clock changes within the hours worked', () => {
    const night = { ...pattern, dayStart: '00:00', dayEnd: '06:00', workdays: [7] };
    const spring = splitIntoPieces({
      workMinutes: 330,
      startsAt: at('2026-03-08', '00:00'),
      pattern: night,
      zone,
    }).value;
    expect(shown(spring)).toEqual(['2026-03-08 00:00-06:00', '2026-03-15 00:00-00:30']);
    const autumn = splitIntoPieces({
      workMinutes: 420,
      startsAt: at('2026-11-01', '00:00'),
      pattern: night,
      zone,
    }).value;
    expect(shown(autumn)).toEqual(['2026-11-01 00:00-06:00']);
  });

  test('works in British Columbia after its last clock change', () => {
    const vancouver = 'America/Vancouver';
    const pieces = splitIntoPieces({
      workMinutes: 480,
      startsAt: new Date('2026-12-15T15:00:00Z'),
      pattern,
      zone: vancouver,
    }).value;
    expect(shown(pieces, vancouver)).toEqual(['2026-12-15 08:00-16:00']);
  });

  test('any work is split without loss, into worked hours, in order', () => {
    const input = fc.record({
      workMinutes: fc.integer({ min: 1, max: 6_000 }),
      dayOffset: fc.integer({ min: 0, max: 730 }),
      startMinute: fc.integer({ min: 480, max: 959 }),
      workdays: fc.subarray([1, 2, 3, 4, 5, 6, 7], { minLength: 1 }),
      closed: fc.array(fc.integer({ min: 0, max: 760 }), { maxLength: 40 }),
    });
    fc.assert(
      fc.property(input, ({ workMinutes, dayOffset, startMinute, workdays, closed }) => {
        const date = addDays('2026-01-01', dayOffset);
        const time = `${String(Math.floor(startMinute / 60)).padStart(2, '0')}:${String(startMinute % 60).padStart(2, '0')}`;
        const closedDays = closed.map((offset) => addDays('2026-01-01', offset));
        const own = { ...pattern, workdays, closedDays };
        const pieces =
          splitIntoPieces({ workMinutes, startsAt: at(date, time), pattern: own, zone }).value ??
          [];
        expect(minutesOf(pieces)).toBe(workMinutes);
        pieces.forEach((piece, index) => {
          const start = toLocal(piece.startsAt, zone);
          const end = toLocal(piece.endsAt, zone);
          expect(end.date).toBe(start.date);
          expect(end.time <= '16:00').toBe(true);
          if (index > 0) {
            expect(start.time).toBe('08:00');
            expect(isWorkday(start.date, own)).toBe(true);
            expect(piece.startsAt > (pieces[index - 1]?.endsAt ?? piece.startsAt)).toBe(true);
          }
        });
      }),
    );
  });
});

describe('starts outside the pattern', () => {
  test('a start before the hours of the crew is kept, with a warning', () => {
    const startsAt = at('2026-05-12', '07:00');
    const { value, problems } = splitIntoPieces({ workMinutes: 120, startsAt, pattern, zone });
    expect(shown(value)).toEqual(['2026-05-12 07:00-09:00']);
    expect(problems).toMatchObject([{ code: 'starts-before-day-start', severity: 'warning' }]);
  });

  test('a start on a day off is kept, with a warning', () => {
    expect(weekdayOf('2026-05-16')).toBe(6);
    const startsAt = at('2026-05-16', '10:00');
    const { value, problems } = splitIntoPieces({ workMinutes: 480, startsAt, pattern, zone });
    expect(shown(value)).toEqual(['2026-05-16 10:00-16:00', '2026-05-18 08:00-10:00']);
    expect(problems).toMatchObject([{ code: 'starts-on-day-off', severity: 'warning' }]);
  });

  test('a start at the end of the day is refused', () => {
    const startsAt = at('2026-05-12', '16:00');
    const { value, problems } = splitIntoPieces({ workMinutes: 60, startsAt, pattern, zone });
    expect(value).toBeNull();
    expect(problems).toMatchObject([{ code: 'starts-after-day-end', severity: 'error' }]);
  });
});

test.each([0, -5, Number.NaN, Number.POSITIVE_INFINITY, 1e9])(
  '%d minutes of work are refused',
  (workMinutes) => {
    const startsAt = at('2026-05-12', '08:00');
    expect(splitIntoPieces({ workMinutes, startsAt, pattern, zone })).toMatchObject({
      value: null,
      problems: [{ code: 'work-minutes-out-of-range' }],
    });
  },
);

test('a pattern without worked hours or days is refused when the work needs them', () => {
  const startsAt = at('2026-05-12', '08:00');
  const noDays = { ...pattern, workdays: [] };
  const noHours = { ...pattern, dayEnd: '08:00' };
  const codes = [noDays, noHours].map(
    (own) => splitIntoPieces({ workMinutes: 960, startsAt, pattern: own, zone }).problems[0]?.code,
  );
  expect(codes).toEqual(['no-working-hours', 'no-working-hours']);
});
