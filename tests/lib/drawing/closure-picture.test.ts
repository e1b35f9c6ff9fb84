import { describe, expect, it } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import type { WallBook } from '@/lib/contracts/wall-book';
import { askedDiagonals } from '@/lib/drawing/asked-diagonals';
import { sureFactor } from '@/lib/drawing/closure-frame';
import { type ClosureDrawing, drawClosure } from '@/lib/drawing/closure-picture';
import { closureSays, suspectAdvice } from '@/lib/drawing/closure-words';
import type { DrawnText, Layer, Point, Shape } from '@/lib/drawing/shape';
import { suspectMarks } from '@/lib/drawing/suspects';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { crookedKitchen } from '../../help/crooked-kitchen';

const rules = defaultShopRules('US').fit;

function sourceOf(kitchen = crookedKitchen(), keep: (reading: Reading) => boolean = () => true) {
  const readings = kitchen.wallBook.readings.filter(keep);
  const wallBook: WallBook = { ...kitchen.wallBook, readings };
  return { wallBook, rules, fit: fitRoom(wallBook, kitchen.runs, rules) };
}

function drawn(source: ReturnType<typeof sourceOf>): ClosureDrawing {
  const drawing = drawClosure(source);
  if (!drawing) throw new Error('the room was not drawn');
  return drawing;
}
type Placed = Exclude<Shape, DrawnText | { kind: 'part' }>;
const onLayer = ({ shapes }: ClosureDrawing, layer: Layer) =>
  shapes.filter((shape): shape is Placed => 'layer' in shape && shape.layer === layer);
const wordsIn = ({ shapes }: ClosureDrawing) =>
  shapes.flatMap((shape) =>
    shape.kind === 'text' ? [shape.spans.map(({ words }) => words).join('')] : [],
  );
const pointsOf = (shape: Placed | undefined): readonly Point[] =>
  shape && 'points' in shape ? shape.points : [];
const apart = ([x, y]: Point, [otherX, otherY]: Point) => Math.hypot(x - otherX, y - otherY);

describe('the closure picture', () => {
  const true100 = sourceOf();
  const picture = drawn(true100);

  it('draws the gap of the walk as many times larger as it says', () => {
    const [gap] = onLayer(picture, 'walk-gap');
    const [from, to] = pointsOf(gap);
    const gapMm = true100.fit.closure.chains[0]?.linear?.value ?? Number.NaN;
    expect(from && to ? apart(from, to) : 0).toBeCloseTo(
      gapMm * picture.walkFactor * picture.pxPerMm,
      1,
    );
    expect(picture.walkFactor).toBeGreaterThan(1);
  });

  it('draws one ellipse for every corner but the one that is held', () => {
    const corners = true100.fit.closure.adjustment?.corners ?? [];
    expect(onLayer(picture, 'error-ellipse')).toHaveLength(corners.length - 1);
    expect(onLayer(picture, 'held-corner')).toHaveLength(1);
  });

  it('draws each ellipse as large as holds its corner 95 times of 100, enlarged by its own factor', () => {
    const corners = true100.fit.closure.adjustment?.corners ?? [];
    const largest = Math.max(...corners.map(({ ellipse }) => ellipse.aMm));
    const reaches = onLayer(picture, 'error-ellipse').map((shape) => {
      const points = pointsOf(shape);
      const [one, other] = [points[0], points[points.length / 2]];
      return one && other ? apart(one, other) / 2 : 0;
    });
    expect(Math.max(...reaches)).toBeCloseTo(
      largest * sureFactor * picture.ellipseFactor * picture.pxPerMm,
      3,
    );
    // Two independent normal errors: a share of exp(−r²/2) falls outside r standard ellipses.
    expect(Math.exp(-(sureFactor ** 2) / 2)).toBeCloseTo(0.05, 12);
  });

  it('keeps everything inside the width of a phone', () => {
    expect(picture.bounds.width).toBeLessThanOrEqual(390 - 28);
  });

  it('says both factors and how sure it is in words', () => {
    const [walk = '', corners = ''] = closureSays(true100.fit, picture, rules);
    expect(walk).toContain(`drawn ×${picture.walkFactor}`);
    expect(corners).toContain('95 times out of 100');
    expect(corners).toContain(`drawn ×${picture.ellipseFactor}`);
  });

  it('marks a wall that was read 100 mm too long, in a line, a ring and words', () => {
    const misread = sourceOf(crookedKitchen({ misreadMm: 100 }));
    const drawing = drawn(misread);
    const [wallC] = (misread.wallBook.room.chains[0]?.walls ?? []).slice(2);
    expect(suspectMarks(misread)[0]).toMatchObject({
      place: { kind: 'wall', wallId: wallC?.id },
      words: '100 mm too long?',
    });
    expect(onLayer(drawing, 'suspect-line')).toHaveLength(1);
    expect(onLayer(drawing, 'suspect-ring')).toHaveLength(1);
    expect(wordsIn(drawing)).toContain('100 mm too long?');
    expect(onLayer(picture, 'suspect-line')).toHaveLength(0);
  });

  it('asks for the diagonal that would settle it, on the drawing and in words', () => {
    const atOneHeight = (reading: Reading) =>
      reading.kind !== 'diagonal' && (reading.kind !== 'length' || reading.zMm === 36 * 25.4);
    const noDiagonals = sourceOf(crookedKitchen({ misreadMm: 100 }), atOneHeight);
    const asked = askedDiagonals(noDiagonals.fit);
    expect(asked.length).toBeGreaterThan(0);
    const drawing = drawn(noDiagonals);
    expect(onLayer(drawing, 'diagonal')).toHaveLength(0);
    expect(onLayer(drawing, 'diagonal-asked').length).toBe(asked.length);
    expect(suspectAdvice(noDiagonals.fit, noDiagonals.wallBook.room, rules)).toMatch(
      /too (long|short)\? Measure it again, or take the diagonal from corner .–. to corner .–. to settle it\./,
    );
  });

  it('shows the diagonals that are in the book', () => {
    expect(onLayer(picture, 'diagonal')).toHaveLength(2);
  });

  it('says nothing of a room that is not read', () => {
    expect(drawClosure(sourceOf(crookedKitchen(), () => false))).toBeNull();
    expect(suspectAdvice(true100.fit, true100.wallBook.room, rules)).toBeNull();
  });
});
