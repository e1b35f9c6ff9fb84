import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { nextAllowedTime } from '@/lib/messages/quiet-hours';
import { fromLocal, toLocal } from '@/lib/time/local-moment';

const zone = 'America/Denver';
const rules = { zone, quietFrom: '21:00', quietUntil: '08:00', notAfter: null };
const at = (date: string, time: string, inZone = zone) => fromLocal(date, time, inZone);
const next = (date: string, time: string) => {
  const allowed = nextAllowedTime({ ...rules, dueAt: at(date, time) });
  if (!allowed) return null;
  const local = toLocal(allowed, zone);
  return `${local.date} ${local.time}`;
};

describe('texts by day', () => {
  test.each(['08:00', '12:00', '20:59'])('at %s go at once', (time) => {
    expect(next('2026-05-12', time)).toBe(`2026-05-12 ${time}`);
  });
  test.each([
    ['2026-05-12', '21:00', '2026-05-13 08:00'],
    ['2026-05-12', '23:59', '2026-05-13 08:00'],
    ['2026-05-13', '00:00', '2026-05-13 08:00'],
    ['2026-05-13', '07:59', '2026-05-13 08:00'],
    ['2026-12-31', '22:00', '2027-01-01 08:00'],
  ])('due %s %s wait for %s', (date, time, expected) => {
    expect(next(date, time)).toBe(expected);
  });

  test('keep the second of their due time', () => {
    const dueAt = new Date('2026-05-12T18:00:41Z');
    expect(nextAllowedTime({ ...rules, dueAt })).toEqual(dueAt);
  });
});

test('hours are those of the clock at the site, before and after it changes', () => {
  const night = nextAllowedTime({ ...rules, dueAt: at('2026-10-31', '22:00') });
  expect(night?.toISOString()).toBe('2026-11-01T15:00:00.000Z');
  const spring = nextAllowedTime({ ...rules, dueAt: at('2026-03-07', '22:00') });
  expect(spring?.toISOString()).toBe('2026-03-08T14:00:00.000Z');
  const vancouver = nextAllowedTime({
    ...rules,
    zone: 'America/Vancouver',
    dueAt: new Date('2026-12-15T14:30:00Z'),
  });
  expect(vancouver?.toISOString()).toBe('2026-12-15T15:00:00.000Z');
});

test('the same instant is day at one site and night at another', () => {
  const dueAt = new Date('2026-05-12T14:30:00Z');
  expect(nextAllowedTime({ ...rules, dueAt })).toEqual(dueAt);
  const honolulu = nextAllowedTime({ ...rules, dueAt, zone: 'Pacific/Honolulu' });
  expect(honolulu?.toISOString()).toBe('2026-05-12T18:00:00.000Z');
});

test('a text that would come after the visit is left to e-mail', () => {
  const dueAt = at('2026-05-12', '22:00');
  expect(nextAllowedTime({ ...rules, dueAt, notAfter: at('2026-05-13', '07:30') })).toBeNull();
  expect(nextAllowedTime({ ...rules, dueAt, notAfter: at('2026-05-13', '08:00') })).toEqual(
    at('2026-05-13', '08:00'),
  );
  const byDay = at('2026-05-12', '12:00');
  expect(
    nextAllowedTime({ ...rules, dueAt: byDay, notAfter: at('2026-05-12', '11:59') }),
  ).toBeNull();
});

test('quiet hours within one day, or none at all, are kept as written', () => {
  const noon = { ...rules, quietFrom: '12:00', quietUntil: '14:00' };
  expect(nextAllowedTime({ ...noon, dueAt: at('2026-05-12', '13:00') })).toEqual(
    at('2026-05-12', '14:00'),
  );
  expect(nextAllowedTime({ ...noon, dueAt: at('2026-05-12', '23:00') })).toEqual(
    at('2026-05-12', '23:00'),
  );
  const never = { ...rules, quietFrom: '00:00', quietUntil: '00:00' };
  expect(nextAllowedTime({ ...never, dueAt: at('2026-05-12', '03:00') })).toEqual(
    at('2026-05-12', '03:00'),
  );
});

test('no text ever goes at night, nor before it is due, nor a day late', () => {
  const dueAt = fc.date({
    min: new Date('2026-01-01T00:00:00Z'),
    max: new Date('2027-12-31T00:00:00Z'),
    noInvalidDate: true,
  });
  const anyZone = fc.constantFrom(
    'America/Denver',
    'Australia/Lord_Howe',
    'Europe/London',
    'Asia/Kolkata',
  );
  fc.assert(
    fc.property(dueAt, anyZone, (due, inZone) => {
      const allowed = nextAllowedTime({ ...rules, zone: inZone, dueAt: due });
      if (!allowed) throw new Error('never');
      const { time } = toLocal(allowed, inZone);
      expect(time >= '08:00' && time < '21:00').toBe(true);
      expect(allowed.getTime()).toBeGreaterThanOrEqual(due.getTime());
      expect(allowed.getTime() - due.getTime()).toBeLessThanOrEqual(12 * 3_600_000);
    }),
  );
});
