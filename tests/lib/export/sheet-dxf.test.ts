import DxfParser, { type ILineEntity, type ILwpolylineEntity } from 'dxf-parser';
import { describe, expect, it } from 'vitest';
import { sheetDxf } from '@/lib/export/sheet-dxf';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { crookedKitchen } from '../../help/crooked-kitchen';
import { releasedSheet } from '../../help/released-sheet';

/** Read by another library than the one that wrote it. */
function readBack(text: string) {
  const drawing = new DxfParser().parseSync(text);
  if (!drawing) throw new Error('the file was not read');
  return drawing;
}
type Place = { x: number; y: number };
type Drawn = { layer: string; closed: boolean; places: Place[] };

function lines(text: string): Drawn[] {
  return readBack(text).entities.flatMap((entity): Drawn[] => {
    if (entity.type === 'LINE') {
      return [{ layer: entity.layer, closed: false, places: (entity as ILineEntity).vertices }];
    }
    if (entity.type !== 'LWPOLYLINE') return [];
    const { vertices, shape } = entity as ILwpolylineEntity;
    return [{ layer: entity.layer, closed: shape, places: vertices }];
  });
}
const length = ([from, to]: Place[]) =>
  from && to ? Math.hypot(to.x - from.x, to.y - from.y) : Number.NaN;
const sides = ({ places }: Drawn) =>
  places.map((place, index) => length([place, places[(index + 1) % places.length] ?? place]));

const sheet = releasedSheet();
const text = sheetDxf(sheet);
const drawn = lines(text);
const on = (layer: string) => drawn.filter((one) => one.layer === layer);
/** The plan is drawn first and the elevations under it. */
const planUnits = on('Units').slice(0, 8);
const elevationUnits = on('Units').slice(8);

