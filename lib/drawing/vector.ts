import type { Point } from './shape';

/** `from` moved by `along` times one vector and `out` times another. */
export function moved(
  from: Point,
  along: Point,
  alongBy: number,
  out: Point,
  outBy: number,
): Point {
  return [
    from[0] + along[0] * alongBy + out[0] * outBy,
    from[1] + along[1] * alongBy + out[1] * outBy,
  ];
}

/** One long, from one point towards another; to the right where they are one point. */
export function direction(from: Point, to: Point): Point {
  const [x, y] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(x, y);
  return length === 0 ? [1, 0] : [x / length, y / length];
}

/** A quarter turn clockwise as seen: along a wall it points into the room. */
export function clockwise([x, y]: Point): Point {
  return [-y, x];
}

export function turned([x, y]: Point, deg: number): Point {
  const angle = (deg * Math.PI) / 180;
  return [x * Math.cos(angle) - y * Math.sin(angle), x * Math.sin(angle) + y * Math.cos(angle)];
}

export function between(one: Point, other: Point, part: number): Point {
  return [one[0] + (other[0] - one[0]) * part, one[1] + (other[1] - one[1]) * part];
}
