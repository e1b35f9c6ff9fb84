import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { noWishes } from '@/lib/contracts/openings';
import {
  type BusyPiece,
  crewCalendar,
  eachStartOnce,
  findOpenings,
  type OpeningCrew,
  type OpeningsInput,
  openingWhy,
  splitOverCalendar,
  usualOpeningWeights,
  variedOpenings,
} from '@/lib/schedule';
import { addDays, daysBetween, weekdayOf } from '@/lib/time/civil';
import { fromLocal, toLocal } from '@/lib/time/local-moment';

const zone = 'America/New_York';
const monday = '2026-05-11';
const at = (date: string, time: string) => fromLocal(date, time, zone);
const weekdays = [1, 2, 3, 4, 5].map((weekday) => ({ weekday, start: '08:00', end: '16:00' }));
const pattern = { weeks: [weekdays], firstWeekOf: monday };
const busy = (date: string, start: string, end: string, place = 1): BusyPiece => ({
  startsAt: at(date, start),
  endsAt: at(date, end),
  place,
  label: `stop ${place}`,
});
/** The base is place 0, the site 2; a stop at place 1. */
const drives = [
  [0, 20, 25],
  [20, 0, 10],
  [25, 10, 0],
];
const driveMinutes = (from: number, to: number) => drives[from]?.[to] ?? Number.NaN;
const crewOf = (given: Partial<OpeningCrew> = {}): OpeningCrew => ({
  id: 'north',
  name: 'North crew',
  calendar: crewCalendar({ pattern, closedDays: [] }),
  base: 0,
  busy: [],
  workMinutes: 120,
  ...given,
});
const asked = (given: Partial<OpeningsInput> = {}): OpeningsInput => ({
  crews: [crewOf()],
  site: 2,
  driveMinutes,
  driveWhenUnknownMinutes: 20,
  from: monday,
  until: monday,
  now: at('2026-05-08', '12:00'),
  zone,
  windowMinutes: 120,
  wishes: noWishes,
  weights: usualOpeningWeights,
  ...given,
});
const starts = (input: OpeningsInput) =>
  findOpenings(input).map(({ startsAt }) => {
    const { date, time } = toLocal(startsAt, zone);
    return `${date} ${time}`;
  });

describe('times that work', () => {
  test('an empty day begins at the start of the day and counts the drive out and home', () => {
    const [opening] = findOpenings(asked());
    expect(opening?.startsAt).toEqual(at(monday, '08:00'));
    expect(opening?.driveAddedMinutes).toBe(50);
    expect(opening?.leavesFreeMinutes).toBe(360);
    expect(opening?.score).toBe(50);
  });

  test('a stop on the way costs only the detour, and the drive to it has to fit', () => {
    const crew = crewOf({ busy: [busy(monday, '08:00', '10:00')] });
    const [opening] = findOpenings(asked({ crews: [crew] }));
    // 10 minutes from the stop: on site at 10:10, on the next quarter.
    expect(opening?.startsAt).toEqual(at(monday, '10:15'));
    // stop→site 10 + site→base 25 − stop→base 20.
    expect(opening?.driveAddedMinutes).toBe(15);
  });

  test('a gap that is long enough for the visit but not for the drives is not offered', () => {
    const crew = crewOf({
      busy: [busy(monday, '08:00', '11:00'), busy(monday, '13:15', '16:00')],
    });
    expect(starts(asked({ crews: [crew] }))).toEqual([]);
    const looser = crewOf({
      busy: [busy(monday, '08:00', '11:00'), busy(monday, '13:30', '16:00')],
    });
    expect(starts(asked({ crews: [looser] }))).toEqual([`${monday} 11:15`]);
  });

  test('a visit of one day is never split over a night', () => {
    const crew = crewOf({ busy: [busy(monday, '08:00', '12:00')], workMinutes: 360 });
    expect(starts(asked({ crews: [crew] }))).toEqual([]);
  });

  test('an install of three days goes over the weekend and a closed day', () => {
    const calendar = crewCalendar({ pattern, closedDays: ['2026-05-18'] });
    const crew = crewOf({ calendar, workMinutes: 3 * 480 });
    const [opening] = findOpenings(
      asked({ crews: [crew], from: '2026-05-14', until: '2026-05-14' }),
    );
    expect(opening?.pieces.map(({ startsAt }) => toLocal(startsAt, zone).date)).toEqual([
      '2026-05-14',
      '2026-05-15',
      '2026-05-19',
    ]);
    expect(opening?.driveAddedMinutes).toBe(150);
  });

  test('an install is not offered where one of its later days is taken', () => {
    const crew = crewOf({ workMinutes: 960, busy: [busy('2026-05-12', '10:00', '11:00')] });
    expect(starts(asked({ crews: [crew], until: '2026-05-12' }))).toEqual(['2026-05-12 11:15']);
  });

  test('nothing begins in the past, and today begins at the next quarter', () => {
    expect(starts(asked({ now: at(monday, '09:20') }))).toEqual([`${monday} 09:30`]);
  });

  test('wishes move the start inside a gap, and what cannot be met is said', () => {
    const wishes = { ...noWishes, notBefore: '09:30', weekdays: [2] };
    const [opening] = findOpenings(asked({ wishes }));
    expect(opening?.startsAt).toEqual(at(monday, '09:30'));
    expect(opening?.missedWishes).toEqual(['weekday']);
    const told = {
      crewName: 'North crew',
      zone,
      locale: { language: 'en', region: 'US' },
      wishes,
    } as const;
    expect(opening && openingWhy(opening, told)).toBe(
      'An empty day for North crew: 50 min of driving, 6 h still free; not a Tuesday.',
    );
  });

  test('the school run keeps the whole arrival window clear', () => {
    const wishes = { ...noWishes, away: [{ from: '08:00', until: '09:00' }] };
    expect(starts(asked({ wishes }))).toEqual([`${monday} 09:00`]);
  });

  test('a place that is not on the map takes the drive that the shop reckons with', () => {
    const crew = crewOf({ busy: [{ ...busy(monday, '08:00', '10:00'), place: null }] });
    expect(starts(asked({ crews: [crew] }))).toEqual([`${monday} 10:30`]);
  });

  test('the choice for somebody on the phone is spread over days', () => {
    const crews = ['a', 'b', 'c', 'd'].map((id) => crewOf({ id }));
    const found = findOpenings(asked({ crews, until: '2026-05-15' }));
    const chosen = variedOpenings(found, 6);
    const days = new Set(chosen.map(({ startsAt }) => toLocal(startsAt, zone).date));
    expect(found).toHaveLength(20);
    expect([chosen.length, days.size]).toEqual([6, 3]);
    expect(chosen[0]).toEqual(found[0]);
  });

  test('a time that several crews could keep is one time, with the crew it suits best', () => {
    const far = { ...crewOf({ id: 'far' }), base: 1 };
    const found = findOpenings(
      asked({ crews: [far, crewOf({ id: 'near' })], until: '2026-05-15' }),
    );
    const once = eachStartOnce(found);
    const times = found.map(({ startsAt }) => startsAt.toISOString());
    expect(once.map(({ startsAt }) => startsAt.toISOString()).toSorted()).toEqual(
      [...new Set(times)].toSorted(),
    );
    for (const { startsAt, score } of once) {
      const same = found.filter((other) => +other.startsAt === +startsAt);
      expect(score).toBe(Math.min(...same.map((other) => other.score)));
    }
  });
});

