import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  correctedMinutes,
  type TimedVisit,
  workedMinutes,
} from '@/lib/schedule/duration-corrections';

const install = (actualMinutes: number): TimedVisit => ({
  actualMinutes,
  people: 2,
  fixedPersonMinutes: 300,
  count: 12,
});

describe('minutes for a unit', () => {
  test('are what the middle visit says, to five minutes', () => {
    const visits = [500, 540, 600, 630, 900].map(install);
    expect(correctedMinutes(visits, 60)).toEqual({
      nowMinutes: 60,
      offeredMinutes: 75,
      lowQuartileMinutes: 65,
      highQuartileMinutes: 80,
      visitCount: 5,
      setAsideCount: 0,
    });
  });

  test('are not offered from four visits', () => {
    expect(correctedMinutes([600, 600, 600, 600].map(install), 60)).toBeNull();
  });

  test('do not mind a tap that was forgotten', () => {
    const visits = [...[600, 600, 600, 600, 600].map(install), install(15), install(5_000)];
    expect(correctedMinutes(visits, 60)).toMatchObject({ offeredMinutes: 75, setAsideCount: 2 });
  });

  test('come back to what they are when every visit took its estimate', () => {
    const visit = fc.record({
      people: fc.integer({ min: 1, max: 4 }),
      fixedPersonMinutes: fc.integer({ min: 0, max: 600 }),
      count: fc.integer({ min: 1, max: 40 }),
    });
    fc.assert(
      fc.property(
        fc.array(visit, { minLength: 5, maxLength: 30 }),
        fc.integer({ min: 2, max: 40 }).map((steps) => steps * 5),
        (visits, nowMinutes) => {
          const timed = visits.map((given) => ({
            ...given,
            actualMinutes: (given.fixedPersonMinutes + given.count * nowMinutes) / given.people,
          }));
          expect(correctedMinutes(timed, nowMinutes)?.offeredMinutes).toBe(nowMinutes);
        },
      ),
    );
  });
});

describe('minutes worked', () => {
  const at = (day: number, time: string) => new Date(`2026-05-${day}T${time}:00Z`);
  const piece = (day: number) => ({ from: at(day, '08:00'), until: at(day, '16:00') });

  test('leave out nights and pauses', () => {
    const onSite = { from: at(11, '08:00'), until: at(12, '12:00') };
    const pause = { from: at(11, '12:00'), until: at(11, '12:30') };
    expect(workedMinutes(onSite, [piece(11), piece(12)], [pause])).toBe(690);
  });

  test('of one day count past the booked end', () => {
    const onSite = { from: at(11, '08:00'), until: at(11, '17:00') };
    expect(workedMinutes(onSite, [piece(11)], [])).toBe(540);
  });

  test('are never below nothing', () => {
    const onSite = { from: at(11, '08:00'), until: at(11, '09:00') };
    const pause = { from: at(11, '07:00'), until: at(11, '10:00') };
    expect(workedMinutes(onSite, [], [pause])).toBe(0);
  });
});
