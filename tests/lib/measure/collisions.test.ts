import { describe, expect, it } from 'vitest';
import { type BoxOnWall, collisions, type WallFeature } from '@/lib/measure/collisions';
import { swingsBesideWall } from '@/lib/measure/swing-clearance';

const feature = (more: Partial<WallFeature>): WallFeature => ({
  readingId: 'feature',
  kind: 'outlet',
  x0Mm: 590,
  x1Mm: 660,
  z0Mm: 1_100,
  z1Mm: 1_210,
  projectionMm: 0,
  swing: 'none',
  ...more,
});
const box = (more: Partial<BoxOnWall>): BoxOnWall => ({
  unitId: 'unit',
  name: 'W60',
  kind: 'wall',
  x0Mm: 0,
  x1Mm: 600,
  z0Mm: 1_000,
  z1Mm: 1_720,
  depthMm: 350,
  gableMm: 18,
  ...more,
});

describe('what is on the wall and in the way', () => {
  it('finds an outlet in a gable, with the overlap', () => {
    const [found] = collisions([feature({})], [box({})], []);
    expect(found).toMatchObject({ what: 'in-gable', overlapMm: 10, unitId: 'unit', xMm: 595 });
    expect(found?.words).toMatch(/outlet is in the gable of W60 by 10 mm/);
  });

  it('lets an outlet be inside an open box, but not behind drawers', () => {
    const inside = feature({ x0Mm: 200, x1Mm: 270 });
    expect(collisions([inside], [box({})], [])).toEqual([]);
    expect(collisions([inside], [box({ kind: 'drawers' })], [])[0]?.what).toBe('in-drawers');
  });

  it('lets what merely touches be', () => {
    expect(collisions([feature({ x0Mm: 600, x1Mm: 670 })], [box({})], [])).toEqual([]);
    expect(collisions([feature({ z0Mm: 890, z1Mm: 1_000 })], [box({})], [])).toEqual([]);
  });

  it('finds a pipe in a filler', () => {
    const filler = { end: 'right' as const, x0Mm: 600, x1Mm: 640, z0Mm: 100, z1Mm: 870 };
    const pipe = feature({ kind: 'pipe', x0Mm: 610, x1Mm: 625, z0Mm: 0, z1Mm: 400 });
    expect(collisions([pipe], [], [filler])).toMatchObject([{ what: 'in-filler', overlapMm: 15 }]);
  });

  it('finds trim under a unit and a radiator covered by one', () => {
    const window = feature({ kind: 'window', x0Mm: 560, x1Mm: 1_500, z0Mm: 1_000, z1Mm: 2_100 });
    expect(collisions([window], [box({})], [])[0]).toMatchObject({
      what: 'trim-under-unit',
      overlapMm: 40,
    });
    const radiator = feature({ kind: 'radiator', x0Mm: 100, x1Mm: 500, z0Mm: 1_100, z1Mm: 1_500 });
    expect(collisions([radiator], [box({})], [])[0]?.what).toBe('covered');
  });

  it('finds a casement that swings against a unit beside its hinge, and not one beside its latch', () => {
    const casement = (swing: WallFeature['swing']) =>
      feature({ kind: 'window', x0Mm: 700, x1Mm: 1_200, z0Mm: 1_000, z1Mm: 2_100, swing });
    expect(collisions([casement('in-left')], [box({})], [])[0]).toMatchObject({
      what: 'swing-meets-unit',
      overlapMm: 350,
    });
    expect(collisions([casement('in-right')], [box({})], [])).toEqual([]);
    expect(collisions([casement('out-left')], [box({})], [])).toEqual([]);
  });

  it('says when a refrigerator beside a wall cannot open', () => {
    const end = {
      unitId: 'f',
      name: 'Refrigerator',
      kind: 'refrigerator' as const,
      casingProjectionMm: 0,
      room: { value: 40, u: 1, from: ['a'] },
    };
    const [short] = swingsBesideWall([end]);
    expect(short?.neededMm).toBeCloseTo(76.2, 9);
    expect(short?.shortMm).toBeCloseTo(38.2, 9);
    expect(swingsBesideWall([{ ...end, room: { value: 80, u: 1, from: [] } }])).toEqual([]);
    expect(swingsBesideWall([{ ...end, kind: 'base' }])).toEqual([]);
  });

  it('counts the casing beside drawers', () => {
    const [short] = swingsBesideWall([
      {
        unitId: 'd',
        name: '',
        kind: 'drawers',
        casingProjectionMm: 40,
        room: { value: 50, u: 0, from: [] },
      },
    ]);
    expect(short?.neededMm).toBeCloseTo(52.7, 9);
  });
});