describe('sheetDxf', () => {
  it('is in millimetres, with layers named in plain words', () => {
    const { header, tables } = readBack(text);
    expect(header.$INSUNITS).toBe(4);
    expect(header.$MEASUREMENT).toBe(1);
    expect(Object.keys(tables.layer.layers)).toEqual(
      expect.arrayContaining(['Walls', 'Wall faces as read', 'Units', 'Fillers', 'Studs']),
    );
    expect(new Set(drawn.map(({ layer }) => layer)).has('0')).toBe(false);
  });

  it('draws each wall corner to corner at its adjusted length, within a thousandth of a mm', () => {
    const walls = on('Walls').filter(({ places }) => places.length === 2);
    expect(walls).toHaveLength(4);
    sheet.fit.walls.forEach((wall, index) => {
      expect(length(walls[index]?.places ?? [])).toBeCloseTo(wall.length?.value ?? Number.NaN, 3);
    });
  });

  it('turns each corner as adjusted, within a thousandth of a degree', () => {
    const walls = on('Walls').filter(({ places }) => places.length === 2);
    sheet.fit.corners.forEach((corner) => {
      const index = sheet.fit.walls.findIndex(({ wallId }) => wallId === corner.cornerWallId);
      const before = walls[(index + 3) % 4]?.places ?? [];
      const after = walls[index]?.places ?? [];
      const [a, b, c] = [before[0], after[0], after[1]];
      if (!a || !b || !c) throw new Error('a wall was not drawn');
      const arm = Math.atan2(a.y - b.y, a.x - b.x) - Math.atan2(c.y - b.y, c.x - b.x);
      const angle = ((-arm * 180) / Math.PI + 720) % 360;
      const inside = angle > 180 ? 360 - angle : angle;
      expect(Math.abs(inside - (corner.angle?.value ?? 0))).toBeLessThan(1e-3);
    });
  });

  it('shows the face of a wall as it was read, not larger', () => {
    const face = on('Wall faces as read')[0]?.places ?? [];
    const [from, to] = [face[0], face.at(-1)];
    if (!from || !to) throw new Error('wall A has no face');
    const wall = length([from, to]);
    const proud = face.map(
      ({ x, y }) => ((to.y - from.y) * (x - from.x) - (to.x - from.x) * (y - from.y)) / wall,
    );
    const row = sheet.fit.walls[0]?.rows.find(({ zMm }) => zMm === 914.4);
    const read = Math.abs(Math.min(...proud) - Math.max(...proud));
    expect(read).toBeCloseTo(row?.outOfStraight.value ?? Number.NaN, 1);
  });

  it('draws each box square and at its width and depth, in plan and elevation', () => {
    const boxes = sheet.fit.runs.flatMap((runFit) => {
      const run = sheet.runs.find(({ id }) => id === runFit.runId);
      return run && run.level !== 'wall' ? runFit.units.map((unit) => ({ run, unit })) : [];
    });
    expect(planUnits).toHaveLength(boxes.length);
    expect(elevationUnits).toHaveLength(boxes.length);
    boxes.forEach(({ run, unit }, index) => {
      const width = unit.rightMm - unit.leftMm;
      const [front = 0, side = 0] = sides(
        planUnits[index] ?? { layer: '', closed: true, places: [] },
      );
      expect(Math.abs(front - width)).toBeLessThan(1e-3);
      expect(Math.abs(side - run.carcassDepthMm)).toBeLessThan(1e-3);
      const places = planUnits[index]?.places ?? [];
      const across = length([places[0] ?? { x: 0, y: 0 }, places[2] ?? { x: 0, y: 0 }]);
      expect(Math.abs(across - Math.hypot(width, run.carcassDepthMm))).toBeLessThan(1e-3);
      const [foot = 0, upright = 0] = sides(
        elevationUnits[index] ?? { layer: '', closed: true, places: [] },
      );
      expect(Math.abs(foot - width)).toBeLessThan(1e-3);
      expect(Math.abs(upright - (run.z1Mm - run.z0Mm))).toBeLessThan(1e-3);
    });
  });

  it('gives each filler the taper of its face widths', () => {
    const elevations = on('Fillers').slice(on('Fillers').length / 2);
    const fillers = sheet.fit.runs.flatMap(({ left, right }) =>
      [left.filler, right.filler].flatMap((filler) => (filler ? [filler] : [])),
    );
    expect(elevations).toHaveLength(fillers.length);
    fillers.forEach((filler, index) => {
      const { places = [], closed } = elevations[index] ?? {};
      expect(closed).toBe(true);
      const xs = places.slice(2).map(({ x }) => Math.abs(x - (places[0]?.x ?? 0)));
      expect(xs).toHaveLength(filler.widths.length);
      filler.widths.forEach(({ width }, at) => {
        expect(Math.abs((xs[at] ?? 0) - width.value)).toBeLessThan(1e-3);
      });
    });
  });

  it('brings each kick down to the floor under its fronts', () => {
    const kicks = on('Kicks');
    const runs = sheet.fit.runs.filter(({ kicks: found }) => found !== null);
    expect(kicks).toHaveLength(runs.length);
    runs.forEach(({ kicks: found }, index) => {
      const ys = kicks[index]?.places.map(({ y }) => y) ?? [];
      const front = found?.corners.filter(({ corner }) => corner.startsWith('front')) ?? [];
      const greatest = Math.max(...front.map(({ height }) => height.value));
      expect(Math.abs(Math.max(...ys) - Math.min(...ys) - greatest)).toBeLessThan(1e-3);
    });
  });

  it('puts studs and what is on the wall where they were read', () => {
    const uprights = on('Studs').filter(({ places }) => places[0]?.x === places[1]?.x);
    const xs = uprights.map(({ places }) => places[0]?.x);
    for (const inches of [14.5, 30.5, 46.5, 94.5, 110.5, 126.5]) {
      expect(xs.some((x) => Math.abs((x ?? 0) - inches * 25.4) < 1e-3)).toBe(true);
    }
    const window = on('Windows and doors').find(({ closed }) => closed);
    const [width = 0, height = 0] = window ? sides(window) : [];
    expect(width).toBeCloseTo(42 * 25.4, 3);
    expect(height).toBeCloseTo(38 * 25.4, 3);
  });

  it('says in words when it is superseded', () => {
    const words = (file: string) =>
      readBack(file).entities.flatMap((entity) =>
        'text' in entity && typeof entity.text === 'string' ? [entity.text] : [],
      );
    expect(words(text)).toContain('2418 Kitchen, revision B');
    expect(words(text).some((line) => line.startsWith('SUPERSEDED'))).toBe(false);
    expect(words(sheetDxf(releasedSheet({ newerRevision: 'C' })))).toContain(
      'SUPERSEDED BY REVISION C',
    );
  });

  it('is read back whole when names hold line breaks, codes and other alphabets', () => {
    const kitchen = crookedKitchen();
    const runs = kitchen.runs.map((run) => ({ ...run, name: 'Küche\n0\nEOF %%c ^J 台所' }));
    const odd = readBack(sheetDxf(releasedSheet({}, { kitchen: { ...kitchen, runs } })));
    expect(odd.entities).toHaveLength(readBack(text).entities.length);
  });

  it('is made before anything is read, as the room was drawn', () => {
    const { wallBook, runs } = crookedKitchen();
    const rules = defaultShopRules('US').fit;
    const unread = { ...wallBook, readings: [] };
    const file = sheetDxf(
      releasedSheet({ wallBook: unread, runs, fit: fitRoom(unread, runs, rules) }),
    );
    const walls = lines(file).filter(({ layer }) => layer === 'Walls');
    expect(length(walls[0]?.places ?? [])).toBeCloseTo(3600, 3);
  });

  it('says the same each time', () => {
    expect(sheetDxf(sheet)).toBe(text);
  });
});
