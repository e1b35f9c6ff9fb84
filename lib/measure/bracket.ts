/** Two neighbours of a sorted line between which a place lies, and how far along. */
export type Bracket<P> = { from: P; to: P; share: number };

/**
 * The neighbours of a place on a line sorted by position.
 * Edge rule: at a point, that point twice; null past the ends.
 * Example: points at 0, 10, 20 and place 12.5 → 10, 20, share 0.25.
 */
export function bracket<P>(
  line: P[],
  positionOf: (point: P) => number,
  at: number,
): Bracket<P> | null {
  for (let index = 0; index < line.length; index++) {
    const to = line[index];
    if (to === undefined) return null;
    const position = positionOf(to);
    if (position < at) continue;
    if (position === at) return { from: to, to, share: 0 };
    const from = line[index - 1];
    if (from === undefined) return null;
    const start = positionOf(from);
    return { from, to, share: (at - start) / (position - start) };
  }
  return null;
}
