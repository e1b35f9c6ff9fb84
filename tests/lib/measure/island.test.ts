import { describe, expect, it } from 'vitest';
import { type IslandInput, islandPlacement } from '@/lib/measure/island';
import { edgeDistance } from '@/lib/measure/plan-shapes';

const exact = (value: number) => ({ value, u: 0, from: [] });
const drop = (id: string, xMm: number, yMm: number, valueMm: number) => ({
  id,
  xMm,
  yMm,
  valueMm,
  u: 0.5,
  setUpId: 'line',
});

const input = (more: Partial<IslandInput> = {}): IslandInput => ({
  setLine: { origin: { xMm: 0, yMm: 0 }, headingDeg: 0 },
  offset: { value: 1_700, u: 1, from: ['offset'] },
  along: { value: 600, u: 2, from: ['along'] },
  lengthMm: 1_800,
  depthMm: 900,
  opensMm: { back: 0, right: 0, front: 600, left: 0 },
  joined: null,
  faces: [
    {
      id: 'run',
      name: 'Sink run',
      line: { from: { xMm: 0, yMm: 600 }, to: { xMm: 3_000, yMm: 600 } },
      u: 1,
      opensMm: 570,
    },
  ],
  floor: [
    drop('back left', 600, 1_700, 1_000),
    drop('back right', 2_400, 1_700, 1_004),
    drop('front right', 2_400, 2_600, 1_010),
    drop('front left', 600, 2_600, 1_002),
    drop('between', 1_500, 2_150, 998),
  ],
  nominalKickMm: 100,
  datumDrop: null,
  legs: { minMm: 90, maxMm: 110 },
  uLevel: 0,
  builtAngleDeg: 90,
  sink: { alongMm: 900, depthMm: 450 },
  services: [{ id: 'w', kind: 'water', xMm: 1_480, yMm: 2_160, u: 3 }],
  ...more,
});

describe('placing an island', () => {
  it('leaves the aisle to the fronts it faces, closed and with doors open', () => {
    const { value } = islandPlacement(input());
    expect(value?.aisles).toHaveLength(1);
    expect(value?.leastAisle).toMatchObject({ faceId: 'run', side: 'back' });
    expect(value?.leastAisle?.clear.value).toBeCloseTo(1_100, 9);
    expect(value?.leastAisle?.clear.u).toBeCloseTo(Math.SQRT2, 9);
    expect(value?.leastAisle?.clearOneOpen.value).toBeCloseTo(530, 9);
    expect(value?.leastAisle?.clearBothOpen.value).toBeCloseTo(530, 9);
  });

  it('gives kick heights at the corners and at each reading between, from its own high point', () => {
    const { value } = islandPlacement(input());
    expect(value?.kicks.map(({ height }) => height.value)).toEqual([102, 106, 112, 104, 100]);
    expect(value?.kicks.map(({ legs }) => legs)).toEqual([
      'within',
      'within',
      'too-high',
      'within',
      'within',
    ]);
    expect(islandPlacement(input()).problems[0]?.code).toBe('kick-out-of-legs');
  });

  it('takes its datum from a run where they share one', () => {
    const { value } = islandPlacement(
      input({ datumDrop: { value: 1_000, u: 0.5, from: ['run'] } }),
    );
    expect(value?.kicks[0]?.height.value).toBe(100);
    expect(value?.kicks[0]?.height.u).toBeCloseTo(Math.hypot(0.5, 0.5), 9);
  });

  it('stands turned with its set line, its corners in the plan', () => {
    const turned = input({ setLine: { origin: { xMm: 5_000, yMm: 100 }, headingDeg: 90 } });
    const { value } = islandPlacement(turned);
    expect(value?.corners[0]?.xMm).toBeCloseTo(5_000 - 1_700, 9);
    expect(value?.corners[0]?.yMm).toBeCloseTo(100 + 600, 9);
  });

  it('measures the sink from the pipes', () => {
    const [water] = islandPlacement(input()).value?.services ?? [];
    expect(water?.alongMm.value).toBe(-20);
    expect(water?.acrossMm.value).toBe(10);
    expect(water?.alongMm.u).toBeCloseTo(Math.hypot(3, 2), 9);
  });

  it('has no aisle and two fewer corners where a peninsula is joined', () => {
    const { value } = islandPlacement(input({ joined: 'back' }));
    expect(value?.aisles).toEqual([]);
    expect(value?.leastAisle).toBeNull();
    expect(value?.exposedCorners).toBe(2);
    expect(value?.kickMitre.saw.value).toBe(45);
  });

  it('does not count a face that lies only round its corner', () => {
    const beside = {
      id: 'beside',
      name: 'Tall units',
      line: { from: { xMm: 3_200, yMm: 0 }, to: { xMm: 3_200, yMm: 3_000 } },
      u: 1,
      opensMm: 0,
    };
    const { value } = islandPlacement(input({ faces: [beside] }));
    expect(value?.aisles.map(({ side }) => side)).toEqual(['right']);
    expect(value?.leastAisle?.clear.value).toBeCloseTo(800, 9);
  });

  it('refuses an island without floor readings or size', () => {
    expect(islandPlacement(input({ floor: [] })).problems[0]?.code).toBe('floor-not-read');
    expect(islandPlacement(input({ lengthMm: 0 })).problems[0]?.code).toBe('size-impossible');
    expect(islandPlacement(input({ offset: exact(Number.NaN) })).value).toBeNull();
  });
});

describe('distances in plan', () => {
  const edge = (fx: number, fy: number, tx: number, ty: number) => ({
    from: { xMm: fx, yMm: fy },
    to: { xMm: tx, yMm: ty },
  });

  it('is nothing where edges cross or merely touch', () => {
    expect(edgeDistance(edge(0, 0, 10, 10), edge(0, 10, 10, 0)).distanceMm).toBe(0);
    expect(edgeDistance(edge(0, 0, 10, 0), edge(10, 0, 10, 10)).distanceMm).toBe(0);
  });

  it('is taken from an end to the nearest place', () => {
    expect(edgeDistance(edge(0, 0, 10, 0), edge(5, 3, 5, 9))).toMatchObject({
      distanceMm: 3,
      on: { xMm: 5, yMm: 0 },
    });
    expect(edgeDistance(edge(0, 0, 10, 0), edge(13, 4, 20, 4)).distanceMm).toBe(5);
  });
});
