import { describe, expect, it } from 'vitest';
import { figure } from '@/lib/measure/figure';
import type { LevelPoint } from '@/lib/measure/floor-surface';
import { heightCheck } from '@/lib/measure/height-check';
import { counterSteps, sillOverCounter, upperGap } from '@/lib/measure/over-counter';
import { type TopGapInput, topGap } from '@/lib/measure/top-gap';
import { type UnderCounterInput, underCounterHeight } from '@/lib/measure/under-counter';

const level = (xMm: number, yMm: number, valueMm: number): LevelPoint => ({
  id: `l${xMm}`,
  xMm,
  yMm,
  valueMm,
  u: 0.4,
  setUpId: 'line',
});

describe('underCounterHeight', () => {
  const input = (more: Partial<UnderCounterInput> = {}): UnderCounterInput => ({
    unitId: 'dishwasher',
    drops: [level(0, 0, 1002), level(600, 0, 1005)],
    footprint: { x0Mm: 0, x1Mm: 600, y0Mm: 0, y1Mm: 0 },
    undersideMm: 870,
    datumDrop: figure(1000, 0.3, ['high']),
    datumSetUpId: 'line',
    floorToCome: { valueMm: 0, u: 0 },
    needMm: 868,
    uLevel: 0,
    ...more,
  });

  it('is least where the floor is highest under the appliance', () => {
    const { value } = underCounterHeight(input());
    expect(value?.height.value).toBeCloseTo(872, 9);
    expect(value?.height.u).toBeCloseTo(0.5, 9);
    expect(value?.height.from).toEqual(['l0', 'high']);
    expect(value?.verdict).toBe('enough');
  });

  it('counts from the finished floor, also where it is still to be laid', () => {
    const { value } = underCounterHeight(input({ floorToCome: { valueMm: 12, u: 0 } }));
    expect(value?.height.value).toBeCloseTo(860, 9);
    expect(value?.verdict).toBe('too-low');
    expect(value?.margin.value).toBeCloseTo(-8, 9);
  });

  it('refuses another level line than the datum’s, no floor, and readings that are none', () => {
    const code = (more: Partial<UnderCounterInput>) =>
      underCounterHeight(input(more)).problems[0]?.code;
    expect(code({ datumSetUpId: 'other' })).toBe('set-ups-mixed');
    expect(code({ drops: [] })).toBe('floor-not-read');
    expect(code({ drops: [level(0, 0, Number.NaN)] })).toBe('reading-not-a-number');
    expect(code({ footprint: { x0Mm: 0, x1Mm: 900, y0Mm: 0, y1Mm: 0 } })).toBe('floor-carried-on');
  });
});

describe('topGap', () => {
  const input = (more: Partial<TopGapInput> = {}): TopGapInput => ({
    runId: 'uppers',
    rises: [level(0, 300, 1440), level(900, 300, 1436), level(1800, 300, 1447)],
    x0Mm: 0,
    x1Mm: 1800,
    yMm: 300,
    topMm: 2400,
    datumDrop: figure(1000, 0.3, ['high']),
    datumSetUpId: 'line',
    uLevel: 0,
    scribe: { marginMm: 3, leastMm: 6, stepMm: 1 },
    ...more,
  });

  it('gives the gap at both ends, the least between them, and the blank that covers it', () => {
    const { value, problems } = topGap(input());
    expect(problems).toEqual([]);
    expect([value?.left.value, value?.least.value, value?.right.value]).toEqual([
      expect.closeTo(40, 9),
      expect.closeTo(36, 9),
      expect.closeTo(47, 9),
    ]);
    expect(value?.blankMm).toBe(Math.ceil(47 + 2 * 0.5 + 3));
    expect(value?.left.u).toBeCloseTo(0.5, 9);
  });

  it('goes between readings to the ends of the run', () => {
    expect(topGap(input({ x0Mm: 450, x1Mm: 1350 })).value?.left.value).toBeCloseTo(38, 9);
  });

  it('warns when the boxes may not go under, and when the ceiling was not read there', () => {
    expect(topGap(input({ topMm: 2436 })).problems).toMatchObject([
      { code: 'ceiling-too-low', severity: 'warning' },
    ]);
    expect(topGap(input({ x1Mm: 2400 })).problems).toMatchObject([
      { code: 'ceiling-carried-on', severity: 'warning' },
    ]);
  });

  it('refuses what it cannot work with', () => {
    expect(topGap(input({ rises: [] })).problems[0]?.code).toBe('ceiling-not-read');
    expect(topGap(input({ datumSetUpId: 'other' })).problems[0]?.code).toBe('set-ups-mixed');
    expect(topGap(input({ topMm: Number.NaN })).problems[0]?.code).toBe('reading-not-a-number');
    expect(
      topGap(input({ scribe: { marginMm: 0, leastMm: 0, stepMm: -1 } })).problems[0]?.code,
    ).toBe('rules-not-known');
  });
});

describe('what hangs over a counter', () => {
  const old = [
    { id: 'left', topMm: figure(914, 0.5, ['a']) },
    { id: 'right', topMm: figure(917, 0.5, ['b']) },
  ];

  it('takes the higher end of an old counter for the gap to the uppers', () => {
    const { value } = upperGap(old, 1372, 457);
    expect(value?.height).toMatchObject({ value: 455, from: ['b'] });
    expect(value?.verdict).toBe('too-low');
    expect(upperGap([], 1372, 457).problems[0]?.code).toBe('counter-not-read');
    expect(upperGap(old, Number.NaN, 457).problems[0]?.code).toBe('counter-not-read');
  });

  it('holds a window sill against counter and splash', () => {
    const { value } = sillOverCounter(old, 100, figure(1018, 1, ['sill']));
    expect(value?.margin.value).toBeCloseTo(1, 9);
    expect(value?.verdict).toBe('in-doubt');
    expect(sillOverCounter(old, 100, figure(1030, 1, ['sill'])).value?.verdict).toBe('enough');
    expect(sillOverCounter([], 100, figure(1030, 1, [])).value).toBeNull();
  });

  it('checks a new counter at both ends of the old one', () => {
    const steps = counterSteps(
      figure(914, 0.5, ['new']),
      [
        old[0]!,
        { id: 'right', topMm: figure(909, 0.5, ['b']) },
        { id: 'middle', topMm: figure(912, 0.5, ['c']) },
      ],
      2,
    );
    expect(steps.value?.map(({ id, verdict }) => [id, verdict])).toEqual([
      ['left', 'flush'],
      ['right', 'stepped'],
      ['middle', 'in-doubt'],
    ]);
    expect(counterSteps(figure(914, 0.5, []), [], 2).problems[0]?.code).toBe('counter-not-read');
  });

  it('is in doubt either way when the margin is smaller than its U', () => {
    expect(heightCheck(figure(865, 1, []), 864).verdict).toBe('in-doubt');
    expect(heightCheck(figure(863, 1, []), 864).verdict).toBe('in-doubt');
    expect(heightCheck(figure(866, 1, []), 864).verdict).toBe('enough');
    expect(heightCheck(figure(862, 1, []), 864).verdict).toBe('too-low');
  });
});
