import type { Point } from './shape';
import { turned } from './vector';

/**
 * Parallel lines that fill an outline, as a draughtsman hatches: real lines, so that paper and files need
 * no fill pattern.
 *
 * Edge: outlines may be hollow to any degree, but must not cross themselves; under three corners: none.
 * Example: a square of 10 about the origin at 45° with a spacing of 5 gets three lines.
 */
export function hatch(
  outline: readonly Point[],
  spacing: number,
  angleDeg: number,
): [Point, Point][] {
  if (outline.length < 3 || spacing <= 0) return [];
  const level = outline.map((point) => turned(point, -angleDeg));
  const ys = level.map(([, y]) => y);
  const lines: [Point, Point][] = [];
  const first = Math.floor(Math.min(...ys) / spacing) + 1;
  for (let step = first; step * spacing < Math.max(...ys); step += 1) {
    const y = step * spacing;
    const crossings = crossingsAt(level, y);
    for (let index = 0; index + 1 < crossings.length; index += 2) {
      const [from = 0, to = 0] = crossings.slice(index, index + 2);
      lines.push([turned([from, y], angleDeg), turned([to, y], angleDeg)]);
    }
  }
  return lines;
}

/** Where a level line enters and leaves; a corner on the line counts with the side that goes below it. */
function crossingsAt(outline: readonly Point[], y: number): number[] {
  const found: number[] = [];
  outline.forEach((from, index) => {
    const to = outline[(index + 1) % outline.length] ?? from;
    if (from[1] < y === to[1] < y) return;
    found.push(from[0] + ((y - from[1]) / (to[1] - from[1])) * (to[0] - from[0]));
  });
  return found.sort((one, other) => one - other);
}
