import { describe, expect, it } from 'vitest';
import { timeBeside, visitAt, workdayBeside } from '@/components/diary/place';
import { anyTime, askedWishes } from '@/components/diary/times/wishes';
import { visitStep } from '@/components/diary/visit-keys';
import { openingWishes } from '@/lib/contracts/openings';
import type { CrewView } from '@/lib/contracts/visits';
import { visitExample } from '@/tests/help/visit-example';

const pattern = {
  dayStart: '07:30',
  dayEnd: '15:30',
  workdays: [1, 2, 3, 4, 5],
  closedDays: ['2026-12-14'],
};
const crew = (id: string, does: CrewView['does']): CrewView => ({
  id,
  name: id,
  does,
  colour: '1',
  people: [],
});
const crews = [crew('north', 'fit'), crew('ines', 'measure'), crew('south', 'fit')];
const shop = { pattern, crews };
const visit = visitExample({
  id: 'visit',
  pieces: [{ id: '1', startsAt: '2026-12-11T12:30:00.000Z', endsAt: '2026-12-11T20:30:00.000Z' }],
});
const place = { crewId: 'north', date: '2026-12-11', time: '07:30', workMinutes: 480 };

describe('keys on a visit', () => {
  const press = (key: string, shiftKey = false) =>
    visitStep({ key, shiftKey }, shop)?.(visit, place);

  it('go to the next day that is worked, over a weekend and a closed day', () => {
    expect(press('ArrowRight', true)).toEqual({ ...place, date: '2026-12-15' });
    expect(press('ArrowLeft', true)).toEqual({ ...place, date: '2026-12-10' });
  });

  it('move by half an hour, and make longer and shorter by as much', () => {
    expect(press('ArrowDown', true)).toEqual({ ...place, time: '08:00' });
    expect(press('ArrowUp', true)).toEqual({ ...place, time: '07:00' });
    expect(press('+')).toEqual({ ...place, workMinutes: 510 });
    expect(press('-')).toEqual({ ...place, workMinutes: 450 });
  });

  it('hand it only to a crew that does this kind, round and round', () => {
    expect(press('x')).toEqual({ ...place, crewId: 'south' });
    const south = { ...place, crewId: 'south' };
    expect(visitStep({ key: 'X', shiftKey: true }, shop)?.(visit, south)).toEqual(place);
  });

  it('are nothing without Shift: arrows alone go from visit to visit', () => {
    expect(press('ArrowRight')).toBeUndefined();
    expect(press('q')).toBeUndefined();
  });

  it('never leave the day, nor a length of half an hour', () => {
    expect(timeBeside('23:45', 30)).toBe('23:45');
    expect(timeBeside('00:15', -30)).toBe('00:15');
    const short = { ...place, workMinutes: 30 };
    expect(visitStep({ key: '-', shiftKey: false }, shop)?.(visit, short)).toEqual(short);
  });

  it('stay where they are when no day is worked at all', () => {
    const never = { workdays: [], closedDays: [] };
    expect(workdayBeside('2026-12-11', 1, never)).toBe('2026-12-11');
  });
});

describe('a visit drawn where it will stand', () => {
  const zone = 'America/New_York';
  it('has its pieces there at once', () => {
    const moved = visitAt(
      visit,
      { ...place, workMinutes: 720, crewId: 'south' },
      { ...shop, zone },
    );
    expect(moved).toMatchObject({ crewName: 'south', endsAt: '2026-12-15T16:30:00.000Z' });
    expect(moved.pieces.map(({ startsAt }) => startsAt.slice(0, 10))).toEqual([
      '2026-12-11',
      '2026-12-15',
    ]);
  });

  it('stays where it is when it cannot stand there: the server says why', () => {
    expect(visitAt(visit, { ...place, time: '16:00' }, { ...shop, zone })).toBe(visit);
  });
});

describe('wishes on the phone', () => {
  it('ask for what the toggles say', () => {
    expect(askedWishes({ ...anyTime, half: 'morning', weekdays: [2, 4] })).toEqual({
      weekdays: [2, 4],
      notAfter: '12:00',
      away: [],
    });
  });

  it('take the later of the afternoon and the hour named', () => {
    const afternoon = { ...anyTime, half: 'afternoon' } as const;
    expect(askedWishes(afternoon)).toMatchObject({ notBefore: '12:00' });
    expect(askedWishes({ ...afternoon, notBefore: '13:30' })).toMatchObject({ notBefore: '13:30' });
    expect(askedWishes({ ...afternoon, notBefore: '09:00' })).toMatchObject({ notBefore: '12:00' });
  });

  it('are understood by the server', () => {
    const all = { ...anyTime, half: 'morning', isSchoolRun: true, notBefore: '09:15' } as const;
    expect(openingWishes.safeParse(askedWishes(all)).success).toBe(true);
  });
});
