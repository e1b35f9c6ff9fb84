import { describe, expect, it } from 'vitest';
import { boardBars } from '@/components/diary/board/board-bars';
import { boardDays } from '@/components/diary/board/board-days';
import { crewDay } from '@/components/diary/board/crew-day';
import { timeInDay, workMinutesUntil } from '@/components/diary/board/stretch-to';
import { fromLocal } from '@/lib/time/local-moment';
import { visitExample } from '@/tests/help/visit-example';

const zone = 'America/New_York';
const week = {
  dayStart: '07:30',
  dayEnd: '15:30',
  workdays: [1, 2, 3, 4, 5],
  closedDays: ['2026-12-25'],
};
const hours = { start: '07:30', end: '15:30' };
const at = (date: string, time: string) => fromLocal(date, time, zone).toISOString();
const piece = (date: string, from: string, until: string) => ({
  id: `${date} ${from}`,
  startsAt: at(date, from),
  endsAt: at(date, until),
  with: '',
});

describe('the columns of the board', () => {
  it('fold weekends away, and keep a closed day so that all see why it is empty', () => {
    const days = boardDays({ from: '2026-12-21', weeks: 1 }, week, new Set());
    expect(days.map(({ date, isWorked }) => [date.slice(8), isWorked])).toEqual([
      ['21', true],
      ['22', true],
      ['23', true],
      ['24', true],
      ['25', false],
    ]);
  });

  it('unfold a Saturday that somebody is busy on, and mark where each week begins', () => {
    const days = boardDays({ from: '2026-12-07', weeks: 2 }, week, new Set(['2026-12-12']));
    expect(days.filter(({ isWeekStart }) => isWeekStart).map(({ date }) => date)).toEqual([
      '2026-12-07',
      '2026-12-14',
    ]);
    expect(days.map(({ date }) => date)).toContain('2026-12-12');
    expect(days).toHaveLength(11);
  });
});

describe('what is free of a crew’s day', () => {
  it('is the hours worked less what is taken of them', () => {
    const day = crewDay(
      '2026-12-07',
      [piece('2026-12-07', '11:30', '13:30'), piece('2026-12-07', '07:30', '08:30')],
      hours,
      zone,
    );
    expect(day).toMatchObject({ isWorked: true, workedMinutes: 480, freeMinutes: 300 });
    expect(day.taken).toEqual([
      { from: 0, until: 0.125, isElsewhere: false },
      { from: 0.5, until: 0.75, isElsewhere: false },
    ]);
  });

  it('is less where somebody of the crew is out with another, counted once where two are', () => {
    const out = (from: string, until: string) => ({
      ...piece('2026-12-07', from, until),
      with: 'Measure: both',
    });
    const pieces = [out('08:30', '10:30'), out('09:30', '11:30')];
    const day = crewDay('2026-12-07', pieces, hours, zone);
    expect(day).toMatchObject({ freeMinutes: 300, with: ['Measure: both'] });
    expect(day.taken.map(({ isElsewhere }) => isElsewhere)).toEqual([true, true]);
  });

  it('loses nothing to work outside the hours', () => {
    const day = crewDay('2026-12-07', [piece('2026-12-07', '15:00', '18:00')], hours, zone);
    expect(day.freeMinutes).toBe(450);
  });

  it('is nothing on a day off', () => {
    expect(crewDay('2026-12-12', [], null, zone)).toMatchObject({
      isWorked: false,
      freeMinutes: 0,
    });
  });

  it('counts real minutes on the day that the clocks go back', () => {
    const night = { start: '00:00', end: '08:00' };
    expect(crewDay('2026-11-01', [], night, zone).workedMinutes).toBe(540);
  });
});

describe('the bars of a crew', () => {
  const days = boardDays({ from: '2026-12-21', weeks: 2 }, week, new Set());
  const install = visitExample({
    id: 'install',
    pieces: [
      piece('2026-12-24', '07:30', '15:30'),
      piece('2026-12-28', '07:30', '15:30'),
      piece('2026-12-29', '07:30', '10:30'),
    ],
  });

  it('run over weekend and closed day, and show the day on which nobody works', () => {
    expect(boardBars([install], days, zone)).toMatchObject([
      { firstColumn: 3, lastColumn: 6, lane: 0, restColumns: [4], isCutAfter: false },
    ]);
  });

  it('give way downward where they would cover each other, and use a lane again after that', () => {
    const early = visitExample({ id: 'a', pieces: [piece('2026-12-28', '13:00', '14:00')] });
    const later = visitExample({ id: 'b', pieces: [piece('2026-12-30', '09:00', '10:00')] });
    const bars = boardBars([later, early, install], days, zone);
    expect(bars.map(({ visit, lane }) => [visit.id, lane])).toEqual([
      ['install', 0],
      ['a', 1],
      ['b', 0],
    ]);
  });

  it('say that a visit goes on after what is shown', () => {
    const oneWeek = boardDays({ from: '2026-12-21', weeks: 1 }, week, new Set());
    expect(boardBars([install], oneWeek, zone)).toMatchObject([
      { firstColumn: 3, lastColumn: 3, isCutBefore: false, isCutAfter: true },
    ]);
  });

  it('leave out what lies wholly elsewhere', () => {
    const elsewhere = boardDays({ from: '2027-01-11', weeks: 1 }, week, new Set());
    expect(boardBars([install], elsewhere, zone)).toEqual([]);
  });
});

describe('an end that is pulled', () => {
  it('lands on the half hour, within the hours worked', () => {
    expect(timeInDay(0.5, week)).toBe('11:30');
    expect(timeInDay(0.51, week)).toBe('11:30');
    expect(timeInDay(-1, week)).toBe('08:00');
    expect(timeInDay(2, week)).toBe('15:30');
  });

  it('counts the work over a weekend and a closed day', () => {
    const start = { date: '2026-12-24', time: '09:30' };
    expect(workMinutesUntil(start, { date: '2026-12-28', time: '11:30' }, week)).toBe(360 + 240);
    expect(workMinutesUntil(start, { date: '2026-12-24', time: '11:00' }, week)).toBe(90);
  });

  it('is nothing before the start', () => {
    const start = { date: '2026-12-24', time: '09:30' };
    expect(workMinutesUntil(start, { date: '2026-12-24', time: '09:00' }, week)).toBe(0);
    expect(workMinutesUntil(start, { date: '2026-12-23', time: '15:00' }, week)).toBe(0);
  });
});
