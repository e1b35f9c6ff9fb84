import { describe, expect, it } from 'vitest';
import { drawElevation } from '@/lib/drawing/elevation';
import { drawPlan } from '@/lib/drawing/plan';
import type { Drawing, DrawnPart, DrawnText, Layer, Point, Shape } from '@/lib/drawing/shape';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { crookedKitchen } from '../../help/crooked-kitchen';

const rules = defaultShopRules('US').fit;

function sourceOf(kitchen = crookedKitchen()) {
  return { ...kitchen, rules, fit: fitRoom(kitchen.wallBook, kitchen.runs, rules) };
}
const crooked = sourceOf();
const [wallA, wallB] = crooked.wallBook.room.chains[0]?.walls ?? [];
if (!wallA || !wallB) throw new Error('the kitchen is not whole');

type Plain = Exclude<Shape, DrawnPart>;
function flat(shapes: readonly Shape[]): Plain[] {
  return shapes.flatMap((shape) => (shape.kind === 'part' ? flat(shape.shapes) : [shape]));
}
const words = (drawing: Drawing) =>
  flat(drawing.shapes)
    .filter((shape): shape is DrawnText => shape.kind === 'text')
    .map(({ spans }) => spans.map((span) => span.words).join(''));
const onLayer = (drawing: Drawing, layer: Layer) =>
  flat(drawing.shapes).filter((shape) => 'layer' in shape && shape.layer === layer);
function places(drawing: Drawing): Point[] {
  return flat(drawing.shapes).flatMap((shape) => {
    if (shape.kind === 'text') return [shape.at];
    return shape.kind === 'circle' ? [shape.centre] : [...shape.points];
  });
}
function expectWhole(drawing: Drawing) {
  const { left, top, width, height } = drawing.bounds;
  for (const [x, y] of places(drawing)) {
    expect(Number.isFinite(x) && Number.isFinite(y)).toBe(true);
    expect(x).toBeGreaterThanOrEqual(left);
    expect(x).toBeLessThanOrEqual(left + width);
    expect(y).toBeGreaterThanOrEqual(top);
    expect(y).toBeLessThanOrEqual(top + height);
  }
}

describe('drawPlan', () => {
  const plan = drawPlan(crooked);

  it('makes each wall a part that can be touched, named with its length', () => {
    const walls = plan.shapes.filter(
      (shape): shape is DrawnPart => shape.kind === 'part' && shape.part.kind === 'wall',
    );
    expect(walls.map(({ part }) => part.id)).toEqual(
      crooked.wallBook.room.chains[0]?.walls.map(({ id }) => id),
    );
    expect(walls[0]?.label).toMatch(/^Wall A, 141 \d/);
  });

  it('says each corner’s angle and how far it is open or closed', () => {
    expect(words(plan)).toEqual(
      expect.arrayContaining(['91.2°', 'open 1.2°', '88.5°', 'closed 1.5°']),
    );
  });

  it('says how much larger it draws what is out of true, and draws it so', () => {
    expect(plan.exaggeration).toBe(10);
    const nearlyTrue = drawPlan(sourceOf(crookedKitchen({ crookedness: 0.1 })));
    expect(nearlyTrue.exaggeration).toBe(20);
    expect(onLayer(plan, 'square').length).toBeGreaterThan(onLayer(nearlyTrue, 'square').length);
  });

  it('rings the misread length and says by how much', () => {
    const misread = drawPlan(sourceOf(crookedKitchen({ misreadMm: 25.4 })));
    expect(onLayer(plan, 'suspect')).toHaveLength(0);
    expect(onLayer(misread, 'suspect').length).toBeGreaterThan(0);
    expect(words(misread).some((line) => line.endsWith('too long?'))).toBe(true);
  });

  it('stands the ring on the wall it doubts, not in the air beside it', () => {
    const source = sourceOf(crookedKitchen({ misreadMm: 25.4 }));
    const misread = drawPlan(source);
    const [ring] = onLayer(misread, 'suspect');
    const wallC = source.wallBook.room.chains[0]?.walls[2];
    const part = misread.shapes.find(
      (shape): shape is DrawnPart => shape.kind === 'part' && shape.part.id === wallC?.id,
    );
    const body = flat(part?.shapes ?? []).find(
      (shape) => shape.kind === 'area' && shape.layer === 'wall-body',
    );
    if (ring?.kind !== 'circle' || body?.kind !== 'area') throw new Error('no ring, or no wall');
    const [x, y] = ring.centre;
    const [xs, ys] = [body.points.map(([px]) => px), body.points.map(([, py]) => py)];
    expect(x).toBeGreaterThan(Math.min(...xs));
    expect(x).toBeLessThan(Math.max(...xs));
    expect(y).toBeGreaterThanOrEqual(Math.min(...ys));
    expect(y).toBeLessThanOrEqual(Math.max(...ys));
  });

  it('draws boxes, hung boxes, diagonals and the high point', () => {
    expect(onLayer(plan, 'unit')).toHaveLength(8);
    expect(onLayer(plan, 'unit-upper')).toHaveLength(4);
    expect(onLayer(plan, 'diagonal')).toHaveLength(2);
    expect(onLayer(plan, 'high-point')).toHaveLength(1);
  });

  it('keeps every place on the sheet, read or not, with runs or without', () => {
    expectWhole(plan);
    const { wallBook } = crookedKitchen();
    const unread = { wallBook: { ...wallBook, readings: [] }, runs: [] };
    expectWhole(drawPlan(sourceOf(unread)));
    const noWalls = { ...unread.wallBook, room: { ...wallBook.room, chains: [] } };
    expectWhole(drawPlan(sourceOf({ wallBook: noWalls, runs: [] })));
  });

  it('lays the chains of a galley apart where nothing ties them', () => {
    const { wallBook } = crookedKitchen();
    const walls = wallBook.room.chains[0]?.walls ?? [];
    const chains = walls.slice(0, 2).map((wall) => ({
      closed: false,
      walls: [{ ...wall, leftCornerDeg: null }],
    }));
    const galley = { ...wallBook, readings: [], room: { ...wallBook.room, chains } };
    const drawn = drawPlan(sourceOf({ wallBook: galley, runs: [] }));
    expectWhole(drawn);
    expect(drawn.bounds.height).toBeGreaterThan(400);
  });
});

