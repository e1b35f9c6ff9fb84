import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { backUpName, backUpTakenAt } from '@/lib/keeping/back-up-name';
import { backUpsToKeep } from '@/lib/keeping/back-ups-to-keep';

const hour = 3_600_000;
const now = new Date('2026-12-01T16:50:00Z');
const hoursAgo = (hours: number) => new Date(now.getTime() - hours * hour);

describe('copies of the database that are kept', () => {
  it('keeps each hour of a day, one a day for a fortnight and one a week for eight weeks', () => {
    const hourlyForAYear = Array.from({ length: 365 * 24 }, (_, hours) => hoursAgo(hours));
    const kept = backUpsToKeep(hourlyForAYear, now);
    const ages = kept.map((taken) => (now.getTime() - taken.getTime()) / hour);
    expect(ages.filter((age) => age <= 24)).toHaveLength(25);
    // Today's and yesterday's last are among the 25.
    expect(ages.filter((age) => age > 24 && age <= 14 * 24)).toHaveLength(13);
    expect(ages.filter((age) => age > 14 * 24)).toHaveLength(6);
    expect(Math.max(...ages)).toBeGreaterThan(7 * 7 * 24);
    expect(Math.max(...ages)).toBeLessThanOrEqual(8 * 7 * 24);
  });

  it('keeps the newest however old it is', () => {
    expect(backUpsToKeep([hoursAgo(9_000), hoursAgo(9_001)], now)).toEqual([hoursAgo(9_000)]);
  });

  it('judges nothing that lies ahead of a clock that was set back', () => {
    const ahead = [hoursAgo(-3), hoursAgo(-2), hoursAgo(0)];
    expect(backUpsToKeep(ahead, now)).toEqual(ahead);
  });

  it('is settled: what was kept once is kept when asked again', () => {
    const anyAges = fc.array(fc.integer({ min: 0, max: 2_000 }), { maxLength: 80 });
    fc.assert(
      fc.property(anyAges, (ages) => {
        const kept = backUpsToKeep(ages.map(hoursAgo), now);
        expect(backUpsToKeep(kept, now)).toEqual(kept);
      }),
    );
  });

  it('is named for its second, and read back from its name alone', () => {
    expect(backUpName(now)).toBe('setwell-2026-12-01T16-50-00Z.tar.gz');
    expect(backUpTakenAt(backUpName(now))).toEqual(now);
    expect(backUpTakenAt('setwell-2026-12-01T16-50-00Z.tar.gz.part')).toBeNull();
    expect(backUpTakenAt('setwell-2026-13-41T99-50-00Z.tar.gz')).toBeNull();
  });
});