describe('against every quarter of an hour tried one by one', () => {
  const quarter = fc.integer({ min: 0, max: 31 });
  const pieces = fc.array(
    fc.record({
      day: fc.integer({ min: 0, max: 5 }),
      from: quarter,
      quarters: fc.integer({ min: 1, max: 16 }),
      place: fc.constantFrom(0, 1, null),
    }),
    { maxLength: 5 },
  );
  const crewArbitrary = fc.record({
    pieces,
    workMinutes: fc.constantFrom(45, 120, 300, 600, 1000),
    closed: fc.subarray(['2026-05-12', '2026-05-14']),
  });
  const wishesArbitrary = fc.record({
    weekdays: fc.subarray([1, 3]),
    away: fc.subarray([{ from: '10:00', until: '11:00' }]),
    notBefore: fc.option(fc.constantFrom('08:30', '12:00'), { nil: undefined }),
    notAfter: fc.option(fc.constantFrom('09:00', '13:00'), { nil: undefined }),
    doneBy: fc.option(fc.constantFrom('12:00', '15:00'), { nil: undefined }),
  });

  test('finds every stretch that has a start that works, each with its least trouble', () => {
    fc.assert(
      fc.property(
        fc.array(crewArbitrary, { minLength: 1, maxLength: 2 }),
        wishesArbitrary,
        (crewsGiven, wishes) => {
          const crews = crewsGiven.map(({ pieces, workMinutes, closed }, index) =>
            crewOf({
              id: `crew ${index}`,
              workMinutes,
              calendar: crewCalendar({ pattern, closedDays: closed }),
              busy: pieces.map(({ day, from, quarters, place }) => {
                const startsAt = new Date(
                  at(addDays(monday, day), '08:00').getTime() + from * 900_000,
                );
                const endsAt = new Date(startsAt.getTime() + quarters * 900_000);
                return { startsAt, endsAt, place, label: 'stop' };
              }),
            }),
          );
          const input = asked({ crews, until: '2026-05-13', wishes });
          const found = new Map(
            findOpenings(input).map((opening) => [
              `${opening.crewId} ${stretchKey(input, opening.crewId, opening.startsAt)}`,
              Math.round(opening.score * 1000),
            ]),
          );
          expect(found).toEqual(bruteForce(input));
        },
      ),
      { numRuns: 60, seed: 4 },
    );
  });
});

