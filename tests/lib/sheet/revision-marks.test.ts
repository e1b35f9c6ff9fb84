import { describe, expect, it } from 'vitest';
import type { SheetView } from '@/lib/contracts/rooms';
import { drawElevation } from '@/lib/drawing/elevation';
import { drawPlan } from '@/lib/drawing/plan';
import { revisionCloud } from '@/lib/drawing/revision-cloud';
import type { Drawing, DrawnPart, Shape } from '@/lib/drawing/shape';
import { sheetDxf } from '@/lib/export/sheet-dxf';
import { sheetSvg } from '@/lib/export/sheet-svg';
import { revisionMarks } from '@/lib/sheet/revision-marks';
import { crookedKitchen } from '../../help/crooked-kitchen';
import { releasedSheet } from '../../help/released-sheet';

const kitchen = crookedKitchen();
const before = releasedSheet({}, { kitchen });
const [run] = kitchen.runs;
const unit = run?.units.find(({ widthMm }) => widthMm === 36 * 25.4) ?? run?.units[0];
if (!run || !unit) throw new Error('the kitchen has no runs');

/** The same kitchen with one box narrower by an inch. */
const narrowed = {
  ...kitchen,
  runs: kitchen.runs.map((one) => ({
    ...one,
    units: one.units.map((each) =>
      each.id === unit.id ? { ...each, widthMm: each.widthMm - 25.4 } : each,
    ),
  })),
};
const after = releasedSheet({}, { kitchen: narrowed });
const marks = revisionMarks(before, after);
const revised: SheetView = { ...after, revised: { revision: 'B', marks } };

const parts = (drawing: Drawing | null) =>
  (drawing?.shapes ?? []).filter(
    (shape): shape is DrawnPart => shape.kind === 'part' && shape.part.kind === 'revision',
  );
const texts = (shapes: readonly Shape[]): string[] =>
  shapes.flatMap((shape) =>
    shape.kind === 'text'
      ? [shape.spans.map(({ words }) => words).join('')]
      : shape.kind === 'part'
        ? texts(shape.shapes)
        : [],
  );

describe('what differs from the revision before', () => {
  it('is nothing where nothing was changed', () => {
    expect(revisionMarks(before, releasedSheet({}, { kitchen }))).toEqual([]);
  });

  it('is the box that was narrowed, and the fillers that follow, each with what stood there', () => {
    expect(marks).toContainEqual({
      on: 'unit',
      runId: run.id,
      unitId: unit.id,
      was: expect.stringMatching(/"$/),
    });
    const fillers = marks.filter(
      (mark) => mark.on === 'cut' && /filler (left|right)$/.test(mark.key),
    );
    expect(fillers.length).toBeGreaterThan(0);
    for (const { was } of fillers) expect(was).toMatch(/\d"$/);
    expect(marks.some(({ on }) => on === 'wall' || on === 'corner')).toBe(false);
  });

  it('is a window that was read anew, where it now stands', () => {
    const window = kitchen.wallBook.readings.find(({ kind }) => kind === 'feature');
    if (window?.kind !== 'feature') throw new Error('the kitchen has nothing on its walls');
    const corrected = { ...window, id: run.id, replaces: window.id, x0Mm: window.x0Mm + 30 };
    const wallBook = {
      ...kitchen.wallBook,
      readings: [...kitchen.wallBook.readings, corrected],
    };
    const moved = revisionMarks(before, releasedSheet({}, { kitchen: { ...kitchen, wallBook } }));
    expect(moved).toContainEqual({
      on: 'feature',
      wallId: window.wallId,
      readingId: corrected.id,
      was: expect.stringMatching(/ to /),
    });
  });
});

describe('a revised drawing', () => {
  it('clouds each change with the letter of the revision and strikes what stood there', () => {
    const [onWall] = parts(drawElevation({ ...revised, wallId: run.wallId }));
    expect(onWall).toBeDefined();
    const shapes = onWall?.shapes ?? [];
    const layers = shapes.flatMap((shape) => ('layer' in shape ? [shape.layer] : []));
    expect(layers).toEqual(['revision-cloud', 'revision-letter', 'revision-struck']);
    expect(texts(shapes)).toEqual(['B', expect.stringMatching(/"$/)]);
    expect(parts(drawPlan(revised))).toHaveLength(1);
  });

  it('has no cloud on the first revision', () => {
    expect(parts(drawElevation({ ...before, wallId: run.wallId }))).toEqual([]);
    expect(parts(drawPlan(before))).toEqual([]);
  });

  it('keeps the clouds in a group of their own in SVG and on a layer of their own in DXF', () => {
    const svg = sheetSvg(revised);
    expect(svg.match(/<g class="revision">/g)?.length).toBeGreaterThan(1);
    expect(sheetSvg(before)).not.toContain('<g class="revision">');
    const onLayer = (dxf: string) =>
      dxf.split(/\r?\n/).filter((line) => line === 'Revision').length;
    expect(onLayer(sheetDxf(revised))).toBeGreaterThan(onLayer(sheetDxf(before)) + 3);
  });
});

describe('a revision cloud', () => {
  it('bulges outward everywhere and never enters the box it stands round', () => {
    const box = { left: 10, top: 20, width: 60, height: 24 };
    const cloud = revisionCloud(box);
    expect(cloud.length).toBeGreaterThan(20);
    for (const [x, y] of cloud) {
      const isInside =
        x > box.left + 1e-9 &&
        x < box.left + box.width - 1e-9 &&
        y > box.top + 1e-9 &&
        y < box.top + box.height - 1e-9;
      expect(isInside).toBe(false);
    }
    expect(Math.min(...cloud.map(([x]) => x))).toBeLessThan(box.left - 2);
    expect(Math.max(...cloud.map(([, y]) => y))).toBeGreaterThan(box.top + box.height + 2);
  });

  it('has puffs of one size however long the side', () => {
    const puffs = (width: number) =>
      revisionCloud({ left: 0, top: 0, width, height: 13 }).length / 5;
    expect(puffs(130)).toBe(10 + 10 + 1 + 1);
    expect(puffs(1)).toBe(4);
  });
});
