import { describe, expect, it } from 'vitest';
import type { VisitFact } from '@/lib/numbers/facts';
import { confirmedBefore, inTheWindow } from '@/lib/numbers/promises';
import { secondTrips } from '@/lib/numbers/second-trips';
import { median } from '@/lib/numbers/tally';
import { daysUntil, drivePerVisit, hoursAgainstEstimate, messageCost } from '@/lib/numbers/times';
import { workedMinutes } from '@/lib/numbers/worked-minutes';

const zone = 'America/New_York';
const at = (text: string) => new Date(text);
let made = 0;

function visit(change: Partial<VisitFact> = {}): VisitFact {
  made += 1;
  return {
    visitId: `visit-${made}`,
    jobId: 'job-1',
    jobNumber: 2401,
    kind: 'install',
    crewName: 'North van',
    status: 'done',
    startsAt: at('2026-11-02T13:00:00Z'),
    windowStartsAt: at('2026-11-02T13:00:00Z'),
    windowEndsAt: at('2026-11-02T15:00:00Z'),
    confirmedAt: null,
    arrivedAt: at('2026-11-02T13:10:00Z'),
    leftAt: at('2026-11-02T21:10:00Z'),
    workMinutes: 480,
    pieces: [{ startsAt: at('2026-11-02T13:00:00Z'), endsAt: at('2026-11-02T21:00:00Z') }],
    pauses: [],
    ...change,
  };
}

describe('the shop’s numbers', () => {
  it('count a visit as confirmed when the yes came before its own day began, where the shop is', () => {
    // Midnight of 2 November in New York, standard time since the day before, is 05:00 UTC.
    const figure = confirmedBefore(
      [
        visit({ confirmedAt: at('2026-11-02T04:59:59Z') }),
        visit({ confirmedAt: at('2026-11-02T05:00:00Z') }),
        visit(),
      ],
      zone,
    );
    expect(figure).toMatchObject({ value: 1 / 3, outOf: 3 });
    expect(figure.lines).toHaveLength(2);
  });

  it('count an arrival on the last minute of the window as kept, and one a minute later as late', () => {
    const figure = inTheWindow(
      [
        visit({ arrivedAt: at('2026-11-02T15:00:00Z') }),
        visit({ arrivedAt: at('2026-11-02T15:01:00Z') }),
        visit({ arrivedAt: at('2026-11-02T12:40:00Z') }),
        visit({ arrivedAt: null }),
      ],
      zone,
    );
    expect(figure).toMatchObject({ value: 1 / 3, outOf: 3 });
    expect(figure.lines.map(({ words }) => words.split(': ')[1])).toEqual([
      '1 min late',
      '20 min early',
    ]);
  });

  it('leave the night between two days of an install out of its hours, also where nobody pressed pause', () => {
    const pieces = [
      { startsAt: at('2026-11-02T13:00:00Z'), endsAt: at('2026-11-02T21:00:00Z') },
      { startsAt: at('2026-11-03T13:00:00Z'), endsAt: at('2026-11-03T17:00:00Z') },
    ];
    const span = { arrivedAt: at('2026-11-02T13:00:00Z'), leftAt: at('2026-11-03T17:00:00Z') };
    const night = { startsAt: at('2026-11-02T21:00:00Z'), endsAt: at('2026-11-03T13:00:00Z') };
    const lunch = { startsAt: at('2026-11-02T17:00:00Z'), endsAt: at('2026-11-02T17:30:00Z') };
    expect(workedMinutes({ ...span, pieces, pauses: [] })).toBe(12 * 60);
    expect(workedMinutes({ ...span, pieces, pauses: [night, lunch] })).toBe(12 * 60 - 30);
  });

  it('have no hours of a visit that nobody has left', () => {
    expect(
      workedMinutes({
        arrivedAt: at('2026-11-02T13:00:00Z'),
        leftAt: null,
        pieces: [],
        pauses: [],
      }),
    ).toBeNull();
    const figure = hoursAgainstEstimate([visit({ leftAt: null, status: 'on-site' })], zone);
    expect(figure).toMatchObject({ value: null, outOf: 0 });
  });

  it('say why a trip was made a second time', () => {
    const figure = secondTrips(
      [
        visit({ kind: 'site-measure', jobId: 'job-2' }),
        visit({ kind: 'site-measure', jobId: 'job-2', startsAt: at('2026-11-09T13:00:00Z') }),
        visit({ kind: 'return', startsAt: at('2026-11-10T13:00:00Z') }),
        visit({ status: 'missed' }),
        visit({ kind: 'site-measure', jobId: 'job-3' }),
      ],
      {
        measuredBefore: new Set(['job-3']),
        snags: [
          {
            jobId: 'job-1',
            jobNumber: 2401,
            kind: 'fault',
            place: '',
            foundAt: at('2026-11-02T20:00:00Z'),
          },
          {
            jobId: 'job-1',
            jobNumber: 2401,
            kind: 'damaged',
            place: '',
            foundAt: at('2026-11-02T20:05:00Z'),
          },
        ],
      },
      zone,
    );
    expect(figure).toMatchObject({ value: 4, outOf: 5 });
    expect(figure.splits).toEqual([
      { name: 'measured again', value: 2, outOf: null },
      { name: 'a damaged part', value: 1, outOf: null },
      { name: 'nobody home', value: 1, outOf: null },
    ]);
  });

  it('take the job in the middle, so that one forgotten job does not spoil the figure', () => {
    expect(median([])).toBeNull();
    expect(median([4])).toBe(4);
    expect(median([1, 2, 400])).toBe(2);
    expect(median([1, 2, 3, 400])).toBe(2.5);
    const job = { jobId: 'job-1', jobNumber: 2401, enquiredAt: at('2026-10-01T12:00:00Z') };
    const figure = daysUntil('days-to-measure', [{ job, at: at('2026-10-09T12:00:00Z') }], zone);
    expect(figure).toMatchObject({ value: 8, outOf: 1 });
    expect(figure.splits).toEqual([{ name: '1 to 2 weeks', value: 1, outOf: null }]);
  });

  it('share a day’s drive over its visits, and say when it is an estimate', () => {
    const visits = [1, 2].map((n) => ({
      jobId: `job-${n}`,
      jobNumber: 2400 + n,
      kind: 'install' as const,
    }));
    const figure = drivePerVisit(
      [{ crewName: 'North van', day: '2026-11-02', minutes: 50, visits }],
      true,
    );
    expect(figure.value).toBe(25);
    expect(figure.lines.map(({ value }) => value)).toEqual([25, 25]);
    expect(figure.caution).toContain('estimated');
  });

  it('count texts where no price is known, and money where it is', () => {
    const sent = [
      {
        jobId: 'job-1',
        jobNumber: 2401,
        sentAt: at('2026-11-02T13:00:00Z'),
        occasion: 'Booked',
        segments: 2,
      },
    ];
    expect(messageCost(sent, null, zone)).toMatchObject({ unit: 'count', value: 2, outOf: 1 });
    expect(messageCost(sent, 0.05, zone)).toMatchObject({ unit: 'money', value: 0.1 });
  });
});
