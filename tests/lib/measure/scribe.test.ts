import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type EdgePlace, type ScribeInput, scribeAllowance } from '@/lib/measure/scribe';
import { monteCarlo, seeded } from './seeded';

const rules = { marginMm: 3, leastMm: 6, stepMm: 1 };
const edge = (gaps: number[], u = 0.5): EdgePlace[] =>
  gaps.map((gapMm, at) => ({ id: `e${at}`, atMm: at * 400, gapMm, u }));
const scribe = (places: EdgePlace[], more: Partial<ScribeInput> = {}) =>
  scribeAllowance({ places, uShared: 0, held: 'by-size', rules, ...more });

describe('scribeAllowance', () => {
  it('adds out of true, U and the shop’s margin, and rounds up', () => {
    const { value } = scribe(edge([38, 41, 40]));
    expect(value?.outOfTrue.value).toBe(3);
    expect(value?.unrounded.value).toBeCloseTo(7, 12);
    expect(value?.roundedUpMm).toBe(7);
    expect(value).toMatchObject({
      governedBy: 'edge',
      least: { id: 'e0' },
      greatest: { id: 'e1' },
    });
    expect(scribe(edge([38, 41.2, 40])).value?.roundedUpMm).toBe(8);
  });

  it('makes least + allowance the greatest + U + margin of a piece cut to size', () => {
    const gap = fc.double({ min: 0, max: 80, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(gap, { minLength: 1, maxLength: 8 }),
        fc.double({ min: 0, max: 2, noNaN: true }),
        (gaps, uShared) => {
          const { value } = scribe(edge(gaps), { uShared, rules: { ...rules, leastMm: 0 } });
          const blank = Math.min(...gaps) + (value?.unrounded.value ?? Number.NaN);
          expect(blank).toBeCloseTo(Math.max(...gaps) + 2 * Math.hypot(0.5, uShared) + 3, 9);
        },
      ),
    );
  }, 30_000);

  it('never goes under the least scribe', () => {
    const { value } = scribe(edge([40, 40, 40], 0.1));
    expect(value?.unrounded.value).toBe(6);
    expect(value?.governedBy).toBe('least-scribe');
  });

  it('counts both ends of the spread for a piece drawn at its first contact', () => {
    const { value } = scribe(edge([0, 4]), { held: 'at-contact', uShared: 2 });
    expect(value?.unrounded.value).toBeCloseTo(4 + 2 * Math.SQRT2 * 0.5 + 3, 9);
    const random = seeded(2);
    const drawn = () =>
      scribe(edge([0 + 0.5 * random.normal(), 4 + 0.5 * random.normal()])).value?.outOfTrue.value ??
      Number.NaN;
    expect(monteCarlo(5_000, drawn).sd / (value?.outOfTrue.u ?? 0)).toBeCloseTo(1, 1);
  }, 30_000);

  it('covers the true greatest gap in at least 97 of 100 edges, margin aside', () => {
    const random = seeded(12);
    let covered = 0;
    for (let run = 0; run < 2_000; run += 1) {
      const truth = Array.from({ length: 5 }, () => random.between(30, 40));
      const shared = 0.8 * random.normal();
      const read = truth.map((gap) => gap + shared + 0.4 * random.normal());
      const { value } = scribe(edge(read, 0.4), {
        uShared: 0.8,
        rules: { marginMm: 0, leastMm: 0, stepMm: 1 },
      });
      if (Math.min(...read) + (value?.unrounded.value ?? 0) >= Math.max(...truth)) covered += 1;
    }
    expect(covered / 2_000).toBeGreaterThan(0.97);
  });

  it('refuses an edge nobody read, readings that are none, and rules that are none', () => {
    expect(scribe([]).problems[0]?.code).toBe('edge-not-read');
    expect(scribe(edge([Number.NaN])).problems[0]?.about).toEqual(['e0']);
    expect(scribe(edge([1]), { uShared: Number.NaN }).problems[0]?.code).toBe(
      'uncertainty-not-known',
    );
    expect(scribe(edge([1]), { rules: { ...rules, stepMm: 0 } }).problems[0]?.code).toBe(
      'rules-not-known',
    );
    expect(scribe(edge([1]), { rules: { ...rules, marginMm: Number.NaN } }).problems[0]?.code).toBe(
      'rules-not-known',
    );
  });
});
