import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { meanOf, type Repeat } from '@/lib/measure/mean-of';
import { monteCarlo, seeded } from './seeded';

const repeat = (id: string, value: number, more: Partial<Repeat> = {}): Repeat => ({
  id,
  value,
  uOwn: 0.4,
  uCommon: 0.7,
  toolId: 'tape',
  ...more,
});

describe('meanOf', () => {
  it('averages the readings and keeps the tool’s own error whole', () => {
    const { value, problems } = meanOf(
      [repeat('a', 2414), repeat('b', 2415), repeat('c', 2415)],
      2,
    );
    expect(value?.value).toBeCloseTo(2414.6667, 4);
    expect(value?.u).toBeCloseTo(Math.sqrt(0.49 + 0.16 / 3), 9);
    expect(value?.from).toEqual(['a', 'b', 'c']);
    expect(problems).toEqual([]);
  });

  it('states the spread that repeats of one tool and of two tools have', () => {
    const random = seeded(4);
    const drawn = () => {
      const [tape, laser] = [0.7 * random.normal(), 0.3 * random.normal()];
      return [
        repeat('a', 1000 + tape + 0.4 * random.normal()),
        repeat('b', 1000 + tape + 0.4 * random.normal()),
        repeat('c', 1000 + laser + 0.6 * random.normal(), {
          toolId: 'laser',
          uCommon: 0.3,
          uOwn: 0.6,
        }),
      ];
    };
    const stated = meanOf(drawn(), 50).value?.u ?? 0;
    const { mean, sd } = monteCarlo(20_000, () => meanOf(drawn(), 50).value?.value ?? Number.NaN);
    expect(mean).toBeCloseTo(1000, 1);
    expect(sd / stated).toBeGreaterThan(0.97);
    expect(sd / stated).toBeLessThan(1.03);
  }, 30_000);

  it('reports readings that disagree, names the two, and is no surer for their number', () => {
    const readings = [repeat('a', 2414), repeat('b', 2414.5), repeat('slip', 2439.4)];
    const { value, problems } = meanOf(readings, 2);
    expect(problems).toMatchObject([
      { code: 'repeats-disagree', severity: 'warning', about: ['a', 'slip'] },
    ]);
    expect(value?.U).toBeGreaterThan(12);
  });

  it('lets the shop’s agreement rule stand where the tool alone would be stricter', () => {
    const readings = [repeat('a', 2414), repeat('b', 2415.9)];
    expect(meanOf(readings, 2).problems).toEqual([]);
    expect(meanOf(readings, 1).problems).toHaveLength(1);
  });

  it('never makes U larger by a reading that agrees', () => {
    const parts = fc.record({
      uOwn: fc.double({ min: 0.05, max: 2, noNaN: true }),
      uCommon: fc.double({ min: 0, max: 2, noNaN: true }),
      toolId: fc.constantFrom('tape', 'laser'),
    });
    fc.assert(
      fc.property(fc.array(parts, { minLength: 1, maxLength: 6 }), parts, (known, more) => {
        const oneTool = (all: typeof known) =>
          all.map(({ uOwn, toolId }, at) =>
            repeat(`${at}`, 100, { uOwn, toolId, uCommon: toolId === 'tape' ? 0.7 : 0.5 }),
          );
        const before = meanOf(oneTool(known), 2).value?.u ?? 0;
        const after = meanOf(oneTool([...known, more]), 2).value?.u ?? Infinity;
        expect(after).toBeLessThanOrEqual(before + 1e-12);
      }),
    );
  }, 30_000);

  it('refuses nothing and a reading that is no number', () => {
    expect(meanOf([], 2).problems[0]?.code).toBe('nothing-read');
    expect(meanOf([repeat('bad', Number.NaN)], 2).problems[0]).toMatchObject({
      code: 'reading-not-a-number',
      about: ['bad'],
    });
    expect(meanOf([repeat('bad', 1, { uOwn: -1 })], 2).problems[0]?.code).toBe(
      'uncertainty-not-known',
    );
  });
});
