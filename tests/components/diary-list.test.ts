import { describe, expect, it } from 'vitest';
import { changesBack } from '@/components/days/plan-moves';
import { barName } from '@/components/diary/board/bar-name';
import { listDays } from '@/components/diary/list/list-days';
import { anyTime, askedDays, halfToggled } from '@/components/diary/times/wishes';
import type { DayPlanView } from '@/lib/contracts/day-plans';
import { fromLocal } from '@/lib/time/local-moment';
import { visitExample } from '../help/visit-example';

const zone = 'America/New_York';
const piece = (date: string, time: string) => ({
  id: `${date} ${time}`,
  startsAt: fromLocal(date, time, zone).toISOString(),
  endsAt: fromLocal(date, '16:00', zone).toISOString(),
});

describe('the diary as a list', () => {
  it('has each day that somebody goes out, in order of time, and a long visit on each of its days', () => {
    const install = visitExample({
      id: 'install',
      pieces: [piece('2026-12-07', '08:00'), piece('2026-12-08', '07:30')],
    });
    const measure = visitExample({ id: 'measure', pieces: [piece('2026-12-08', '07:00')] });
    const range = { from: '2026-12-07', to: '2026-12-21' };
    const days = listDays([install, measure], range, zone);
    expect(
      days.map(({ date, stands }) => [date, stands.map((s) => [s.visit.id, s.dayNumber])]),
    ).toEqual([
      ['2026-12-07', [['install', 1]]],
      [
        '2026-12-08',
        [
          ['measure', 1],
          ['install', 2],
        ],
      ],
    ]);
  });

  it('leaves out the days of a visit that lie before it begins', () => {
    const install = visitExample({
      id: 'install',
      pieces: [piece('2026-12-07', '08:00'), piece('2026-12-08', '07:30')],
    });
    const days = listDays([install], { from: '2026-12-08', to: '2026-12-22' }, zone);
    expect(days).toMatchObject([{ date: '2026-12-08', stands: [{ dayNumber: 2 }] }]);
  });
});

describe('a name on a narrow bar', () => {
  it.each([
    ['Odile Pryce', 'Odile', 'Pryce'],
    ['Maria del Carmen', 'Maria', 'del Carmen'],
    ['Hallowfield', '', 'Hallowfield'],
  ])('of %s gives way in its first word', (name, first, last) => {
    expect(barName(name)).toEqual({ first, last });
  });
});

describe('what the customer wishes on the phone', () => {
  const booked = { today: '2026-12-01', visitDate: '2026-12-10' };

  it('sooner is any day from today until the day before the visit', () => {
    expect(askedDays({ ...anyTime, isSooner: true }, booked)).toEqual({
      from: '2026-12-01',
      until: '2026-12-09',
    });
    const fromThird = { ...anyTime, isSooner: true, from: '2026-12-03' };
    expect(askedDays(fromThird, booked)).toEqual({ from: '2026-12-03', until: '2026-12-09' });
  });

  it('sooner than a visit of today looks at today alone, and never backwards', () => {
    const today = { today: '2026-12-01', visitDate: '2026-12-01' };
    expect(askedDays({ ...anyTime, isSooner: true }, today)).toEqual({
      from: '2026-12-01',
      until: '2026-12-01',
    });
  });

  it('sooner says nothing where nothing is booked yet', () => {
    expect(askedDays({ ...anyTime, isSooner: true }, { ...booked, visitDate: null })).toEqual({});
  });

  it('a second press takes the half of the day back', () => {
    const mornings = { ...anyTime, ...halfToggled(anyTime, 'morning') };
    expect(mornings.half).toBe('morning');
    expect(halfToggled(mornings, 'afternoon')).toEqual({ half: 'afternoon' });
    expect(halfToggled(mornings, 'morning')).toEqual({ half: null });
  });
});

describe('a better order that is taken back', () => {
  it('puts each visit where it was, by the version that taking it made', () => {
    const stop = (visitId: string, startsAt: string) => ({ visitId, startsAt });
    const plan = {
      now: [
        { crewId: 'north', stops: [stop('a', '08:00'), stop('b', '09:00')] },
        { crewId: 'south', stops: [stop('c', '08:00')] },
      ],
      changes: [
        { visitId: 'b', version: 3, crewId: 'south', startsAt: '10:00' },
        { visitId: 'c', version: 1, crewId: 'north', startsAt: '09:30' },
      ],
    } as unknown as DayPlanView;
    expect(changesBack(plan)).toEqual([
      { visitId: 'b', version: 4, crewId: 'north', startsAt: '09:00' },
      { visitId: 'c', version: 2, crewId: 'south', startsAt: '08:00' },
    ]);
  });
});