describe('drawElevation', () => {
  const elevation = drawElevation({ ...crooked, wallId: wallA.id });
  if (!elevation) throw new Error('wall A was not drawn');

  it('is null for a wall that the room has not', () => {
    expect(drawElevation({ ...crooked, wallId: crooked.wallBook.room.id })).toBeNull();
  });

  it('draws the boxes of every run on the wall, studs, kick, counter and what is on the wall', () => {
    expect(onLayer(elevation, 'unit').length + onLayer(elevation, 'appliance').length).toBe(9);
    expect(onLayer(elevation, 'counter')).toHaveLength(1);
    expect(onLayer(elevation, 'kick')).toHaveLength(1);
    expect(onLayer(elevation, 'stud').length).toBeGreaterThanOrEqual(6);
    expect(words(elevation)).toEqual(
      expect.arrayContaining(['outlet', 'water', 'drain', 'high point', 'datum', '21', 'drawers']),
    );
  });

  it('keeps the ring of a height over the drawn wall at the wall’s top', () => {
    const kitchen = crookedKitchen({ misreadMm: 25.4 });
    const wallC = kitchen.wallBook.room.chains[0]?.walls[2];
    const readings = kitchen.wallBook.readings.filter(({ kind }) => kind !== 'ceiling');
    const source = sourceOf({ ...kitchen, wallBook: { ...kitchen.wallBook, readings } });
    const suspect = source.fit.closure.suspect?.readings[0]?.readingIds[0];
    const lifted = readings.map((reading) =>
      reading.id === suspect && reading.kind === 'length' ? { ...reading, zMm: 6_000 } : reading,
    );
    const wallBook = { ...source.wallBook, readings: lifted };
    const drawn = drawElevation({ ...source, wallBook, wallId: wallC?.id ?? '' });
    const rings = drawn ? onLayer(drawn, 'suspect') : [];
    expect(rings.length).toBeGreaterThan(0);
    for (const shape of rings) {
      if (shape.kind === 'circle') expect(shape.centre[1]).toBeGreaterThanOrEqual(0);
    }
  });

  it('never draws a filler’s taper across the box beside it', () => {
    for (const crookedness of [0.1, 0.5, 1, 1.6]) {
      const source = sourceOf(crookedKitchen({ crookedness }));
      const drawn = drawElevation({ ...source, wallId: wallA.id });
      for (const shape of drawn ? onLayer(drawn, 'filler') : []) {
        if (shape.kind !== 'area') continue;
        const xs = shape.points.map(([x]) => x);
        const inside = shape.points[0]?.[0] ?? 0;
        const isOneSided =
          xs.every((x) => x <= inside + 0.01) || xs.every((x) => x >= inside - 0.01);
        expect(isOneSided).toBe(true);
      }
    }
  });

  it('keeps every place on the sheet, on walls with runs and without', () => {
    expectWhole(elevation);
    const bare = drawElevation({ ...crooked, wallId: wallB.id });
    if (!bare) throw new Error('wall B was not drawn');
    expectWhole(bare);
    const { wallBook, runs } = crookedKitchen();
    const unread = sourceOf({ wallBook: { ...wallBook, readings: [] }, runs });
    const drawn = drawElevation({ ...unread, wallId: wallA.id });
    if (!drawn) throw new Error('wall A was not drawn');
    expectWhole(drawn);
  });
});
