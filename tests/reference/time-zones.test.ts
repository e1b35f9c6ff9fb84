import { describe, expect, test } from 'vitest';
import { fromLocal, toLocal } from '@/lib/time/local-moment';
import { offsetMinutesAt } from '@/lib/time/zones';
import data from './data/time-zones.json';

const zones = Object.entries(data.transitions);

describe('clock changes of 2026 and 2027, from the IANA database', () => {
  const changes = zones.flatMap(([zone, list]) => list.map((change) => ({ zone, ...change })));

  test.each(changes)('$zone at $utc', ({ zone, utc, ...change }) => {
    const at = new Date(utc);
    const second = 1000;
    const before = toLocal(new Date(at.getTime() - second), zone);
    const after = toLocal(at, zone);
    expect(before.offsetMinutes).toBe(change.offsetBeforeMin);
    expect(after.offsetMinutes).toBe(change.offsetAfterMin);
    expect(`${before.date}T${before.time}`).toBe(change.localBefore.slice(0, 16));
    expect(`${after.date}T${after.time}`).toBe(change.localAfter.slice(0, 16));
  });

  test.each(zones)('%s changes at no other hour of the two years', (zone, list) => {
    const found: string[] = [];
    const hour = 3_600_000;
    const end = Date.UTC(2028, 0, 1);
    let offset = offsetMinutesAt(Date.UTC(2026, 0, 1), zone);
    for (let ms = Date.UTC(2026, 0, 1); ms < end; ms += hour / 2) {
      const now = offsetMinutesAt(ms, zone);
      if (now !== offset) found.push(new Date(ms).toISOString().replace('.000', ''));
      offset = now;
    }
    expect(found).toEqual(list.map(({ utc }) => utc));
  });
});

test.each(data.permanentChanges.values)(
  '$zone no longer changes its clocks: $instant is $local',
  (fact) => {
    expect(toLocal(new Date(fact.instant), fact.zone).time).toBe(fact.local);
  },
);

test.each(data.unusualTimes.values)(
  'RFC 5545 reads $date $time in New York as $instant',
  (fact) => {
    expect(fromLocal(fact.date, fact.time, data.unusualTimes.zone).toISOString()).toBe(
      fact.instant,
    );
  },
);
