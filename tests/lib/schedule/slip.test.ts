import { describe, expect, test } from 'vitest';
import type { FoundOpening } from '@/lib/schedule';
import { slipProposal, slippedReadyDay, slipWords } from '@/lib/schedule/slip';
import { fromLocal, toLocal } from '@/lib/time/local-moment';

const zone = 'America/New_York';
const rules = { workdays: [1, 2, 3, 4, 5], closedDays: ['2026-05-18'], leadWorkdays: 6 };
const release = { revision: 'A', releasedOn: '2026-05-04', isSuperseded: false };

describe('the day on which late cabinets are ready', () => {
  test('is so many working days after what the bench said', () => {
    const facts = { readyOn: '2026-05-14', release };
    expect(slippedReadyDay(facts, 3, { rules, today: '2026-05-11' })).toEqual({
      was: '2026-05-14',
      becomes: '2026-05-20',
    });
  });

  test('is counted from release and lead time where the bench said nothing', () => {
    expect(slippedReadyDay({ readyOn: null, release }, 1, { rules, today: '2026-05-05' })).toEqual({
      was: '2026-05-12',
      becomes: '2026-05-13',
    });
  });

  test('is counted from today where it is past, and is none where nothing is released', () => {
    const facts = { readyOn: '2026-05-01', release };
    expect(slippedReadyDay(facts, 2, { rules, today: '2026-05-11' })?.becomes).toBe('2026-05-13');
    const none = { readyOn: null, release: null };
    expect(slippedReadyDay(none, 2, { rules, today: '2026-05-11' })).toBeNull();
  });
});

describe('where a visit goes that cannot stay', () => {
  /** A Tuesday. */
  const visit = { crewId: 'north', date: '2026-05-12', time: '08:00' };
  const opening = (crewId: string, date: string, time: string, score = 0): FoundOpening => ({
    crewId,
    startsAt: fromLocal(date, time, zone),
    pieces: [],
    workMinutes: 60,
    driveAddedMinutes: 0,
    leavesFreeMinutes: 0,
    missedWishes: [],
    score,
    places: [],
    after: null,
    before: null,
  });
  const chosen = (openings: FoundOpening[]) => {
    const found = slipProposal(visit, openings, zone);
    return found && `${found.crewId} ${toLocal(found.startsAt, zone).date}`;
  };

  test('is with the same crew on the same weekday, though another time comes sooner', () => {
    const sooner = [
      opening('south', '2026-05-14', '08:00'),
      opening('north', '2026-05-15', '08:00'),
    ];
    expect(chosen([...sooner, opening('north', '2026-05-19', '13:00', 99)])).toBe(
      'north 2026-05-19',
    );
    expect(chosen(sooner)).toBe('north 2026-05-15');
    expect(chosen(sooner.slice(0, 1))).toBe('south 2026-05-14');
  });

  test('is not put off for weeks for the sake of the crew', () => {
    const late = opening('north', '2026-06-09', '08:00');
    expect(chosen([opening('south', '2026-05-14', '08:00'), late])).toBe('south 2026-05-14');
    expect(chosen([late])).toBe('north 2026-06-09');
    expect(chosen([])).toBeNull();
  });

  test('is nearest to the old hour on the day', () => {
    const times = [
      opening('north', '2026-05-19', '13:00'),
      opening('north', '2026-05-19', '09:00'),
    ];
    expect(slipProposal(visit, times, zone)?.startsAt).toEqual(
      fromLocal('2026-05-19', '09:00', zone),
    );
  });

  test('is told in words', () => {
    expect(slipWords(visit, { ...visit, date: '2026-05-19' })).toBe(
      'same crew, same weekday, 7 days later, same hour',
    );
    expect(slipWords(visit, { crewId: 'south', date: '2026-05-13', time: '09:00' })).toBe(
      'another crew, 1 day later',
    );
  });
});
