import type { PenStrokes } from '@/lib/contracts/sign-offs';

/**
 * A signature as one path, in the language that SVG and PDF both read; in points of the pen's field.
 *
 * Edge: a stroke of one point is a dot, drawn as a line of no length with round ends.
 * Example: [[[1, 2], [3, 4]], [[5, 5]]] is "M1 2L3 4M5 5L5 5".
 */
export function strokePath(strokes: PenStrokes): string {
  return strokes
    .map((stroke) => {
      const [first, ...rest] = stroke.map(([x, y]) => `${tenth(x)} ${tenth(y)}`);
      return `M${first}${(rest.length > 0 ? rest : [first]).map((point) => `L${point}`).join('')}`;
    })
    .join('');
}

const tenth = (value: number): number => Math.round(value * 10) / 10;