/** Start of the free stretch in which an instant lies. */
function stretchKey(input: OpeningsInput, crewId: string, instant: Date): number {
  const crew = input.crews.find(({ id }) => id === crewId);
  const dayStart = at(toLocal(instant, zone).date, '08:00').getTime();
  const ends = (crew?.busy ?? [])
    .filter(({ startsAt, endsAt }) => +startsAt < +instant && +endsAt > dayStart)
    .map(({ endsAt }) => +endsAt);
  return Math.max(dayStart, ...ends);
}

function bruteForce(input: OpeningsInput): Map<string, number> {
  const best = new Map<string, number>();
  for (const crew of input.crews) {
    for (let date = input.from; date <= input.until; date = addDays(date, 1)) {
      for (let quarterOfDay = 0; quarterOfDay < 32; quarterOfDay++) {
        const startsAt = new Date(at(date, '08:00').getTime() + quarterOfDay * 900_000);
        const score = scoreOf(input, crew, startsAt);
        if (score === null) continue;
        const key = `${crew.id} ${stretchKey(input, crew.id, startsAt)}`;
        best.set(key, Math.min(best.get(key) ?? Number.POSITIVE_INFINITY, score));
      }
    }
  }
  return new Map([...best].map(([key, score]) => [key, Math.round(score * 1000)]));
}

function scoreOf(input: OpeningsInput, crew: OpeningCrew, startsAt: Date): number | null {
  const { calendar, workMinutes } = crew;
  const isTaken = crew.busy.some((stop) => stop.startsAt <= startsAt && startsAt < stop.endsAt);
  if (isTaken || !calendar.hoursOn(toLocal(startsAt, zone).date)) return null;
  const { value, problems } = splitOverCalendar({ workMinutes, startsAt, calendar, zone });
  if (!value || problems.length > 0) return null;
  const isLong = workMinutes > 480;
  const first = value[0];
  if (!first || (!isLong && value.length > 1)) return null;
  if (isLong && +first.endsAt - +first.startsAt < 120 * 60_000) return null;
  // A visit of several days begins at the end of a day, so that nothing comes between its days.
  if (isLong && toLocal(first.endsAt, zone).time !== '16:00') return null;
  const drive = (from: number | null, to: number | null) =>
    from === null || to === null ? 20 : (drives[from]?.[to] ?? 20);
  let added = 0;
  let scrap = 0;
  const { weekdays: days, notBefore, notAfter, doneBy, away } = input.wishes;
  let isLate = false;
  for (const [index, piece] of value.entries()) {
    const { date } = toLocal(piece.startsAt, zone);
    const stops = crew.busy.filter((stop) => {
      const isOfDay = toLocal(stop.startsAt, zone).date === date;
      const isUntil = toLocal(new Date(+stop.endsAt - 1), zone).date === date;
      return isOfDay || isUntil;
    });
    const before = stops
      .filter((stop) => +stop.startsAt < +piece.startsAt)
      .toSorted((a, b) => +a.endsAt - +b.endsAt || +b.startsAt - +a.startsAt)
      .at(-1);
    const after = stops
      .filter((stop) => +stop.startsAt >= +piece.startsAt)
      .toSorted((a, b) => +a.startsAt - +b.startsAt)[0];
    const from = before ? +before.endsAt + drive(before.place, 2) * 60_000 : +at(date, '08:00');
    const dayEnd = +at(date, '16:00');
    const until = after
      ? Math.min(dayEnd, +after.startsAt - drive(2, after.place) * 60_000)
      : dayEnd;
    if (+piece.startsAt < from || +piece.endsAt > until) return null;
    if (index === 0 && isLong && after && +after.startsAt < dayEnd) return null;
    const [a, b] = [before ? before.place : 0, after ? after.place : 0];
    added += drive(a, 2) + drive(2, b) - (before || after ? drive(a, b) : 0);
    const left = [index === 0 ? +piece.startsAt - from : 0];
    if (index === value.length - 1) left.push(until - +piece.endsAt);
    scrap += left.reduce((sum, ms) => sum + (ms >= 900_000 && ms < 3_600_000 ? ms / 60_000 : 0), 0);
    if (doneBy && toLocal(piece.endsAt, zone).time > doneBy) isLate = true;
  }
  const { date, time } = toLocal(startsAt, zone);
  const windowEnd = toLocal(new Date(+startsAt + input.windowMinutes * 60_000), zone).time;
  const missed = [
    days.length > 0 && !days.includes(weekdayOf(date)),
    notBefore !== undefined && time < notBefore,
    notAfter !== undefined && time > notAfter,
    isLate,
    away.some((range) => time < range.until && range.from < windowEnd),
  ].filter(Boolean).length;
  const { driveMinute, dayWaited, scrapMinute, missedWish } = input.weights;
  const waited = daysBetween(input.from, date);
  return driveMinute * added + dayWaited * waited + scrapMinute * scrap + missedWish * missed;
}
