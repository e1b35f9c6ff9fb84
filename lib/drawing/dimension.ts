import {
  type DrawnText,
  type Point,
  type Shape,
  smallTextSizePx,
  textSizePx,
  textWidthPx,
} from './shape';
import { between, clockwise, direction, moved } from './vector';

type DimensionLook = {
  /** Away from the measured line, to the left of the way from → to as seen; negative: to the right. */
  offsetPx: number;
  spans: DrawnText['spans'];
  sizePx?: number;
};

const beyondPx = 5;
const tickPx = 5;

/**
 * A dimension as on a drawing: witness lines, the line itself with oblique ticks, the figure above it.
 *
 * Edge: where the figure is wider than the line, spans are left out from the last; one that is still too
 * wide stands on the other side of the line, clear of its neighbours.
 * Example: over 100 px with the spans "36" and " ± 1/16", both are shown; over 30 px only "36".
 */
export function dimension(from: Point, to: Point, look: DimensionLook): Shape[] {
  const { offsetPx, sizePx = textSizePx } = look;
  const along = direction(from, to);
  const inward = clockwise(along);
  const side = Math.sign(offsetPx) || 1;
  const at = (point: Point, px: number) => moved(point, along, 0, inward, -px);
  const start = at(from, offsetPx);
  const end = at(to, offsetPx);
  const lengthPx = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const spans = fitting(look.spans, lengthPx, sizePx);
  const isTooWide = textWidthPx(spans, sizePx) > lengthPx;
  return [
    line(at(from, side * beyondPx), at(from, offsetPx + side * beyondPx)),
    line(at(to, side * beyondPx), at(to, offsetPx + side * beyondPx)),
    line(start, end),
    tick(start, along),
    tick(end, along),
    figureAlong(start, end, { spans, sizePx, isUnder: isTooWide }),
  ];
}

/** A text over the middle of a line, turned with it: read from below or, on upright lines, from the right. */
export function figureAlong(
  from: Point,
  to: Point,
  {
    spans,
    sizePx,
    isUnder = false,
  }: { spans: DrawnText['spans']; sizePx: number; isUnder?: boolean },
): DrawnText {
  const [x, y] = direction(from, to);
  const deg = (Math.atan2(y, x) * 180) / Math.PI;
  const turnDeg = deg > 80 || deg < -100 ? deg + 180 : deg;
  const up: Point = [Math.sin((turnDeg * Math.PI) / 180), -Math.cos((turnDeg * Math.PI) / 180)];
  const middle = between(from, to, 0.5);
  const risePx = isUnder ? -sizePx - 2 : 4;
  const at: Point = [middle[0] + up[0] * risePx, middle[1] + up[1] * risePx];
  return { kind: 'text', at, spans, anchor: 'middle', turnDeg, sizePx };
}

function fitting(spans: DrawnText['spans'], lengthPx: number, sizePx: number): DrawnText['spans'] {
  const kept = [...spans];
  while (kept.length > 1 && textWidthPx(kept, sizePx) > lengthPx - 6) kept.pop();
  return kept;
}

/** A string of dimensions along one line, end to end. */
export function dimensionString(
  points: readonly Point[],
  figures: readonly DrawnText['spans'][],
  offsetPx: number,
): Shape[] {
  return figures.flatMap((spans, index) => {
    const [from, to] = points.slice(index, index + 2);
    return from && to ? dimension(from, to, { offsetPx, spans, sizePx: smallTextSizePx }) : [];
  });
}

const line = (from: Point, to: Point): Shape => ({
  kind: 'line',
  layer: 'dimension',
  points: [from, to],
});

function tick(at: Point, along: Point): Shape {
  const across = clockwise(along);
  const reach = (sign: number) => moved(at, along, sign * tickPx, across, -sign * tickPx);
  return line(reach(-1), reach(1));
}
